package dev.holdfast.design;

import java.util.Arrays;
import java.util.List;

/**
 * How a sample is divided over its groups.
 *
 * <p>Immutable; weights are relative to the smallest group, whose weight is 1.
 */
public final class Allocation {
  private final double[] weights;

  private Allocation(double[] weights) {
    this.weights = weights;
  }

  /** Groups of equal size. */
  public static Allocation equal(int groups) {
    double[] weights = new double[groups];
    Arrays.fill(weights, 1);
    return new Allocation(weights);
  }

  /**
   * Groups of given relative size.
   *
   * @throws IllegalArgumentException if there is none, or one is not above 0
   */
  public static Allocation of(List<Double> relative) {
    double smallest = Double.POSITIVE_INFINITY;
    for (double value : relative) {
      if (!(value > 0) || Double.isInfinite(value)) {
        throw new IllegalArgumentException(
            "relative size of a group: " + value + " is not above 0");
      }
      smallest = Math.min(smallest, value);
    }
    if (relative.isEmpty()) {
      throw new IllegalArgumentException("an allocation needs a group");
    }
    double[] weights = new double[relative.size()];
    for (int i = 0; i < weights.length; i++) {
      weights[i] = relative.get(i) / smallest;
    }
    return new Allocation(weights);
  }

  /** Number of groups. */
  public int groups() {
    return weights.length;
  }

  /** Sum of the weights: the total for each unit of the smallest group. */
  public double sum() {
    double sum = 0;
    for (double weight : weights) {
      sum += weight;
    }
    return sum;
  }

  /** Real sizes for a real size of the smallest group. */
  public double[] sizes(double smallest) {
    double[] sizes = new double[weights.length];
    for (int i = 0; i < sizes.length; i++) {
      sizes[i] = smallest * weights[i];
    }
    return sizes;
  }

  /** Whole sizes for a whole size of the smallest group, the others rounded up. */
  public double[] wholeSizes(long smallest) {
    double[] sizes = sizes(smallest);
    for (int i = 0; i < sizes.length; i++) {
      sizes[i] = up(sizes[i]);
    }
    return sizes;
  }

  /** Whole sizes that add up to a total, as near to the weights as can be. */
  public double[] split(long total) {
    double[] sizes = sizes(total / sum());
    long left = total;
    for (int i = 0; i < sizes.length; i++) {
      left -= (long) Math.floor(sizes[i]);
    }
    double[] whole = new double[sizes.length];
    boolean[] raised = new boolean[sizes.length];
    for (int i = 0; i < sizes.length; i++) {
      whole[i] = Math.floor(sizes[i]);
    }
    for (long k = 0; k < left; k++) {
      int next = -1;
      for (int i = 0; i < sizes.length; i++) {
        if (!raised[i] && (next < 0 || sizes[i] - whole[i] > sizes[next] - whole[next])) {
          next = i;
        }
      }
      whole[next]++;
      raised[next] = true;
    }
    return whole;
  }

  /** Rounds up, forgiving the last bits of a product that should be whole. */
  static double up(double size) {
    return Math.ceil(size - 1e-9 * Math.max(1, size));
  }
}
