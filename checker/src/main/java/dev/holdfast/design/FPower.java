package dev.holdfast.design;

import dev.holdfast.numeric.NoncentralFDistribution;
import org.apache.commons.statistics.distribution.FDistribution;

/** Power of an F test from its noncentrality. */
public final class FPower {
  private FPower() {}

  /**
   * Chance that an F statistic passes its critical value. An F test has one side; the level's sides
   * are not heeded.
   *
   * <p>Patnaik (1949), Biometrika 36; Johnson, Kotz and Balakrishnan (1995), chapter 30.
   *
   * @param df1 degrees of freedom of the numerator, above 0
   * @param df2 degrees of freedom of the denominator, above 0
   * @param noncentrality at least 0
   * @param level level of the test
   * @param ledger takes the critical value and the power
   */
  public static double power(
      double df1, double df2, double noncentrality, Level level, Ledger ledger) {
    double critical = FDistribution.of(df1, df2).inverseSurvivalProbability(level.alpha());
    double power =
        NoncentralFDistribution.of(df1, df2, noncentrality).survivalProbability(critical);
    ledger.step(
        "critical value of F",
        "Fc = F(1 - alpha; df1, df2)",
        critical,
        "alpha",
        level.alpha(),
        "df1",
        df1,
        "df2",
        df2);
    ledger.step(
        "power",
        "power = P(F > Fc), F noncentral F(df1, df2, lambda)",
        power,
        "Fc",
        critical,
        "df1",
        df1,
        "df2",
        df2,
        "lambda",
        noncentrality);
    return power;
  }
}
