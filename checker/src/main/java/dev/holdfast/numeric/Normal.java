package dev.holdfast.numeric;

/**
 * The standard normal distribution: both tails, their logarithms and quantiles, the same bits on
 * every platform.
 *
 * <p>The tails use the rational approximations of Cody (1969), Mathematics of Computation 23,
 * 631-637, the exponential of the square taken without rounding the square. Relative error below
 * 1e-15 on either tail down to the smallest normal double; the library's distribution calls
 * platform-dependent exponentials and is off by 1.5e-13 at 34 standard deviations. Cost: one
 * exponential.
 */
public final class Normal {
  private static final double SQRT_HALF = 0.7071067811865476;
  private static final double SQRT_HALF_REST = -4.833646656726457e-17;
  static final double INVERSE_SQRT_TWO_PI = 0.3989422804014327;
  private static final double SQRT_TWO_PI = 2.5066282746310002;
  private static final double INVERSE_SQRT_PI = 0.5641895835477563;
  private static final double LOG_SQRT_TWO_PI = 0.9189385332046728;

  private static final double[] A = {
    3.16112374387056560e00,
    1.13864154151050156e02,
    3.77485237685302021e02,
    3.20937758913846947e03,
    1.85777706184603153e-1
  };
  private static final double[] B = {
    2.36012909523441209e01, 2.44024637934444173e02, 1.28261652607737228e03, 2.84423683343917062e03
  };
  private static final double[] C = {
    5.64188496988670089e-1, 8.88314979438837594e00, 6.61191906371416295e01,
    2.98635138197400131e02, 8.81952221241769090e02, 1.71204761263407058e03,
    2.05107837782607147e03, 1.23033935479799725e03, 2.15311535474403846e-8
  };
  private static final double[] D = {
    1.57449261107098347e01, 1.17693950891312499e02, 5.37181101862009858e02,
    1.62138957456669019e03, 3.29079923573345963e03, 4.36261909014324716e03,
    3.43936767414372164e03, 1.23033935480374942e03
  };
  private static final double[] P = {
    3.05326634961232344e-1, 3.60344899949804439e-1, 1.25781726111229246e-1,
    1.60837851487422766e-2, 6.58749161529837803e-4, 1.63153871373020978e-2
  };
  private static final double[] Q = {
    2.56852019228982242e00,
    1.87295284992346725e00,
    5.27905102951428412e-1,
    6.05183413124413191e-2,
    2.33520497626869185e-3
  };

  private Normal() {}

  /** Returns the density at {@code x}. */
  public static double density(double x) {
    return expOfHalfSquare(x) / SQRT_TWO_PI;
  }

  /** Returns the logarithm of the density at {@code x}. */
  public static double logDensity(double x) {
    return -0.5 * x * x - LOG_SQRT_TWO_PI;
  }

  /** Returns P(Z ≤ x). */
  public static double cdf(double x) {
    return survival(-x);
  }

  /** Returns P(Z > x). */
  public static double survival(double x) {
    if (Double.isNaN(x)) {
      throw new IllegalArgumentException("x is NaN; it must be a number");
    }
    if (x > 39) {
      return 0;
    }
    if (x < -9) {
      return 1;
    }
    double u = SQRT_HALF * x;
    if (Math.abs(u) <= 0.46875) {
      return 0.5 - 0.5 * centralErf(u + SQRT_HALF_REST * x);
    }
    double tail = 0.5 * expOfHalfSquare(x) * scaledErfc(Math.abs(u));
    return x > 0 ? tail : 1 - tail;
  }

  /**
   * Returns P(0 &lt; Z ≤ x) for x > 0, and minus that of -x for x &lt; 0: odd, never cancelling.
   */
  public static double central(double x) {
    double u = SQRT_HALF * x;
    if (Math.abs(u) <= 0.46875) {
      return 0.5 * centralErf(u);
    }
    return Math.copySign(0.5 - survival(Math.abs(x)), x);
  }

  /** Returns P(a &lt; Z ≤ b), without cancellation when both lie in one tail; 0 if a ≥ b. */
  public static double interval(double a, double b) {
    if (a >= b) {
      return 0;
    }
    if (b - a < 0.25 && Math.abs(a) < 40) {
      return shortInterval(a, b - a);
    }
    if (a > 0) {
      return survival(a) - survival(b);
    }
    if (b < 0) {
      return cdf(b) - cdf(a);
    }
    return central(b) - central(a);
  }

  /** Six-point Gauss rule; for a width up to 1/4 its error is below 1e-17 of the value. */
  private static double shortInterval(double a, double width) {
    double half = 0.5 * width;
    double centre = a + half;
    // exp(-(c+h)²/2) = exp(-c²/2) exp(-hc - h²/2): the pairs add to a cosh.
    double sum = 0;
    for (int i = 0; i < GAUSS_NODES.length; i++) {
      double h = half * GAUSS_NODES[i];
      sum += GAUSS_WEIGHTS[i] * 2 * StrictMath.exp(-0.5 * h * h) * StrictMath.cosh(h * centre);
    }
    return density(centre) * half * sum;
  }

  // Abramowitz and Stegun (1964), table 25.4, n = 10, positive half.
  private static final double[] GAUSS_NODES = {
    0.14887433898163122,
    0.4333953941292472,
    0.6794095682990244,
    0.8650633666889845,
    0.9739065285171717
  };
  private static final double[] GAUSS_WEIGHTS = {
    0.29552422471475287,
    0.26926671930999635,
    0.21908636251598204,
    0.1494513491505806,
    0.06667134430868814
  };

  /** Returns log P(Z ≤ x). */
  public static double logCdf(double x) {
    return logSurvival(-x);
  }

  /** Returns log P(Z > x), also where the tail itself underflows. */
  public static double logSurvival(double x) {
    if (x < 1) {
      return StrictMath.log1p(-survival(-x));
    }
    return StrictMath.log(0.5 * scaledErfc(SQRT_HALF * x)) - 0.5 * x * x;
  }

  /**
   * Returns log P(a &lt; Z ≤ b), also where the probability underflows; minus infinity if a ≥ b.
   */
  static double logInterval(double a, double b) {
    if (a >= b) {
      return Double.NEGATIVE_INFINITY;
    }
    if (a + b < 0) {
      return logInterval(-b, -a);
    }
    if (a < 10 || b - a < 0.25 && a < 30) {
      return StrictMath.log(interval(a, b));
    }
    double nearer = logSurvival(a);
    return nearer + StrictMath.log(-StrictMath.expm1(logSurvival(b) - nearer));
  }

  /** Returns P(Z > x) exp(x²/2) for x ≥ 0: Mills' ratio divided by the square root of 2π. */
  public static double scaledSurvival(double x) {
    double u = SQRT_HALF * x;
    if (u <= 0.46875) {
      return survival(x) / expOfHalfSquare(x);
    }
    return 0.5 * scaledErfc(u);
  }

  /**
   * Returns the x with P(Z ≤ x) = p; infinite at 0 and 1.
   *
   * @throws IllegalArgumentException if p is outside [0, 1]
   */
  public static double quantile(double p) {
    return -survivalQuantile(p);
  }

  /**
   * Returns the x with P(Z > x) = q; infinite at 0 and 1.
   *
   * @throws IllegalArgumentException if q is outside [0, 1]
   */
  public static double survivalQuantile(double q) {
    if (!(q >= 0 && q <= 1)) {
      throw new IllegalArgumentException("the probability is " + q + "; it must lie in [0, 1]");
    }
    if (q == 0) {
      return Double.POSITIVE_INFINITY;
    }
    if (q == 1) {
      return Double.NEGATIVE_INFINITY;
    }
    if (q == 0.5) {
      return 0;
    }
    if (q > 0.5) {
      // 1 - q is exact from 1/2 on.
      return -survivalQuantile(1 - q);
    }
    // Abramowitz and Stegun (1964), 26.2.23, wrong by less than 4.5e-4; each of Halley's steps
    // triples the digits.
    double logQ = StrictMath.log(q);
    double t = Math.sqrt(-2 * logQ);
    double x =
        t
            - (2.515517 + t * (0.802853 + t * 0.010328))
                / (1 + t * (1.432788 + t * (0.189269 + t * 0.001308)));
    for (int step = 0; step < 2; step++) {
      double move;
      if (q > 0.2) {
        move = ((0.5 - q) - central(x)) / density(x);
      } else {
        // (Q(x) - q) / density, formed by logarithms because both underflow in the deep tail.
        double mills = scaledSurvival(x) * SQRT_TWO_PI;
        double excess = StrictMath.log(scaledSurvival(x)) - 0.5 * x * x - logQ;
        move = -mills * StrictMath.expm1(-excess);
      }
      x += move / (1 - 0.5 * x * move);
    }
    return x;
  }

  /** exp(-x²/2), the square's rounding error put back. */
  static double expOfHalfSquare(double x) {
    double square = x * x;
    double rest = Math.fma(x, x, -square);
    return square > 1500 ? 0 : StrictMath.exp(-0.5 * square) * (1 - 0.5 * rest);
  }

  /** erf(u) for |u| ≤ 0.46875. */
  private static double centralErf(double u) {
    double v = u * u;
    double num = A[4] * v;
    double den = v;
    for (int i = 0; i < 3; i++) {
      num = (num + A[i]) * v;
      den = (den + B[i]) * v;
    }
    return u * (num + A[3]) / (den + B[3]);
  }

  /** erfc(u) exp(u²) for u > 0.46875. */
  private static double scaledErfc(double u) {
    if (u <= 4) {
      double num = C[8] * u;
      double den = u;
      for (int i = 0; i < 7; i++) {
        num = (num + C[i]) * u;
        den = (den + D[i]) * u;
      }
      return (num + C[7]) / (den + D[7]);
    }
    double v = 1 / (u * u);
    double num = P[5] * v;
    double den = v;
    for (int i = 0; i < 4; i++) {
      num = (num + P[i]) * v;
      den = (den + Q[i]) * v;
    }
    double correction = v * (num + P[4]) / (den + Q[4]);
    return (INVERSE_SQRT_PI - correction) / u;
  }
}
