package dev.holdfast.design;

import java.util.Optional;
import org.apache.commons.math3.analysis.UnivariateFunction;
import org.apache.commons.math3.analysis.solvers.BrentSolver;

/**
 * The least sample that reaches a target power, the ratio of the groups kept.
 *
 * <p>For a method that takes real sizes, the real solution is found and rounded; for an exact
 * enumeration, whose power saws, the first whole size that reaches the target is found by search.
 */
public final class LeastSample {
  /** Largest size of the smallest group that is tried. */
  static final double LARGEST = 1e9;

  /** Below this many steps a sawing power is searched from the bottom. */
  private static final long SCANNED_WHOLE = 64;

  private LeastSample() {}

  /**
   * A least sample.
   *
   * @param real size of the smallest group before rounding; whole for enumerations
   * @param sizes whole sizes, each group rounded up by itself
   * @param ratioKept whole sizes with the smallest group rounded up and the others in the ratio to
   *     it; not below {@code sizes}
   * @param realTotal total before rounding
   */
  public record Found(double real, double[] sizes, double[] ratioKept, double realTotal) {
    /** Total of the sizes rounded up group by group. */
    public long total() {
      return (long) sum(sizes);
    }

    /** Total of the sizes with the ratio kept. */
    public long totalRatioKept() {
      return (long) sum(ratioKept);
    }
  }

  /**
   * Searches the least sample.
   *
   * @param effect assumed effect, with a value
   * @param method method of its cell
   * @param allocation ratio of the groups
   * @param arms what the cell allows
   * @param level level of the test
   * @param target power to reach, in (0, 1)
   * @return empty if no sample within reach attains it, as when there is no effect
   */
  public static Optional<Found> find(
      Effect effect, Method method, Allocation allocation, Arms arms, Level level, double target) {
    return method.realSizes()
        ? real(effect, method, allocation, arms, level, target)
        : whole(effect, method, allocation, arms, level, target);
  }

  private static Optional<Found> real(
      Effect effect, Method method, Allocation allocation, Arms arms, Level level, double target) {
    UnivariateFunction excess =
        size -> effect.power(method, allocation.sizes(size), level, Ledger.closed()) - target;
    double low = arms.smallest();
    if (excess.value(low) >= 0) {
      return Optional.of(rounded(allocation, low));
    }
    double high = low;
    do {
      low = high;
      high = high * 2;
      if (high > LARGEST) {
        return Optional.empty();
      }
    } while (excess.value(high) < 0);
    double size = new BrentSolver(1e-13, 1e-10).solve(500, excess, low, high);
    return Optional.of(rounded(allocation, size));
  }

  private static Optional<Found> whole(
      Effect effect, Method method, Allocation allocation, Arms arms, Level level, double target) {
    long low = arms.smallest();
    long high = low;
    while (!reaches(effect, method, allocation, level, target, high)) {
      low = high + 1;
      high = high * 2;
      if (effect.beyondReach(method, allocation.wholeSizes(high)).isPresent()) {
        return Optional.empty();
      }
    }
    long first = high;
    while (low < first) {
      long middle = (low + first) >>> 1;
      if (reaches(effect, method, allocation, level, target, middle)) {
        first = middle;
      } else {
        low = middle + 1;
      }
    }
    // The power saws: a smaller size may reach the target although a larger one fails.
    long bottom = first <= SCANNED_WHOLE ? arms.smallest() : first - first / 5;
    for (long size = bottom; size < first; size++) {
      if (reaches(effect, method, allocation, level, target, size)) {
        first = size;
      }
    }
    double[] sizes = allocation.wholeSizes(first);
    return Optional.of(new Found(first, sizes, sizes, sum(sizes)));
  }

  private static boolean reaches(
      Effect effect, Method method, Allocation allocation, Level level, double target, long size) {
    return effect.power(method, allocation.wholeSizes(size), level, Ledger.closed()) >= target;
  }

  private static Found rounded(Allocation allocation, double size) {
    double[] real = allocation.sizes(size);
    double[] sizes = new double[real.length];
    for (int i = 0; i < sizes.length; i++) {
      sizes[i] = Allocation.up(real[i]);
    }
    double[] kept = allocation.wholeSizes((long) Allocation.up(size));
    return new Found(size, sizes, kept, sum(real));
  }

  private static double sum(double[] sizes) {
    double sum = 0;
    for (double size : sizes) {
      sum += size;
    }
    return sum;
  }
}
