package dev.holdfast.numeric;

/**
 * Incomplete beta functions divided by the term Γ(a + b) / (Γ(a + 1) Γ(b)) x^a y^b, y = 1 - x.
 *
 * <p>Below the mean the power series where it is short, else the continued fraction of DiDonato and
 * Morris (1992), ACM Transactions on Mathematical Software 18, 360-373; for large parameters an
 * integral of the tilted term by Gauss-Legendre, whose cost does not grow.
 */
final class BetaTail {
  private static final double LARGE = 2e4;
  private static final int MAX_STEPS = 20_000;
  private static final GaussLegendre RULE = GaussLegendre.of(20);

  private BetaTail() {}

  /**
   * I_x(a, b) over the term.
   *
   * @param difference (a + b) x - a, exact
   */
  static double lower(double a, double b, double x, double y, double difference) {
    if (isBelowMean(a, b, x, y)) {
      return belowMean(a, b, x, y, difference);
    }
    return 1 / StrictMath.exp(LogTerms.beta(a, b, x, y, difference))
        - a / b * belowMean(b, a, y, x, -difference);
  }

  /** 1 - I_x(a, b) over the same term. */
  static double upper(double a, double b, double x, double y, double difference) {
    if (!isBelowMean(a, b, x, y)) {
      return a / b * belowMean(b, a, y, x, -difference);
    }
    return 1 / StrictMath.exp(LogTerms.beta(a, b, x, y, difference))
        - belowMean(a, b, x, y, difference);
  }

  private static boolean isBelowMean(double a, double b, double x, double y) {
    return x * (b + 1) <= y * (a + 1);
  }

  private static double belowMean(double a, double b, double x, double y, double difference) {
    double curvature = (a + b) * x * y;
    if (curvature > LARGE && Math.abs(difference) < 0.3 * curvature) {
      return integral(a, b, x, y, difference);
    }
    if (x < 0.8 && x * (a + b) < 0.8 * (a + 1)) {
      return series(a, b, x);
    }
    return fraction(a, b, x, difference);
  }

  private static double series(double a, double b, double x) {
    double sum = 1;
    double term = 1;
    double k = a;
    do {
      k += 1;
      term *= x * (k + (b - 1)) / k;
      sum += term;
    } while (term > 1e-17 * sum);
    return sum;
  }

  private static double fraction(double a, double b, double x, double difference) {
    double f = a * (1 - difference) / (a + 1);
    double c = f;
    double d = 0;
    for (int n = 1; n < MAX_STEPS; n++) {
      double m = a + 2 * n - 1;
      double ratio = n * (b - n) * x / m;
      double an = (a + n - 1) * (a + b + n - 1) / m * x * ratio;
      double bn = n + ratio + (a + n) * (1 - difference + n * (2 - x)) / (m + 2);
      d = 1 / (bn + an * d);
      c = bn + an / c;
      double factor = c * d;
      f *= factor;
      if (Math.abs(factor - 1) < 2e-16) {
        return a / f;
      }
    }
    throw new ArithmeticException(
        "the continued fraction for a = " + a + ", b = " + b + ", x = " + x + " did not settle");
  }

  /**
   * a ∫ (t/x)^a ((1 - t)/y)^b dv over v > 0, where the logit of t lies v below that of x. The
   * linear part of the exponent is the given difference; the rest is formed without cancellation
   * from the smaller of x and y.
   */
  private static double integral(double a, double b, double x, double y, double difference) {
    double n = a + b;
    double end = GammaTail.cutoff(-difference, n * x * y);
    double small = Math.min(x, y);
    int sign = x <= y ? -1 : 1;
    double sum = 0;
    int panels = 2;
    for (int panel = 0; panel < panels; panel++) {
      double half = end / (2 * panels);
      double centre = (2 * panel + 1) * half;
      for (int i = 0; i < RULE.order(); i++) {
        double v = centre + half * RULE.node(i);
        double e = LogTerms.expExcess(sign * v);
        double bend = small * e - LogTerms.excess(small * (e + sign * v));
        sum += half * RULE.weight(i) * StrictMath.exp(difference * v - n * bend);
      }
    }
    return a * sum;
  }
}
