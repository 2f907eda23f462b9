package dev.holdfast.numeric;

import static org.junit.jupiter.api.Assertions.assertEquals;

import org.apache.commons.statistics.distribution.BinomialDistribution;
import org.apache.commons.statistics.distribution.HypergeometricDistribution;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Enumerations against plain sums over every pair of counts, by Commons Statistics. */
class ExactTestsTest {
  @ParameterizedTest(name = "{0} and {1}, shares {2} and {3}")
  @CsvSource({
    "12, 9, 0.7, 0.2",
    "30, 30, 0.5, 0.3",
    "25, 60, 0.1, 0.05",
    "8, 40, 0.95, 0.4",
    "5, 5, 1, 0",
    "20, 10, 0.3, 0",
    "17, 17, 0.4, 0.4"
  })
  void theScoreTestRejectsWhereItsStatisticIsLarge(int n1, int n2, double p1, double p2) {
    double critical = 1.959963984540054;
    BinomialDistribution first = BinomialDistribution.of(n1, p1);
    BinomialDistribution second = BinomialDistribution.of(n2, p2);
    double one = 0;
    double two = 0;
    for (int x1 = 0; x1 <= n1; x1++) {
      for (int x2 = 0; x2 <= n2; x2++) {
        double chance = first.probability(x1) * second.probability(x2);
        double z = z(x1, n1, x2, n2);
        one += z >= critical ? chance : 0;
        two += Math.abs(z) >= critical ? chance : 0;
      }
    }
    assertEquals(one, twoShares(n1, n2, p1, p2, critical, false), 1e-13);
    assertEquals(two, twoShares(n1, n2, p1, p2, critical, true), 1e-13);
  }

  private static double twoShares(
      int n1, int n2, double p1, double p2, double critical, boolean twoSided) {
    return ExactTests.twoShares(n1, n2, p1, p2, ExactTestsTest::z, critical, twoSided);
  }

  private static double z(double x1, double n1, double x2, double n2) {
    double p = (x1 + x2) / (n1 + n2);
    double variance = p * (1 - p) * (1 / n1 + 1 / n2);
    return variance == 0 ? 0 : (x1 / n1 - x2 / n2) / Math.sqrt(variance);
  }

  @ParameterizedTest(name = "{0} and {1}, shares {2} and {3}, level {4}")
  @CsvSource({
    "12, 9, 0.7, 0.2, 0.05",
    "30, 30, 0.5, 0.3, 0.05",
    "25, 60, 0.1, 0.05, 0.01",
    "8, 40, 0.95, 0.4, 0.1",
    "20, 10, 0.3, 0, 0.05",
    "90, 70, 0.35, 0.2, 0.05"
  })
  void fishersTestRejectsWhereItsPValueIsSmall(int n1, int n2, double p1, double p2, double alpha) {
    BinomialDistribution first = BinomialDistribution.of(n1, p1);
    BinomialDistribution second = BinomialDistribution.of(n2, p2);
    double one = 0;
    double two = 0;
    for (int x1 = 0; x1 <= n1; x1++) {
      for (int x2 = 0; x2 <= n2; x2++) {
        double chance = first.probability(x1) * second.probability(x2);
        HypergeometricDistribution given = HypergeometricDistribution.of(n1 + n2, n1, x1 + x2);
        one += given.survivalProbability(x1 - 1) <= alpha ? chance : 0;
        two += bothSides(given, x1) <= alpha ? chance : 0;
      }
    }
    assertEquals(one, ExactTests.fisher(n1, n2, p1, p2, alpha, false), 1e-12);
    assertEquals(two, ExactTests.fisher(n1, n2, p1, p2, alpha, true), 1e-12);
  }

  private static double bothSides(HypergeometricDistribution given, int observed) {
    double limit = given.probability(observed) * (1 + 1e-9);
    double sum = 0;
    for (int x = given.getSupportLowerBound(); x <= given.getSupportUpperBound(); x++) {
      double chance = given.probability(x);
      sum += chance <= limit ? chance : 0;
    }
    return sum;
  }

  @ParameterizedTest(name = "{0} pairs, {1} and {2}")
  @CsvSource({"20, 0.3, 0.1", "60, 0.2, 0.05", "45, 0.15, 0.15", "9, 0.7, 0.3"})
  void mcNemarsTestIsABinomialTestOfTheDiscordantPairs(int n, double first, double second) {
    BinomialDistribution discordant = BinomialDistribution.of(n, first + second);
    double one = 0;
    double two = 0;
    for (int d = 0; d <= n; d++) {
      BinomialDistribution even = BinomialDistribution.of(d, 0.5);
      BinomialDistribution true0 = BinomialDistribution.of(d, first / (first + second));
      for (int x = 0; x <= d; x++) {
        double chance = discordant.probability(d) * true0.probability(x);
        double above = even.survivalProbability(x - 1);
        double below = even.cumulativeProbability(x);
        one += above <= 0.05 ? chance : 0;
        two += 2 * Math.min(above, below) <= 0.05 ? chance : 0;
      }
    }
    assertEquals(one, ExactTests.mcNemar(n, first, second, 0.05, false), 1e-12);
    assertEquals(two, ExactTests.mcNemar(n, first, second, 0.05, true), 1e-12);
  }
}
