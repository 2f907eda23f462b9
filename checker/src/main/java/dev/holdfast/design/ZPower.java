package dev.holdfast.design;

import org.apache.commons.statistics.distribution.NormalDistribution;

/** Power of a test with a normal reference from its noncentrality. */
public final class ZPower {
  private static final NormalDistribution NORMAL = NormalDistribution.of(0, 1);

  private ZPower() {}

  /** Upper quantile of the level on the side assumed, rounded where the level says so. */
  public static double critical(Level level) {
    double critical = NORMAL.inverseSurvivalProbability(level.perSide());
    return level.zDecimals().isPresent()
        ? rounded(critical, level.zDecimals().getAsInt())
        : critical;
  }

  /**
   * The power that counts as reached when quantiles are rounded: the normal probability of the
   * target's own rounded quantile. The target itself where nothing is rounded.
   */
  public static double effectiveTarget(double target, Level level) {
    if (level.zDecimals().isEmpty()) {
      return target;
    }
    double quantile = NORMAL.inverseCumulativeProbability(target);
    return NORMAL.cumulativeProbability(rounded(quantile, level.zDecimals().getAsInt()));
  }

  /**
   * Chance that a normal statistic passes its critical value on the side assumed. The other side's
   * share is left out, as in the published formulas for the number of observations; it is under
   * 0.001 wherever the power is above 0.2 at a level of 0.05.
   *
   * @param noncentrality the statistic's expectation in standard errors
   * @param level level of the test
   * @param ledger takes the critical value and the power
   */
  public static double power(double noncentrality, Level level, Ledger ledger) {
    return power(noncentrality, 1, level, ledger);
  }

  /**
   * The same for a statistic whose SD under the alternative is not that under the null hypothesis.
   *
   * @param noncentrality expectation in standard errors of the null hypothesis
   * @param spread SD under the alternative, in the same standard errors
   * @param level level of the test
   * @param ledger takes the critical value and the power
   */
  public static double power(double noncentrality, double spread, Level level, Ledger ledger) {
    double critical = critical(level);
    double power = NORMAL.cumulativeProbability((noncentrality - critical) / spread);
    ledger.step(
        "critical value of z",
        level.twoSided() ? "zc = z(1 - alpha/2)" : "zc = z(1 - alpha)",
        critical,
        "alpha",
        level.alpha());
    ledger.step(
        "power",
        spread == 1 ? "power = Phi(delta - zc)" : "power = Phi((delta - zc)/ratio)",
        power,
        "delta",
        noncentrality,
        "zc",
        critical,
        "ratio",
        spread);
    return power;
  }

  private static double rounded(double value, int decimals) {
    return java.math.BigDecimal.valueOf(value)
        .setScale(decimals, java.math.RoundingMode.HALF_UP)
        .doubleValue();
  }
}
