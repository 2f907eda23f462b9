package dev.holdfast.design.continuous;

import java.util.Arrays;

/**
 * How the means of several groups lie to each other, whatever the scale. It gives the SD of the
 * means about their centre, both weighted by the sizes of the groups; times the total number, its
 * square is the noncentrality of the F test.
 */
interface GroupPattern {
  /**
   * SD of the means, weighted.
   *
   * @param sizes of the groups, or their shares
   */
  double spread(double[] sizes);

  /** Nothing is known but the SD of the means, which is taken as it is whatever the sizes. */
  GroupPattern UNKNOWN = sizes -> 1;

  /**
   * Of all patterns in which two means lie one apart, the one with the smallest spread: the two
   * smallest groups lie apart, and the others at the weighted centre of these two.
   */
  GroupPattern LEAST_FAVOURABLE =
      sizes -> {
        double[] sorted = sizes.clone();
        Arrays.sort(sorted);
        return Math.sqrt(sorted[0] * sorted[1] / (sorted[0] + sorted[1]) / sum(sizes));
      };

  /** The means themselves. */
  static GroupPattern of(double[] means) {
    return sizes -> {
      double total = sum(sizes);
      double centre = 0;
      for (int i = 0; i < means.length; i++) {
        centre += sizes[i] * means[i];
      }
      centre /= total;
      double square = 0;
      for (int i = 0; i < means.length; i++) {
        square += sizes[i] * (means[i] - centre) * (means[i] - centre);
      }
      return Math.sqrt(square / total);
    };
  }

  private static double sum(double[] sizes) {
    double sum = 0;
    for (double size : sizes) {
      sum += size;
    }
    return sum;
  }
}
