package dev.holdfast.family;

/** Chances of several independent tests together. */
public final class JointPower {
  private JointPower() {}

  /**
   * Chance that every test succeeds.
   *
   * @param powers power of each, independent of the others
   */
  public static double every(double[] powers) {
    double product = 1;
    for (double power : powers) {
      product *= power;
    }
    return product;
  }

  /** Chance that at least one succeeds. */
  public static double any(double[] powers) {
    double none = 1;
    for (double power : powers) {
      none *= 1 - power;
    }
    return 1 - none;
  }

  /** Expected number that succeed; needs no independence. */
  public static double expected(double[] powers) {
    double sum = 0;
    for (double power : powers) {
      sum += power;
    }
    return sum;
  }

  /**
   * Chance that every test of a fixed sequence succeeds, and the expected number of successes, both
   * when a test is made only after all before it succeeded.
   *
   * @param powers in the order of the sequence
   * @return expected number of successes
   */
  public static double expectedInSequence(double[] powers) {
    double reached = 1;
    double sum = 0;
    for (double power : powers) {
      reached *= power;
      sum += reached;
    }
    return sum;
  }
}
