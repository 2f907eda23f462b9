package dev.holdfast.design.categories;

import dev.holdfast.design.InputException;
import dev.holdfast.design.Inputs;

/** Reads shares that make up a whole, and measures how far they lie from others. */
final class Shares {
  /** What each share may be off by, since plans print two decimals. */
  private static final double ROUNDING = 0.005;

  /** What many shares together may be off by. */
  private static final double MOST = 0.02;

  private Shares() {}

  /**
   * Scales shares so that they add up to 1.
   *
   * @param key the key of the plan that gave them
   * @throws InputException if one is below 0, or their sum is further from 1 than rounding explains
   */
  static double[] whole(String key, double[] shares) {
    double sum = 0;
    for (double share : shares) {
      if (!(share >= 0)) {
        throw InputException.unfit(key, "no share of " + key + " may be below 0");
      }
      sum += share;
    }
    if (shares.length < 2) {
      throw InputException.unfit(key, key + " must give two shares or more");
    }
    if (Math.abs(sum - 1) > Math.min(MOST, ROUNDING * shares.length) + 1e-9) {
      throw InputException.unfit(key, "the shares of " + key + " do not add up to 1");
    }
    double[] whole = new double[shares.length];
    for (int i = 0; i < whole.length; i++) {
      whole[i] = shares[i] / sum;
    }
    return whole;
  }

  /**
   * The chi-square distance of assumed shares from those expected, the square of w.
   *
   * @param expected all above 0
   */
  static double distance(double[] assumed, double[] expected) {
    double sum = 0;
    for (int i = 0; i < assumed.length; i++) {
      double apart = assumed[i] - expected[i];
      sum += apart * apart / expected[i];
    }
    return sum;
  }

  /** Refuses shares expected that are 0: no count can be compared with them. */
  static void occupied(String key, double[] expected, String what) {
    for (double share : expected) {
      if (!(share > 0)) {
        throw InputException.unfit(key, what + " has the share 0 throughout: leave it out");
      }
    }
  }

  /**
   * Rows of one length, two or more.
   *
   * @throws InputException if they are not
   */
  static void rectangular(String key, double[][] rows) {
    for (double[] row : rows) {
      if (row.length != rows[0].length) {
        throw InputException.unfit(key, "the rows of " + key + " differ in length");
      }
    }
    if (rows.length < 2 || rows[0].length < 2) {
      throw InputException.unfit(key, key + " must have two rows and two columns or more");
    }
  }

  /**
   * A stated number of categories, rows or columns.
   *
   * @param what the number, as a phrase
   * @param instead the key of the table that would do instead
   */
  static double count(Inputs inputs, String key, String what, String instead) {
    double count =
        inputs
            .number(key)
            .orElseThrow(() -> InputException.missing(what + " (" + key + ")", key, instead));
    if (!(count >= 2 && count == Math.rint(count))) {
      throw InputException.unfit(key, key + " must be a whole number from 2");
    }
    return count;
  }
}
