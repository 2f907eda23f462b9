package dev.holdfast.numeric;

/**
 * Incomplete gamma functions divided by the term x^a e^-x / Γ(a + 1).
 *
 * <p>The quotients stay in range where function and term both underflow. Below the mean the power
 * series, above it the continued fraction (DLMF 8.7.1, 8.9.2); near the mean of a large shape an
 * integral of the tilted term by Gauss-Legendre, whose cost does not grow.
 */
final class GammaTail {
  private static final double LARGE = 2e4;
  private static final int MAX_STEPS = 20_000;
  private static final GaussLegendre RULE = GaussLegendre.of(20);

  private GammaTail() {}

  /**
   * P(a, x) over the term.
   *
   * @param difference x - a, exact
   */
  static double lower(double a, double x, double difference) {
    if (x <= a + 1) {
      return belowMean(a, x, difference);
    }
    return 1 / term(a, x, difference) - aboveMean(a, x, difference);
  }

  /** Q(a, x) over the term. */
  static double upper(double a, double x, double difference) {
    // For a small shape the upper tail is about a times an exponential integral, too small beside
    // one to be had by subtraction.
    if (x > a + 1 || a < 0.1 && x > 0.3) {
      return aboveMean(a, x, difference);
    }
    return 1 / term(a, x, difference) - belowMean(a, x, difference);
  }

  private static double term(double a, double x, double difference) {
    return StrictMath.exp(
        -LogTerms.deviance(a, x, difference)
            - LogTerms.stirlingError(a)
            - 0.5 * (LogTerms.LOG_TWO_PI + StrictMath.log(a)));
  }

  private static double belowMean(double a, double x, double difference) {
    if (a > LARGE && difference * difference < 0.1 * a * a) {
      return integral(a, x, -difference, -1);
    }
    double sum = 1;
    double term = 1;
    double k = a;
    do {
      k += 1;
      term *= x / k;
      sum += term;
    } while (term > 1e-17 * sum);
    return sum;
  }

  private static double aboveMean(double a, double x, double difference) {
    if (a > LARGE && difference * difference < 0.1 * a * a) {
      return integral(a, x, difference, 1);
    }
    double b = difference + 1;
    double c = 1e300;
    double d = 1 / b;
    double h = d;
    for (int i = 1; i < MAX_STEPS; i++) {
      double an = -i * (i - a);
      b += 2;
      d = 1 / (an * d + b);
      c = b + an / c;
      double factor = c * d;
      h *= factor;
      if (Math.abs(factor - 1) < 2e-16) {
        return a * h;
      }
    }
    throw new ArithmeticException(
        "the continued fraction for a = " + a + ", x = " + x + " did not settle");
  }

  /**
   * a ∫ exp(±a v - x (e^±v - 1)) dv = a ∫ exp(-slope v - x (e^±v - 1 ∓ v)) dv over v > 0: the tail
   * in t = x e^±v, upper for +1, lower for -1.
   */
  private static double integral(double a, double x, double slope, int sign) {
    double end = cutoff(slope, x);
    double sum = 0;
    int panels = 2;
    for (int panel = 0; panel < panels; panel++) {
      double half = end / (2 * panels);
      double centre = (2 * panel + 1) * half;
      for (int i = 0; i < RULE.order(); i++) {
        double v = centre + half * RULE.node(i);
        sum +=
            half * RULE.weight(i) * StrictMath.exp(-slope * v - x * LogTerms.expExcess(sign * v));
      }
    }
    return a * sum;
  }

  /** Where slope v + curvature v²/2 reaches 42, with room for the cubic term. */
  static double cutoff(double slope, double curvature) {
    double s = Math.max(0, slope);
    return 1.25 * 84 / (s + Math.sqrt(s * s + 84 * curvature));
  }
}
