package dev.holdfast.numeric;

import java.util.function.DoubleFunction;

/** The inverse of an upper tail in the noncentrality, in which every such tail increases. */
final class NoncentralitySearch {
  private NoncentralitySearch() {}

  /**
   * Returns the noncentrality of sum-of-squares kind, solved for its square root.
   *
   * @param family the distribution with a given noncentrality
   * @param df degrees of freedom of the numerator, for the starting point
   * @param scaled the critical value on the scale of the numerator's sum of squares
   */
  static double square(
      DoubleFunction<TwoTailed> family, double df, double scaled, double x, double survival) {
    double least = family.apply(0).survivalProbability(x);
    if (!(survival >= least && survival < 1)) {
      throw outside(survival, "[" + least + ", 1), " + least + " being reached without an effect");
    }
    if (survival == least) {
      return 0;
    }
    double z = -Normal.survivalQuantile(survival);
    double start = Math.sqrt(Math.max(1, scaled - df + z * Math.sqrt(2 * df + 4 * scaled)));
    double logWanted = StrictMath.log(Math.min(survival, 1 - survival));
    double top = Math.sqrt(Domain.GREATEST_SQUARE);
    double root =
        Search.within(
            s -> gap(family.apply(Math.min(s * s, Domain.GREATEST_SQUARE)), x, survival, logWanted),
            0,
            -Double.MIN_NORMAL,
            top,
            start);
    if (Double.isNaN(root)) {
      throw outside(survival, "a range reached at a noncentrality up to " + Domain.GREATEST_SQUARE);
    }
    return root * root;
  }

  /** Returns the noncentrality that is a mean, positive or negative. */
  static double shift(
      DoubleFunction<TwoTailed> family, double df, double x, double survival, double greatest) {
    if (!(survival > 0 && survival < 1)) {
      throw outside(survival, "(0, 1)");
    }
    double z = -Normal.survivalQuantile(survival);
    double start = x + z * Math.sqrt(1 + x * x / (2 * df));
    double logWanted = StrictMath.log(Math.min(survival, 1 - survival));
    double clipped = Math.max(-greatest, Math.min(greatest, start));
    double root =
        Search.increasing(
            delta ->
                Math.abs(delta) > greatest
                    ? Math.copySign(1e9, delta)
                    : gap(family.apply(delta), x, survival, logWanted),
            clipped,
            Math.max(0.1, 0.02 * Math.abs(clipped)));
    double end = Math.copySign(greatest, root);
    if (Math.abs(root - end) < 1e-6 * greatest
        && gap(family.apply(end), x, survival, logWanted) * end < 0) {
      throw outside(survival, "a range reached at a noncentrality of size up to " + greatest);
    }
    return root;
  }

  /** Returns the noncentrality, not negative, that gives a two-sided test its power. */
  static double twoSided(
      DoubleFunction<NoncentralTDistribution> family,
      double df,
      double x,
      double outside,
      double greatest) {
    double least = family.apply(0).probabilityOutside(x);
    if (!(outside >= least && outside < 1)) {
      throw new IllegalArgumentException(
          "probabilityOutside is " + outside + "; it must lie in [" + least + ", 1)");
    }
    if (outside == least) {
      return 0;
    }
    double z = -Normal.survivalQuantile(outside);
    double logWanted = StrictMath.log(Math.min(outside, 1 - outside));
    double root =
        Search.within(
            delta -> {
              NoncentralTDistribution at = family.apply(delta);
              return outside <= 0.5
                  ? StrictMath.log(at.probabilityOutside(x)) - logWanted
                  : logWanted - StrictMath.log(Math.max(1e-300, at.probabilityInside(x)));
            },
            0,
            -Double.MIN_NORMAL,
            greatest,
            x + z * Math.sqrt(1 + x * x / (2 * df)));
    if (Double.isNaN(root)) {
      throw new IllegalArgumentException(
          "probabilityOutside is "
              + outside
              + "; no noncentrality up to "
              + greatest
              + " gives it");
    }
    return root;
  }

  /** Increases with the survival probability; formed from the smaller tail. */
  private static double gap(TwoTailed at, double x, double survival, double logWanted) {
    double gap =
        survival <= 0.5
            ? StrictMath.log(at.survivalProbability(x)) - logWanted
            : logWanted - StrictMath.log(at.cumulativeProbability(x));
    return Math.max(-1e9, Math.min(1e9, gap));
  }

  private static IllegalArgumentException outside(double survival, String range) {
    return new IllegalArgumentException(
        "survivalProbability is " + survival + "; it must lie in " + range);
  }
}
