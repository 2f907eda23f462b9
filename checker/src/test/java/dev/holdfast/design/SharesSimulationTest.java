package dev.holdfast.design;

import static org.junit.jupiter.api.Assertions.assertEquals;

import dev.holdfast.design.catalogue.Catalogue;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.function.Predicate;
import org.apache.commons.rng.UniformRandomProvider;
import org.apache.commons.rng.simple.RandomSource;
import org.apache.commons.statistics.distribution.BinomialDistribution;
import org.apache.commons.statistics.distribution.ChiSquaredDistribution;
import org.apache.commons.statistics.distribution.HypergeometricDistribution;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;

/**
 * Power of the cells for shares, tables and times against the share of rejections when the data are
 * drawn one participant at a time and the test is run on them, written here anew. Enumerations must
 * agree within four standard errors; to a normal or chi-square approximation, a little over one
 * hundredth is allowed on top.
 */
@Tag("simulation")
class SharesSimulationTest {
  private static final int REPLICATES = 20_000;
  private static final Level TWO = Level.of(0.05, Sides.TWO);
  private static final double CRITICAL =
      ChiSquaredDistribution.of(1).inverseSurvivalProbability(0.05);

  private final UniformRandomProvider random = RandomSource.XO_RO_SHI_RO_128_PP.create(20260502L);

  @Test
  void exactBinomialTest() {
    BinomialDistribution none = BinomialDistribution.of(60, 0.3);
    agrees(
        power(
            "single-group/exact-binomial",
            new Given().number("null-share", 0.3).number("share", 0.47),
            60),
        each -> {
          int x = successes(60, 0.47);
          return none.survivalProbability(x - 1) <= 0.025 || none.cumulativeProbability(x) <= 0.025;
        },
        0);
  }

  @Test
  void normalTestOfOneShare() {
    agrees(
        power(
            "single-group/proportion-z",
            new Given().number("null-share", 0.3).number("share", 0.17),
            80),
        each -> square(successes(80, 0.17) / 80.0 - 0.3) / (0.3 * 0.7 / 80) >= CRITICAL,
        0);
  }

  @Test
  void pearsonsChiSquareTest() {
    agrees(
        power(
            "parallel-groups/pearson-chi-square",
            new Given().named("shares", "a", 0.25, "b", 0.45),
            70,
            100),
        each -> {
          int a = successes(70, 0.25);
          int b = successes(100, 0.45);
          return chiSquare(new double[][] {{a, 70 - a}, {b, 100 - b}}) >= CRITICAL;
        },
        0);
  }

  @Test
  void fishersExactTest() {
    Map<Integer, Boolean> known = new HashMap<>();
    agrees(
        power(
            "parallel-groups/fisher-exact",
            new Given().named("shares", "a", 0.5, "b", 0.2),
            45,
            40),
        each -> {
          int a = successes(45, 0.5);
          int b = successes(40, 0.2);
          return known.computeIfAbsent(a * 100 + b, key -> fisher(a, 45, b, 40));
        },
        0);
  }

  @Test
  void mcNemarsExactTest() {
    agrees(
        power("matched-pairs/mcnemar", new Given().named("discordant", "a", 0.25, "b", 0.1), 90),
        each -> {
          int a = 0;
          int b = 0;
          for (int i = 0; i < 90; i++) {
            double u = random.nextDouble();
            a += u < 0.25 ? 1 : 0;
            b += u >= 0.25 && u < 0.35 ? 1 : 0;
          }
          BinomialDistribution even = BinomialDistribution.of(a + b, 0.5);
          return 2 * even.cumulativeProbability(Math.min(a, b)) <= 0.05;
        },
        0);
  }

  @Test
  void arcsineTest() {
    agrees(
        power(
            "parallel-groups/arcsine", new Given().named("shares", "a", 0.4, "b", 0.55), 180, 180),
        each -> {
          double a = Math.asin(Math.sqrt(successes(180, 0.4) / 180.0));
          double b = Math.asin(Math.sqrt(successes(180, 0.55) / 180.0));
          return square(2 * a - 2 * b) / (2.0 / 180) >= CRITICAL;
        },
        0.012);
  }

  @Test
  void chiSquareTestOfFit() {
    double[] shares = {0.2, 0.45, 0.35};
    double critical = ChiSquaredDistribution.of(2).inverseSurvivalProbability(0.05);
    agrees(
        power(
            "single-group/chi-square-goodness-of-fit",
            new Given().named("shares", "a", 0.2, "b", 0.45, "c", 0.35),
            150),
        each -> {
          double sum = 0;
          for (double count : counts(150, shares)) {
            sum += square(count - 50) / 50;
          }
          return sum >= critical;
        },
        0.012);
  }

  @Test
  void chiSquareTestOfHomogeneity() {
    double[] first = {0.2, 0.3, 0.5};
    double[] second = {0.33, 0.34, 0.33};
    double critical = ChiSquaredDistribution.of(2).inverseSurvivalProbability(0.05);
    agrees(
        power(
            "parallel-groups/chi-square-homogeneity",
            new Given().table("cells", first, second).groups("a", "b").weights(120.0, 180.0),
            120,
            180),
        each -> chiSquare(new double[][] {counts(120, first), counts(180, second)}) >= critical,
        0.012);
  }

  @Test
  void chiSquareTestOfIndependence() {
    double[] joint = {0.3, 0.2, 0.2, 0.3};
    agrees(
        power(
            "association/chi-square-independence",
            new Given().table("cells", new double[] {0.3, 0.2}, new double[] {0.2, 0.3}),
            200),
        each -> {
          double[] n = counts(200, joint);
          return chiSquare(new double[][] {{n[0], n[1]}, {n[2], n[3]}}) >= CRITICAL;
        },
        0.012);
  }

  @Test
  void logRankTest() {
    int events = 240;
    agrees(
        power(
            "parallel-groups/log-rank",
            new Given().number("hazard-ratio", 0.7).groups("a", "b").weights(1.0, 1.0),
            events),
        each -> logRank(200, 200, 0.7, events) >= CRITICAL,
        0.015);
  }

  private static double power(String name, Given given, double... sizes) {
    String[] key = name.split("/");
    Cell cell = Catalogue.standard().find(key[0], key[1]).orElseThrow();
    return cell.assume(given.inputs()).power(cell.best(), sizes, TWO, Ledger.closed());
  }

  private static void agrees(double power, Predicate<Integer> rejects, double approximation) {
    int rejected = 0;
    for (int i = 0; i < REPLICATES; i++) {
      rejected += rejects.test(i) ? 1 : 0;
    }
    double error = Math.sqrt(power * (1 - power) / REPLICATES);
    assertEquals(power, (double) rejected / REPLICATES, 4 * error + approximation);
  }

  private int successes(int n, double share) {
    int count = 0;
    for (int i = 0; i < n; i++) {
      count += random.nextDouble() < share ? 1 : 0;
    }
    return count;
  }

  private double[] counts(int n, double[] shares) {
    double[] counts = new double[shares.length];
    for (int i = 0; i < n; i++) {
      double left = random.nextDouble();
      int k = 0;
      while (k < shares.length - 1 && left >= shares[k]) {
        left -= shares[k];
        k++;
      }
      counts[k]++;
    }
    return counts;
  }

  private static double chiSquare(double[][] table) {
    double[] byColumn = new double[table[0].length];
    double total = 0;
    for (double[] row : table) {
      for (int j = 0; j < row.length; j++) {
        byColumn[j] += row[j];
        total += row[j];
      }
    }
    double sum = 0;
    for (double[] row : table) {
      double inRow = java.util.Arrays.stream(row).sum();
      for (int j = 0; j < row.length; j++) {
        double expected = inRow * byColumn[j] / total;
        sum += expected == 0 ? 0 : square(row[j] - expected) / expected;
      }
    }
    return sum;
  }

  private static boolean fisher(int a, int n1, int b, int n2) {
    HypergeometricDistribution given = HypergeometricDistribution.of(n1 + n2, n1, a + b);
    double limit = given.probability(a) * (1 + 1e-9);
    double p = 0;
    for (int x = given.getSupportLowerBound(); x <= given.getSupportUpperBound(); x++) {
      p += given.probability(x) <= limit ? given.probability(x) : 0;
    }
    return p <= 0.05;
  }

  /** The log-rank chi-square of exponential times, looked at when so many events have happened. */
  private double logRank(int n1, int n2, double ratio, int events) {
    List<double[]> times = new ArrayList<>();
    for (int i = 0; i < n1 + n2; i++) {
      double hazard = i < n1 ? ratio : 1;
      times.add(new double[] {-Math.log(1 - random.nextDouble()) / hazard, i < n1 ? 1 : 0});
    }
    times.sort(Comparator.comparingDouble(each -> each[0]));
    double first = n1;
    double second = n2;
    double excess = 0;
    double variance = 0;
    for (int i = 0; i < events; i++) {
      double share = first / (first + second);
      boolean inFirst = times.get(i)[1] == 1;
      excess += (inFirst ? 1 : 0) - share;
      variance += share * (1 - share);
      first -= inFirst ? 1 : 0;
      second -= inFirst ? 0 : 1;
    }
    return excess * excess / variance;
  }

  private static double square(double value) {
    return value * value;
  }
}
