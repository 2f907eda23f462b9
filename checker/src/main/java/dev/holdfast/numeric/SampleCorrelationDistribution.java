package dev.holdfast.numeric;

/**
 * The distribution of the sample correlation r of n pairs from a bivariate normal law with
 * correlation rho.
 *
 * <p>By the density of Hotelling (1953), Journal of the Royal Statistical Society B 15, 193-232, in
 * u = artanh r, where it is C cosh(u - z)^-(n - 3/2) sqrt(cosh u/cosh z) F(1/2, 1/2; n - 1/2; (1 +
 * rho r)/2) with z = artanh rho and every factor positive; its tails by double exponential
 * quadrature from the argument outward (Takahasi, Mori 1974).
 */
public final class SampleCorrelationDistribution extends TwoTailed {
  private static final double AGREEMENT = 1e-14;

  private final double n;
  private final double rho;
  private final double centre;
  private final double constant;

  private SampleCorrelationDistribution(double n, double rho) {
    this.n = n;
    this.rho = rho;
    this.centre = artanh(rho);
    // (n - 2) Gamma(n - 1)/(sqrt(2 pi) Gamma(n - 1/2)); the gammas by Stirling's formula
    double a = n - 2;
    double b = n - 1.5;
    double logRatio =
        (a + 0.5) * StrictMath.log(a)
            - a
            + LogTerms.stirlingError(a)
            - ((b + 0.5) * StrictMath.log(b) - b + LogTerms.stirlingError(b));
    if (n > 50) {
      // (a + 1/2) ln(a/b) - ln(b)/2 + 1/2: the same without the difference of large logarithms
      logRatio =
          (a + 0.5) * StrictMath.log1p((a - b) / b)
              - 0.5 * StrictMath.log(b)
              + 0.5
              + LogTerms.stirlingError(a)
              - LogTerms.stirlingError(b);
    }
    this.constant = a * StrictMath.exp(logRatio) / Math.sqrt(2 * StrictMath.PI);
  }

  /**
   * The distribution with the given parameters.
   *
   * @param n number of pairs, from 3 to 1e9; need not be whole
   * @param rho correlation, in (-1, 1)
   * @throws IllegalArgumentException if a parameter is outside its range
   */
  public static SampleCorrelationDistribution of(double n, double rho) {
    return new SampleCorrelationDistribution(
        Domain.within("n", n, 3, 1e9),
        Domain.within("rho", rho, Math.nextUp(-1.0), Math.nextDown(1.0)));
  }

  @Override
  double lowerTail(double r) {
    return outward(artanh(r), false);
  }

  @Override
  double upperTail(double r) {
    return outward(artanh(r), true);
  }

  @Override
  boolean isBelowCentre(double r) {
    return artanh(r) < centre;
  }

  @Override
  double fromLine(double v) {
    return StrictMath.tanh(v);
  }

  @Override
  double toLine(double r) {
    return artanh(r);
  }

  @Override
  double lineScale(double r) {
    return (1 - r) * (1 + r);
  }

  @Override
  double guess(double z) {
    // Fisher's z is nearly normal with variance 1/(n - 3).
    return StrictMath.tanh(centre + z / Math.sqrt(Math.max(n - 3, 0.5)));
  }

  /** Integral from u away from the centre. */
  private double outward(double u, boolean upper) {
    double direction = upper ? 1 : -1;
    double width = 1 / Math.sqrt(n);
    double h = 0.5;
    double sum = sum(u, direction, width, 0, h);
    double previous = sum * h;
    for (int halving = 0; halving < 7; halving++) {
      sum += sum(u, direction, width, h / 2, h);
      h /= 2;
      double value = sum * h;
      if (Math.abs(value - previous) <= AGREEMENT * value) {
        return Math.min(1, value * constant);
      }
      previous = value;
    }
    return Math.min(1, previous * constant);
  }

  private double sum(double u, double direction, double width, double offset, double h) {
    double sum = 0;
    for (int side = -1; side <= 1; side += 2) {
      for (int k = side < 0 ? 1 : 0; k < 2000; k++) {
        double y = offset + side * k * h;
        double fall = StrictMath.exp(-y);
        double out = width * StrictMath.exp(y - fall);
        double term = kernel(u + direction * out) * out * (1 + fall);
        sum += term;
        if (k > 4 && term <= 1e-18 * sum) {
          break;
        }
      }
    }
    return sum;
  }

  /** Density in u, but for the constant. */
  private double kernel(double u) {
    double apart = StrictMath.sinh(u - centre);
    if (Double.isInfinite(apart)) {
      return 0;
    }
    double logCosh =
        Math.abs(apart) > 1e8
            ? StrictMath.log(Math.abs(apart))
            : 0.5 * StrictMath.log1p(apart * apart);
    double ratio = 0.5 * (logCosh(u) - logCosh(centre));
    double power = StrictMath.exp(ratio - (n - 1.5) * logCosh);
    return power == 0 ? 0 : power * series((1 + rho * StrictMath.tanh(u)) / 2);
  }

  private static double logCosh(double u) {
    double size = Math.abs(u);
    return size + StrictMath.log1p(StrictMath.exp(-2 * size)) - 0.6931471805599453;
  }

  /** F(1/2, 1/2; n - 1/2; z). */
  private double series(double z) {
    double sum = 1;
    double term = 1;
    double c = n - 0.5;
    for (int k = 0; k < 200_000; k++) {
      term *= (k + 0.5) * (k + 0.5) / ((c + k) * (k + 1)) * z;
      sum += term;
      if (term < 1e-17 * sum) {
        break;
      }
    }
    return sum;
  }

  @Override
  public double density(double r) {
    Domain.number("x", r);
    if (r <= -1 || r >= 1) {
      return 0;
    }
    return constant * kernel(artanh(r)) / ((1 - r) * (1 + r));
  }

  @Override
  public double getMean() {
    return moment(1);
  }

  @Override
  public double getVariance() {
    double mean = getMean();
    return Math.max(0, moment(2) - mean * mean);
  }

  private double moment(int order) {
    double h = 0.25 / Math.sqrt(n);
    double sum = 0;
    for (int side = -1; side <= 1; side += 2) {
      for (int k = side < 0 ? 1 : 0; k < 4000; k++) {
        double u = centre + side * k * h;
        double term = kernel(u);
        double r = StrictMath.tanh(u);
        sum += term * (order == 1 ? r : r * r);
        if (term < 1e-18) {
          break;
        }
      }
    }
    return sum * h * constant;
  }

  @Override
  public double getSupportLowerBound() {
    return -1;
  }

  @Override
  public double getSupportUpperBound() {
    return 1;
  }

  private static double artanh(double r) {
    return 0.5 * StrictMath.copySign(StrictMath.log1p(2 * Math.abs(r) / (1 - Math.abs(r))), r);
  }
}
