package dev.holdfast.numeric;

import org.apache.commons.numbers.gamma.RegularizedBeta;

/**
 * Terms and tails of the binomial law, both tails to full relative accuracy.
 *
 * <p>Tails by the incomplete beta function, terms in the saddle-point form of Loader (2000), by
 * {@link LogTerms}.
 */
public final class Binomial {
  private Binomial() {}

  /** Chance of exactly x successes in n trials. */
  public static double term(double x, double n, double p) {
    return x < 0 || x > n ? 0 : term(x, n - x, p, 1 - p);
  }

  /** The term for x successes and the rest failures, p and q adding up to one. */
  private static double term(double x, double rest, double p, double q) {
    double n = x + rest;
    if (p == 0) {
      return x == 0 ? 1 : 0;
    }
    if (q == 0) {
      return rest == 0 ? 1 : 0;
    }
    if (x == 0) {
      return StrictMath.exp(p < 0.1 ? n * StrictMath.log1p(-p) : n * StrictMath.log(q));
    }
    if (rest == 0) {
      return StrictMath.exp(q < 0.1 ? n * StrictMath.log1p(-q) : n * StrictMath.log(p));
    }
    double difference = Math.fma(n, p, -x);
    double exponent =
        LogTerms.stirlingError(n)
            - LogTerms.stirlingError(x)
            - LogTerms.stirlingError(rest)
            - LogTerms.deviance(x, n * p, difference)
            - LogTerms.deviance(rest, n * q, Math.fma(n, q, -rest));
    return StrictMath.exp(exponent - 0.5 * LogTerms.LOG_TWO_PI) * Math.sqrt(n / x / rest);
  }

  /** Chance of at most x successes in n trials. */
  public static double atMost(double x, double n, double p) {
    if (x < 0) {
      return 0;
    }
    if (x >= n) {
      return 1;
    }
    return RegularizedBeta.complement(p, x + 1, n - x);
  }

  /** Chance of at least x successes in n trials. */
  public static double atLeast(double x, double n, double p) {
    if (x <= 0) {
      return 1;
    }
    if (x > n) {
      return 0;
    }
    return RegularizedBeta.value(p, x, n - x + 1);
  }

  /** Smallest number whose chance to be reached is not above a level; n + 1 if there is none. */
  static long upperCritical(long n, double p, double level) {
    long low = 0;
    long high = n + 1;
    while (low < high) {
      long middle = (low + high) >>> 1;
      if (atLeast(middle, n, p) <= level * ExactTests.TIE) {
        high = middle;
      } else {
        low = middle + 1;
      }
    }
    return low;
  }

  /** Largest number whose chance not to be passed is not above a level; -1 if there is none. */
  static long lowerCritical(long n, double p, double level) {
    long low = -1;
    long high = n;
    while (low < high) {
      long middle = (low + high + 1) >> 1;
      if (atMost(middle, n, p) <= level * ExactTests.TIE) {
        low = middle;
      } else {
        high = middle - 1;
      }
    }
    return low;
  }

  /** How far from its mean a sum of yes-or-no trials of a given variance can matter. */
  static double reach(double variance) {
    return 9 * Math.sqrt(variance) + 40;
  }

  /**
   * The numbers of successes that can matter: all but a chance below 1e-16 on each side.
   *
   * @return first and last
   */
  static long[] window(long n, double p) {
    double centre = n * p;
    double reach = reach(n * p * (1 - p));
    return new long[] {
      (long) Math.max(0, Math.floor(centre - reach)), (long) Math.min(n, Math.ceil(centre + reach))
    };
  }
}
