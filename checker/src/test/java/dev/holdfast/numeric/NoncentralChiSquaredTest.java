package dev.holdfast.numeric;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.apache.commons.statistics.distribution.ChiSquaredDistribution;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvFileSource;
import org.junit.jupiter.params.provider.CsvSource;

class NoncentralChiSquaredTest {

  @ParameterizedTest
  @CsvFileSource(resources = "/reference/power_chi2.csv", useHeadersInDisplayName = true)
  void powerAgreesWithTheThirtyDigitReference(
      String region, int df, double w, double n, double alpha, double power, double beta) {
    double critical = ChiSquaredDistribution.of(df).inverseSurvivalProbability(alpha);
    NoncentralChiSquared distribution = NoncentralChiSquared.of(df, n * w * w);
    assertEquals(1, distribution.survivalProbability(critical) / power, 1e-8);
    assertEquals(1, distribution.cumulativeProbability(critical) / beta, 1e-8);
  }

  // Haynam, Govindarajulu, Leone (1962), tables of the cumulative noncentral chi-square: the
  // noncentrality that gives a wanted power at alpha 0.05 with one degree of freedom. From memory.
  @ParameterizedTest
  @CsvSource({"7.849, 0.80", "10.507, 0.90"})
  void tabledNoncentralityGivesItsPower(double noncentrality, double power) {
    double critical = ChiSquaredDistribution.of(1).inverseSurvivalProbability(0.05);
    double computed = NoncentralChiSquared.of(1, noncentrality).survivalProbability(critical);
    assertEquals(power, computed, 2e-5);
  }

  @Test
  void withoutNoncentralityItIsTheCentralDistribution() {
    assertEquals(
        ChiSquaredDistribution.of(3).survivalProbability(7.8),
        NoncentralChiSquared.of(3, 0).survivalProbability(7.8));
  }

  @ParameterizedTest
  @CsvSource({"-1, 0", "0, 0", "1e300, 1", "Infinity, 1"})
  void beyondTheMassBothTailsEndExactly(double x, double cumulative) {
    NoncentralChiSquared distribution = NoncentralChiSquared.of(2.5, 40);
    assertEquals(cumulative, distribution.cumulativeProbability(x), 1e-14);
    assertEquals(1 - cumulative, distribution.survivalProbability(x), 1e-14);
  }

  @Test
  void aNegativeNoncentralityIsRefusedByName() {
    IllegalArgumentException refused =
        assertThrows(IllegalArgumentException.class, () -> NoncentralChiSquared.of(1, -1));
    assertTrue(refused.getMessage().contains("noncentrality is -1.0"), refused.getMessage());
  }
}
