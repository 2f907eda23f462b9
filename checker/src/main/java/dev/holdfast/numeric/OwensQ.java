package dev.holdfast.numeric;

/**
 * Owen's Q functions (Owen 1965, Biometrika 52, 437-446): the two parts, below and above R, of the
 * mean of Φ(t X/√ν - δ) over X, chi with ν degrees of freedom.
 *
 * <p>Degrees of freedom are real, in [1e-3, 1e12]; t and δ lie in [-1e6, 1e6]. Both parts together
 * are the distribution function at t of the noncentral t with noncentrality δ. The integrals are
 * taken over log X around their peak, so that values down to 1e-300 keep a relative error below
 * 1e-12. Cost: 10 to 60 microseconds.
 */
public final class OwensQ {
  private static final double GREATEST = 1e6;

  private OwensQ() {}

  /**
   * Returns the integral from 0 to R.
   *
   * @param degreesOfFreedom in [1e-3, 1e12]
   * @param t in [-1e6, 1e6]
   * @param delta in [-1e6, 1e6]
   * @param limit R, at least 0, may be infinite
   * @throws IllegalArgumentException if an argument is outside its range
   */
  public static double lower(double degreesOfFreedom, double t, double delta, double limit) {
    check(degreesOfFreedom, t, delta, limit);
    if (limit == 0) {
      return 0;
    }
    return probability(
        ChiMean.log(
            degreesOfFreedom,
            ChiMean.logNormalTail(delta, -t),
            Double.NEGATIVE_INFINITY,
            logScale(degreesOfFreedom, limit),
            ChiMean.breaks(degreesOfFreedom, delta, -t)));
  }

  /** As {@link #lower}, from R to infinity. */
  public static double upper(double degreesOfFreedom, double t, double delta, double limit) {
    check(degreesOfFreedom, t, delta, limit);
    if (limit == Double.POSITIVE_INFINITY) {
      return 0;
    }
    double low = limit == 0 ? Double.NEGATIVE_INFINITY : logScale(degreesOfFreedom, limit);
    return probability(
        ChiMean.log(
            degreesOfFreedom,
            ChiMean.logNormalTail(delta, -t),
            low,
            Double.POSITIVE_INFINITY,
            ChiMean.breaks(degreesOfFreedom, delta, -t)));
  }

  private static void check(double degreesOfFreedom, double t, double delta, double limit) {
    Domain.degreesOfFreedom("degreesOfFreedom", degreesOfFreedom);
    Domain.within("t", t, -GREATEST, GREATEST);
    Domain.within("delta", delta, -GREATEST, GREATEST);
    Domain.within("limit", limit, 0, Double.POSITIVE_INFINITY);
  }

  private static double probability(double log) {
    return Math.min(1, StrictMath.exp(log));
  }

  /** log(R/√ν). */
  private static double logScale(double degreesOfFreedom, double limit) {
    if (!(limit > 1e-100 && limit < 1e100)) {
      return StrictMath.log(limit) - 0.5 * StrictMath.log(degreesOfFreedom);
    }
    DoubleDouble square =
        DoubleDouble.product(limit, limit).dividedBy(DoubleDouble.of(degreesOfFreedom));
    double beyondOne = square.minus(1).hi();
    return 0.5
        * (Math.abs(beyondOne) < 0.5 ? StrictMath.log1p(beyondOne) : StrictMath.log(square.hi()));
  }
}
