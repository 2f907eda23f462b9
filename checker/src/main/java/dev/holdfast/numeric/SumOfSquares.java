package dev.holdfast.numeric;

/** First guesses at quantiles of noncentral chi-square sums and their ratios. */
final class SumOfSquares {
  private SumOfSquares() {}

  /**
   * The quantile at normal deviate z: a central distribution of the same first two moments (Patnaik
   * 1949, Biometrika 36, 202-232), its cube root taken as normal (Wilson and Hilferty 1931).
   */
  static double guess(double df, double noncentrality, double z) {
    double mean = df + noncentrality;
    double equivalent = mean * mean / (df + 2 * noncentrality);
    double c = 2 / (9 * equivalent);
    double root = 1 - c + z * Math.sqrt(c);
    if (root > 0.2) {
      return mean * root * root * root;
    }
    return power(df, noncentrality, z);
  }

  /** The numerator's quantile where the distribution function is a power of it. */
  private static double power(double df, double noncentrality, double z) {
    double a = 0.5 * df;
    double logGamma =
        LogTerms.stirlingError(a) + (a + 0.5) * StrictMath.log(a) - a + 0.5 * LogTerms.LOG_TWO_PI;
    double logP = Normal.logCdf(z) + Math.min(0.5 * noncentrality, 300);
    double value = 2 * StrictMath.exp((logP + logGamma) / a);
    return Math.max(1e-290, Math.min(df + noncentrality, value));
  }

  /** The same for the ratio to a central mean square (Paulson 1942), times the numerator's df. */
  static double guessRatio(double df, double denominatorDf, double noncentrality, double z) {
    double mean = df + noncentrality;
    double equivalent = mean * mean / (df + 2 * noncentrality);
    double a = 1 - 2 / (9 * equivalent);
    double b = 1 - 2 / (9 * denominatorDf);
    double va = 1 - a;
    double vb = 1 - b;
    double lead = b * b - z * z * vb;
    double inner = z * z * (a * a * vb + b * b * va - z * z * va * vb);
    if (a > 0 && b > 0 && lead > 0.1 * b * b && inner >= 0) {
      double root = (a * b + Math.copySign(Math.sqrt(inner), z)) / lead;
      if (root > 0.2) {
        return mean * root * root * root;
      }
    }
    if (z < 0) {
      return power(df, noncentrality, z);
    }
    return Math.min(1e300, mean * (denominatorDf / Math.max(1e-280, guess(denominatorDf, 0, -z))));
  }
}
