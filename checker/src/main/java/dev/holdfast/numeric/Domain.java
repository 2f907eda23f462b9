package dev.holdfast.numeric;

/** Checks of arguments; every message names the argument, its value and the range. */
final class Domain {
  /** Bounds on degrees of freedom: beyond them no study lies, and doubles begin to fail. */
  static final double LEAST_DF = 1e-3;

  static final double GREATEST_DF = 1e12;

  /** Bound on a noncentrality that is a sum of squares. */
  static final double GREATEST_SQUARE = 1e12;

  private Domain() {}

  static double degreesOfFreedom(String name, double value) {
    return within(name, value, LEAST_DF, GREATEST_DF);
  }

  static double within(String name, double value, double low, double high) {
    if (!(value >= low && value <= high)) {
      throw new IllegalArgumentException(
          name + " is " + value + "; it must lie in [" + low + ", " + high + "]");
    }
    return value;
  }

  static double probability(String name, double value) {
    return within(name, value, 0, 1);
  }

  static double number(String name, double value) {
    if (Double.isNaN(value)) {
      throw new IllegalArgumentException(name + " is NaN; it must be a number");
    }
    return value;
  }
}
