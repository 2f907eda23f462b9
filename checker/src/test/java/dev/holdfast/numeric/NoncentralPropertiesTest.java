package dev.holdfast.numeric;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.constraints.DoubleRange;
import net.jqwik.api.constraints.Scale;
import org.apache.commons.statistics.distribution.ChiSquaredDistribution;
import org.apache.commons.statistics.distribution.ContinuousDistribution;
import org.apache.commons.statistics.distribution.FDistribution;
import org.apache.commons.statistics.distribution.TDistribution;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** What must hold of a distribution anywhere in its domain. */
class NoncentralPropertiesTest {
  private static void isALaw(ContinuousDistribution law, double x) {
    double lower = law.cumulativeProbability(x);
    double upper = law.survivalProbability(x);
    assertTrue(lower >= 0 && lower <= 1, () -> "cdf " + lower);
    assertTrue(upper >= 0 && upper <= 1, () -> "survival " + upper);
    assertEquals(1, lower + upper, 2e-14);
  }

  private static void returns(ContinuousDistribution law, double p) {
    double x = law.inverseCumulativeProbability(p);
    assertEquals(p, law.cumulativeProbability(x), 1e-10 * p);
    double y = law.inverseSurvivalProbability(p);
    assertEquals(p, law.survivalProbability(y), 1e-10 * p);
  }

  @Property(tries = 300)
  void theTailsOfNoncentralTAddUpToOne(
      @ForAll @DoubleRange(min = 0.5, max = 1e6) double df,
      @ForAll @DoubleRange(min = -40, max = 40) double delta,
      @ForAll @DoubleRange(min = -60, max = 60) double t) {
    isALaw(NoncentralTDistribution.of(df, delta), t);
  }

  @Property(tries = 200)
  void theTailsOfNoncentralFAddUpToOne(
      @ForAll @DoubleRange(min = 0.5, max = 200) double df1,
      @ForAll @DoubleRange(min = 0.5, max = 1e5) double df2,
      @ForAll @DoubleRange(min = 0, max = 500) double lambda,
      @ForAll @DoubleRange(min = 0, max = 50) double f) {
    isALaw(NoncentralFDistribution.of(df1, df2, lambda), f);
  }

  @Property(tries = 200)
  void theTailsOfNoncentralChiSquareAddUpToOne(
      @ForAll @DoubleRange(min = 0.5, max = 1e4) double df,
      @ForAll @DoubleRange(min = 0, max = 1e4) double lambda,
      @ForAll @DoubleRange(min = 0, max = 3e4) double x) {
    isALaw(NoncentralChiSquaredDistribution.of(df, lambda), x);
  }

  @Property(tries = 60)
  void quantilesReturnTheirProbability(
      @ForAll @DoubleRange(min = 1, max = 1e4) double df,
      @ForAll @DoubleRange(min = 0, max = 20) double delta,
      @ForAll @DoubleRange(min = 1e-8, max = 0.5) @Scale(10) double p) {
    returns(NoncentralTDistribution.of(df, delta), p);
    returns(NoncentralChiSquaredDistribution.of(df, delta * delta), p);
    returns(NoncentralFDistribution.of(3, df, delta * delta), p);
  }

  @Property(tries = 100)
  void powerRisesWithTheNoncentrality(
      @ForAll @DoubleRange(min = 1, max = 1e5) double df,
      @ForAll @DoubleRange(min = 0, max = 6) double delta) {
    double low = NoncentralTDistribution.of(df, delta).survivalProbability(2);
    double high = NoncentralTDistribution.of(df, delta + 0.01).survivalProbability(2);
    assertTrue(high > low);
  }

  @ParameterizedTest
  @CsvSource({"3, 1.7", "12.5, -2.2", "1000, 0.1"})
  void withoutNoncentralityEachIsItsCentralLaw(double df, double x) {
    assertEquals(
        1,
        NoncentralTDistribution.of(df, 0).survivalProbability(x)
            / TDistribution.of(df).survivalProbability(x),
        1e-13);
    double y = x * x;
    assertEquals(
        1,
        NoncentralChiSquaredDistribution.of(df, 0).survivalProbability(y)
            / ChiSquaredDistribution.of(df).survivalProbability(y),
        1e-13);
    assertEquals(
        1,
        NoncentralFDistribution.of(2, df, 0).survivalProbability(y)
            / FDistribution.of(2, df).survivalProbability(y),
        1e-13);
  }

  @Test
  void withoutLimitOfDegreesOfFreedomTIsTheShiftedNormal() {
    double far = NoncentralTDistribution.of(Double.POSITIVE_INFINITY, 2.5).survivalProbability(2);
    assertEquals(Normal.survival(-0.5), far, 1e-16);
    assertEquals(far, NoncentralTDistribution.of(1e12, 2.5).survivalProbability(2), 1e-11);
  }

  @Test
  void theNoncentralityOfAPowerGivesThatPower() {
    double delta = NoncentralTDistribution.noncentralityFor(126, 1.979, 0.8);
    assertEquals(0.8, NoncentralTDistribution.of(126, delta).survivalProbability(1.979), 1e-13);
  }

  // Haynam, Govindarajulu, Leone (1970), Selected Tables in Mathematical Statistics, volume 1: the
  // noncentrality that gives a wanted power at alpha 0.05. From memory, not looked up.
  @ParameterizedTest
  @CsvSource({
    "1, 10.507, 0.90",
    "2, 12.654, 0.90",
    "3, 10.903, 0.80",
    "3, 14.171, 0.90",
    "4, 15.405, 0.90",
    "5, 12.828, 0.80",
    "6, 13.624, 0.80",
    "7, 14.351, 0.80",
    "10, 16.241, 0.80",
    "10, 20.532, 0.90"
  })
  void tabledNoncentralityGivesItsPower(int df, double noncentrality, double power) {
    double critical = ChiSquaredDistribution.of(df).inverseSurvivalProbability(0.05);
    // The printed figure stands for every value within half a unit of its third decimal.
    double below =
        NoncentralChiSquaredDistribution.of(df, noncentrality - 5e-4).survivalProbability(critical);
    double above =
        NoncentralChiSquaredDistribution.of(df, noncentrality + 5e-4).survivalProbability(critical);
    assertTrue(below <= power && power <= above, below + " to " + above);
  }

  @ParameterizedTest
  @CsvSource({"-1, 0", "0, 0", "1e300, 1", "Infinity, 1"})
  void beyondTheMassBothTailsEndExactly(double x, double cumulative) {
    NoncentralChiSquaredDistribution law = NoncentralChiSquaredDistribution.of(2.5, 40);
    assertEquals(cumulative, law.cumulativeProbability(x), 1e-14);
    assertEquals(1 - cumulative, law.survivalProbability(x), 1e-14);
  }

  @ParameterizedTest
  @CsvSource({"0.5", "3", "40"})
  void theDensityIsTheSlopeOfTheCumulative(double x) {
    double h = 1e-5 * x;
    for (ContinuousDistribution law :
        new ContinuousDistribution[] {
          NoncentralTDistribution.of(7, 1.5),
          NoncentralChiSquaredDistribution.of(7, 12),
          NoncentralFDistribution.of(4, 30, 12),
        }) {
      double slope =
          (law.cumulativeProbability(x + h) - law.cumulativeProbability(x - h)) / (2 * h);
      assertEquals(slope, law.density(x), 1e-7 + 1e-6 * slope);
    }
  }

  @Test
  void aParameterOutsideItsRangeIsNamedWithItsValue() {
    IllegalArgumentException refused =
        assertThrows(
            IllegalArgumentException.class, () -> NoncentralChiSquaredDistribution.of(1, -1));
    assertTrue(refused.getMessage().contains("noncentrality is -1.0"), refused.getMessage());
  }
}
