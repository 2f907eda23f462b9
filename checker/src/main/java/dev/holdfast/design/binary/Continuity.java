package dev.holdfast.design.binary;

import dev.holdfast.design.Ledger;

/**
 * The continuity correction of the normal tests of shares, turned into the part of a sample that it
 * leaves.
 *
 * <p>Casagrande, Pike and Smith (1978), Biometrics 34, give the corrected size n' of each group
 * from the uncorrected n, Fleiss, Tytun and Ury (1980), Biometrics 36, for groups in the ratio r:
 * sqrt(n) = sqrt(n') - (r + 1)/(2 r difference sqrt(n')). Read from n' to n this is a power formula
 * whose least sample is the printed one.
 */
final class Continuity {
  private Continuity() {}

  /** The part left of a single sample, in [0, 1]; the correction is half a count. */
  static double left(double difference, double n, Ledger ledger) {
    double part = part(1 / n, difference);
    ledger.step(
        "part of the sample left by the correction",
        "c = (1 - 1/(2*difference*n))^2, 0 where the bracket is below 0",
        part,
        "difference",
        difference,
        "n",
        n);
    return part;
  }

  /** The part left of two groups, in [0, 1]; the correction is half a count in each. */
  static double left(double difference, double n1, double n2, Ledger ledger) {
    double part = part(1 / n1 + 1 / n2, difference);
    ledger.step(
        "part of the sample left by the correction",
        "c = (1 - (1/n1 + 1/n2)/(2*difference))^2, 0 where the bracket is below 0",
        part,
        "n1",
        n1,
        "n2",
        n2,
        "difference",
        difference);
    return part;
  }

  private static double part(double counts, double difference) {
    double root = difference > 0 ? Math.max(0, 1 - counts / (2 * difference)) : 0;
    return root * root;
  }
}
