package dev.holdfast.design;

import dev.holdfast.numeric.NoncentralChiSquaredDistribution;
import org.apache.commons.statistics.distribution.ChiSquaredDistribution;

/** Power of a chi-square test from its noncentrality. */
public final class ChiSquarePower {
  private ChiSquarePower() {}

  /**
   * Chance that a chi-square statistic passes its critical value. The test has one side; the
   * level's sides are not heeded.
   *
   * <p>Patnaik (1949), Biometrika 36; Guenther (1977), The American Statistician 31.
   *
   * @param df degrees of freedom, above 0
   * @param noncentrality at least 0
   * @param level level of the test
   * @param ledger takes the critical value and the power
   */
  public static double power(double df, double noncentrality, Level level, Ledger ledger) {
    double critical = ChiSquaredDistribution.of(df).inverseSurvivalProbability(level.alpha());
    double power =
        NoncentralChiSquaredDistribution.of(df, noncentrality).survivalProbability(critical);
    ledger.step(
        "critical value of chi-square",
        "Xc = chi2(1 - alpha; df)",
        critical,
        "alpha",
        level.alpha(),
        "df",
        df);
    ledger.step(
        "power",
        "power = P(X > Xc), X noncentral chi-square(df, lambda)",
        power,
        "Xc",
        critical,
        "df",
        df,
        "lambda",
        noncentrality);
    return power;
  }
}
