package dev.holdfast.numeric;

/**
 * Logarithms of Poisson, gamma and binomial probabilities at real arguments.
 *
 * <p>The saddle-point form of Loader (2000), Fast and accurate computation of binomial
 * probabilities: Stirling's formula takes the large parts out of the gamma functions, and what is
 * left is a deviance, never a difference of large logarithms. The absolute error of a result L is
 * about 4e-16 (1 + |L|), provided the difference of argument and mean is handed in exactly.
 */
final class LogTerms {
  static final double LOG_TWO_PI = 1.8378770664093456;

  /** Stirling's error at 1/2, 1, 3/2, ... 15. */
  private static final double[] HALVES = {
    0.15342640972002736, 0.08106146679532726, 0.05481412105191765, 0.0413406959554093,
    0.03316287351993629, 0.02767792568499834, 0.023746163656297496, 0.020790672103765093,
    0.018488450532673187, 0.016644691189821193, 0.015134973221917378, 0.013876128823070748,
    0.012810465242920227, 0.01189670994589177, 0.011104559758206917, 0.010411265261972096,
    0.009799416126158804, 0.009255462182712733, 0.008768700134139386, 0.00833056343336287,
    0.00793411456431402, 0.007573675487951841, 0.007244554301320383, 0.00694284010720953,
    0.006665247032707682, 0.006408994188004207, 0.006171712263039458, 0.0059513701127588475,
    0.0057462165130101155, 0.005554733551962801
  };

  private LogTerms() {}

  /** log Γ(z + 1) - (z + 1/2) log z + z - log(2π)/2, for z > 0. */
  static double stirlingError(double z) {
    if (z <= 15) {
      double twice = 2 * z;
      int index = (int) twice;
      if (index == twice && index > 0) {
        return HALVES[index - 1];
      }
    }
    double error = 0;
    double w = z;
    while (w < 10) {
      error += (w + 0.5) * StrictMath.log1p(1 / w) - 1;
      w += 1;
    }
    double v = 1 / (w * w);
    double series =
        1 / 12.0
            - v
                * (1 / 360.0
                    - v
                        * (1 / 1260.0
                            - v
                                * (1 / 1680.0
                                    - v
                                        * (1 / 1188.0
                                            - v
                                                * (691 / 360360.0
                                                    - v * (1 / 156.0 - v * 3617 / 122400.0))))));
    return error + series / w;
  }

  /** u - log(1 + u) for u > -1, to full relative precision. */
  static double excess(double u) {
    if (u < -0.35 || u > 0.6) {
      return u - StrictMath.log1p(u);
    }
    // log(1 + u) = 2 artanh(r), r = u / (2 + u), and u - 2r = ur.
    double r = u / (2 + u);
    double v = r * r;
    double sum = 1 / 29.0;
    for (int k = 27; k >= 3; k -= 2) {
      sum = sum * v + 1.0 / k;
    }
    return u * r - 2 * r * v * sum;
  }

  /** e^u - 1 - u, to full relative precision. */
  static double expExcess(double u) {
    if (u < -0.5 || u > 0.5) {
      return StrictMath.expm1(u) - u;
    }
    double sum = 1;
    for (int k = 16; k >= 3; k--) {
      sum = sum * u / k + 1;
    }
    return 0.5 * u * u * sum;
  }

  /**
   * The deviance m - k - k log(m / k) of a count k and a mean m.
   *
   * @param k positive
   * @param m positive
   * @param difference m - k, more exact than the two can give it
   */
  static double deviance(double k, double m, double difference) {
    double u = difference / k;
    if (u < -0.35 || u > 0.6) {
      return difference - k * StrictMath.log(m / k);
    }
    return k * excess(u);
  }

  /** log(e^-m m^k / Γ(k + 1)) for k ≥ 0, m > 0. */
  static double poisson(DoubleDouble k, DoubleDouble m) {
    if (k.hi() == 0) {
      return -m.hi();
    }
    return -deviance(k.hi(), m.hi(), m.minus(k).hi())
        - stirlingError(k.hi())
        - 0.5 * (LOG_TWO_PI + StrictMath.log(k.hi()));
  }

  /**
   * log(Γ(a + b) / (Γ(a + 1) Γ(b)) x^a y^b), the step between incomplete beta functions of
   * neighbouring first parameter.
   *
   * @param difference (a + b) x - a = b x - a y
   */
  static double beta(double a, double b, double x, double y, double difference) {
    double n = a + b;
    return stirlingError(n)
        - stirlingError(a)
        - stirlingError(b)
        - deviance(a, n * x, difference)
        - deviance(b, n * y, -difference)
        - 0.5 * (LOG_TWO_PI + StrictMath.log(a) + StrictMath.log(n / b));
  }
}
