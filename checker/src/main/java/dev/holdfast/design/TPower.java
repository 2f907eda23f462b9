package dev.holdfast.design;

import dev.holdfast.numeric.NoncentralTDistribution;
import org.apache.commons.statistics.distribution.TDistribution;

/** Power of a t test from its noncentrality. */
public final class TPower {
  private TPower() {}

  /**
   * Chance that a t statistic passes its critical value, both sides where the test has two.
   *
   * <p>Johnson, Kotz and Balakrishnan (1995), chapter 31.
   *
   * @param degreesOfFreedom above 0
   * @param noncentrality the statistic's expectation in standard errors, on the side assumed
   * @param level level of the test
   * @param ledger takes the critical value and the power
   */
  public static double power(
      double degreesOfFreedom, double noncentrality, Level level, Ledger ledger) {
    double critical =
        TDistribution.of(degreesOfFreedom).inverseSurvivalProbability(level.perSide());
    NoncentralTDistribution statistic = NoncentralTDistribution.of(degreesOfFreedom, noncentrality);
    double power =
        level.twoSided()
            ? statistic.probabilityOutside(critical)
            : statistic.survivalProbability(critical);
    ledger.step(
        "critical value of t",
        level.twoSided() ? "tc = t(1 - alpha/2; df)" : "tc = t(1 - alpha; df)",
        critical,
        "alpha",
        level.alpha(),
        "df",
        degreesOfFreedom);
    ledger.step(
        "power",
        level.twoSided()
            ? "power = P(T > tc) + P(T < -tc), T noncentral t(df, delta)"
            : "power = P(T > tc), T noncentral t(df, delta)",
        power,
        "tc",
        critical,
        "df",
        degreesOfFreedom,
        "delta",
        noncentrality);
    return power;
  }
}
