package dev.holdfast.numeric;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.apache.commons.statistics.distribution.ChiSquaredDistribution;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvFileSource;
import org.junit.jupiter.params.provider.CsvSource;

class NoncentralChiSquaredDistributionTest {

  @ParameterizedTest
  @CsvFileSource(resources = "/reference/power_chi2.csv", useHeadersInDisplayName = true)
  void powerAgreesWithTheThirtyDigitReference(
      String region, int df, double w, double n, double alpha, double power, double beta) {
    double critical = NoncentralChiSquaredDistribution.of(df, 0).inverseSurvivalProbability(alpha);
    NoncentralChiSquaredDistribution distribution =
        NoncentralChiSquaredDistribution.of(df, n * w * w);
    assertEquals(1, distribution.survivalProbability(critical) / power, 1e-12);
    assertEquals(1, distribution.cumulativeProbability(critical) / beta, 1e-12);
  }

  // Haynam, Govindarajulu, Leone (1970), Selected Tables in Mathematical Statistics, volume 1:
  // the noncentrality that gives a wanted power at alpha 0.05. From memory, not looked up.
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

  @Test
  void withoutNoncentralityItIsTheCentralDistribution() {
    assertEquals(
        ChiSquaredDistribution.of(3).survivalProbability(7.8),
        NoncentralChiSquaredDistribution.of(3, 0).survivalProbability(7.8),
        1e-15);
  }

  @ParameterizedTest
  @CsvSource({"-1, 0", "0, 0", "1e300, 1", "Infinity, 1"})
  void beyondTheMassBothTailsEndExactly(double x, double cumulative) {
    NoncentralChiSquaredDistribution distribution = NoncentralChiSquaredDistribution.of(2.5, 40);
    assertEquals(cumulative, distribution.cumulativeProbability(x), 1e-14);
    assertEquals(1 - cumulative, distribution.survivalProbability(x), 1e-14);
  }

  @Test
  void aNegativeNoncentralityIsRefusedByName() {
    IllegalArgumentException refused =
        assertThrows(
            IllegalArgumentException.class, () -> NoncentralChiSquaredDistribution.of(1, -1));
    assertTrue(refused.getMessage().contains("noncentrality is -1.0"), refused.getMessage());
  }
}
