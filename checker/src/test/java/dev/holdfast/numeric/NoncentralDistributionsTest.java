package dev.holdfast.numeric;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.math.BigDecimal;
import java.util.stream.Stream;
import org.apache.commons.rng.simple.RandomSource;
import org.apache.commons.statistics.distribution.BetaDistribution;
import org.apache.commons.statistics.distribution.ContinuousDistribution;
import org.apache.commons.statistics.distribution.FDistribution;
import org.apache.commons.statistics.distribution.TDistribution;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.function.Executable;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.MethodSource;
import org.junit.jupiter.params.provider.ValueSource;

class NoncentralDistributionsTest {

  // Cohen (1988), Statistical Power Analysis, tables 2.4.1 and 8.4.4, from memory: the sizes per
  // group that reach power 0.80 at a two-sided 0.05, printed to whole numbers.
  @ParameterizedTest
  @CsvSource({"0.2, 393", "0.5, 64", "0.8, 26"})
  void twoGroupsOfThePrintedSizeReachThePower(double d, int n) {
    assertEquals(0.80, twoGroupPower(d, n), 0.008);
  }

  private static double twoGroupPower(double d, int n) {
    double df = 2.0 * n - 2;
    double critical = NoncentralTDistribution.of(df, 0).inverseSurvivalProbability(0.025);
    return NoncentralTDistribution.of(df, d * Math.sqrt(n / 2.0)).probabilityOutside(critical);
  }

  @ParameterizedTest
  @CsvSource({"3, 0.25, 52", "3, 0.40, 21", "4, 0.25, 45"})
  void severalGroupsOfThePrintedSizeReachThePower(int groups, double f, int n) {
    double df1 = groups - 1.0;
    double df2 = groups * (n - 1.0);
    double critical = NoncentralFDistribution.of(df1, df2, 0).inverseSurvivalProbability(0.05);
    double power =
        NoncentralFDistribution.of(df1, df2, groups * n * f * f).survivalProbability(critical);
    assertEquals(0.80, power, 0.01);
  }

  @ParameterizedTest
  @ValueSource(doubles = {1e-3, 0.7, 3, 40, 1e4})
  void withoutNoncentralityTheyAreTheCentralOnes(double df) {
    for (double x : new double[] {0.01, 0.5, 1.3, 4}) {
      assertClose(
          TDistribution.of(df).survivalProbability(x),
          NoncentralTDistribution.of(df, 0).survivalProbability(x));
      assertClose(
          FDistribution.of(df, 7).cumulativeProbability(x),
          NoncentralFDistribution.of(df, 7, 0).cumulativeProbability(x));
      assertClose(
          BetaDistribution.of(df, 2.5).cumulativeProbability(x / 5),
          NoncentralBetaDistribution.of(df, 2.5, 0).cumulativeProbability(x / 5));
    }
  }

  private static void assertClose(double expected, double found) {
    assertEquals(expected, found, 1e-12 * expected + Double.MIN_NORMAL);
  }

  @ParameterizedTest
  @ValueSource(doubles = {-7, -1, 0, 0.5, 3, 6})
  void manyDegreesOfFreedomMakeTheNormal(double x) {
    NoncentralTDistribution limit = NoncentralTDistribution.of(Double.POSITIVE_INFINITY, 1.5);
    NoncentralTDistribution near = NoncentralTDistribution.of(1e12, 1.5);
    assertEquals(Normal.survival(x - 1.5), limit.survivalProbability(x));
    assertEquals(1, near.survivalProbability(x) / limit.survivalProbability(x), 1e-9);
    assertEquals(1, near.cumulativeProbability(x) / limit.cumulativeProbability(x), 1e-9);
  }

  static Stream<ContinuousDistribution> distributions() {
    return Stream.of(
        NoncentralTDistribution.of(7.5, 2),
        NoncentralTDistribution.of(80, -1),
        NoncentralTDistribution.of(300, 250),
        NoncentralChiSquaredDistribution.of(3, 11),
        NoncentralChiSquaredDistribution.of(40, 0),
        NoncentralFDistribution.of(4, 21, 6),
        NoncentralFDistribution.of(1, 9, 0.5),
        NoncentralBetaDistribution.of(2, 5, 7),
        NoncentralBetaDistribution.of(30, 2, 0));
  }

  @ParameterizedTest
  @MethodSource("distributions")
  void theDensityIsTheSlopeOfTheDistributionFunction(ContinuousDistribution distribution) {
    GaussLegendre rule = GaussLegendre.of(40);
    for (double p : new double[] {0.2, 0.5, 0.8}) {
      double a = distribution.inverseCumulativeProbability(p);
      double b = distribution.inverseCumulativeProbability(p + 0.15);
      assertEquals(0.15, rule.integrate(distribution::density, a, b), 1e-12);
    }
  }

  @ParameterizedTest
  @MethodSource("distributions")
  void momentsAgreeWithTheTails(ContinuousDistribution distribution) {
    // The mean over a far range, by quantiles: the integral of the quantile over (0, 1).
    double mean =
        TanhSinh.integrate(
                (p, fromEnd) ->
                    fromEnd > 0
                        ? distribution.inverseCumulativeProbability(p)
                        : distribution.inverseSurvivalProbability(-fromEnd),
                0,
                1,
                1e-9)
            .value();
    assertEquals(1, mean / distribution.getMean(), 1e-7);
  }

  @ParameterizedTest
  @MethodSource("distributions")
  void samplesFollowTheDistribution(ContinuousDistribution distribution) {
    ContinuousDistribution.Sampler sampler =
        distribution.createSampler(RandomSource.XO_SHI_RO_256_PP.create(20260101L));
    double median = distribution.inverseCumulativeProbability(0.5);
    long below = sampler.samples(4000).filter(x -> x < median).count();
    // Six standard deviations of a binomial count.
    assertEquals(2000, below, 190);
  }

  @Test
  void theSampledSumAgreesWithTheFullSum() {
    // The sum is full below an index of 3e6 and sampled above it.
    for (double z : new double[] {-9, -1, 0.5, 8}) {
      double below = standardized(5.999e6, z);
      double above = standardized(6.001e6, z);
      assertEquals(1, above / below, 2e-2);
      double between = standardized(6.003e6, z);
      assertEquals(above / below, between / above, 1e-6);
    }
  }

  private static double standardized(double noncentrality, double z) {
    double x = 10 + noncentrality + z * Math.sqrt(2 * (10 + 2 * noncentrality));
    NoncentralChiSquaredDistribution distribution =
        NoncentralChiSquaredDistribution.of(10, noncentrality);
    return z < 0 ? distribution.cumulativeProbability(x) : distribution.survivalProbability(x);
  }

  // By the contour and quadrature routes of make/hp.py beside the reference files, 50 digits kept.
  @ParameterizedTest
  @CsvSource({
    "cdf, 1.0, 10000000.0, 9905132.66782324, 2.146136544836531045847495e-51",
    "sf, 1000.0, 10000000.0, 10019974.14029673, 0.001355508674834016501005813",
    "cdf, 1000000000000.0, 10000000.0, 999988786584.4335, 3.665130619907034749566298e-51",
    "sf, 1.0, 1000000000.0, 1000189737.6596575, 0.001350458670898547523144978",
    "cdf, 1000000.0, 1000000000.0, 1000051079.560764, 3.480184070112903282797038e-51",
    "sf, 1000000000000.0, 1000000000.0, 1001004246881.2086, 0.001349914745158824813166319",
    "cdf, 1000.0, 1000000000000.0, 999970000999.9926, 3.66477691352543969719477e-51",
    "sf, 1000000.0, 1000000000000.0, 1000007000001.5, 0.001349915759065798548098956"
  })
  void chiSquaredTailsHoldForHugeParameters(
      String tail, double df, double noncentrality, double x, BigDecimal value) {
    assertTail(NoncentralChiSquaredDistribution.of(df, noncentrality), tail, x, value);
  }

  @ParameterizedTest
  @CsvSource({
    "cdf, 1.0, 3.0, 10000000.0, 4419773.131765414, 0.07898217794849220766862914",
    "sf, 5.0, 1000000.0, 10000000.0, 2028081.7990134116, 1.282010073924775298779754e-19",
    "cdf, 100000000.0, 1000000000.0, 10000000.0, 1.0998374697063134, 0.1586698569646567101770075",
    "cdf, 5.0, 1000000.0, 1000000000.0, 197747774.9975591, 5.482824638045134286122984e-16",
    "sf, 1000000.0, 50.0, 1000000000.0, 1493.3165521605017, 0.03543351628190819014611794",
    "cdf, 1.0, 3.0, 100000000000.0, 44197737723.42676, 0.07898209887448288683935538",
    "sf, 5.0, 1000000.0, 100000000000.0, 20256187915.422424, 1.347974251639790979838815e-19",
    "cdf, 100000000.0, 1000000000.0, 100000000000.0, 1000.9547901594478, 0.15865000357882717933605"
  })
  void fTailsHoldForHugeParameters(
      String tail, double df1, double df2, double noncentrality, double x, BigDecimal value) {
    assertTail(NoncentralFDistribution.of(df1, df2, noncentrality), tail, x, value);
  }

  @ParameterizedTest
  @CsvSource({
    "cdf, 2.5, 500.0, 276.3909661932238, 0.02763660720723885134315518",
    "cdf, 30.0, 500.0, 435.44253206121954, 0.1138126886433934099640534",
    "cdf, 10000.0, 500.0, 455.9091846299028, 2.226100725236098852217278e-38",
    "sf, 10000.0, 500.0, 533.0681115275729, 5.923267734140119790667746e-18",
    "sf, 100000000.0, 500.0, 503.0018744144284, 0.001350003538507667543270236",
    "cdf, 1000000000000.0, 500.0, 498.9999999375, 0.1586552538408334284039889",
    "cdf, 2.5, 10000.0, 5527.8639331970235, 0.02763547785099346340280763",
    "cdf, 30.0, 10000.0, 8709.005163965918, 0.1138072710838274104972736",
    "cdf, 10000.0, 10000.0, 9151.387014004617, 1.598850691446791995988108e-38",
    "sf, 10000.0, 10000.0, 10636.459739496537, 6.444930440985303670886617e-18",
    "sf, 100000000.0, 10000.0, 10003.674234614175, 0.001351537336079453090992969",
    "cdf, 1000000000000.0, 10000.0, 9998.999975000312, 0.1586552521166461385417463"
  })
  void tTailsHoldForLargeNoncentralities(
      String tail, double df, double noncentrality, double x, BigDecimal value) {
    assertTail(NoncentralTDistribution.of(df, noncentrality), tail, x, value);
  }

  private static void assertTail(
      ContinuousDistribution distribution, String tail, double x, BigDecimal value) {
    double found =
        tail.equals("cdf")
            ? distribution.cumulativeProbability(x)
            : distribution.survivalProbability(x);
    assertEquals(1, found / value.doubleValue(), 1e-12);
  }

  // Incomplete gamma functions to 25 digits.
  @ParameterizedTest
  @CsvSource({
    "0.001, 0.61, 0.0004467732812880203379377873",
    "0.001, 1.2125984223091144, 0.0002244067678490544331844638",
    "0.001, 1.9, 0.0001194275401627197991523295",
    "0.01, 0.61, 0.004471478125466068699869501",
    "0.01, 1.2125984223091144, 0.002250693767502795173819643",
    "0.01, 1.9, 0.001199558137707340610740022",
    "0.15, 0.61, 0.06773316365557256598743952",
    "0.15, 1.2125984223091144, 0.03521763866244398901675062",
    "0.15, 1.9, 0.01919939363972944037576958"
  })
  void aSmallUpperTailAtFewDegreesOfFreedomKeepsItsDigits(double df, double x, double value) {
    assertEquals(
        1, NoncentralChiSquaredDistribution.of(df, 0).survivalProbability(x) / value, 1e-12);
  }

  static Stream<Executable> refused() {
    return Stream.of(
        () -> NoncentralTDistribution.of(0, 1),
        () -> NoncentralTDistribution.of(5, Double.NaN),
        () -> NoncentralFDistribution.of(1, -3, 1),
        () -> NoncentralFDistribution.of(1, 3, 1e13),
        () -> NoncentralBetaDistribution.of(1, Double.POSITIVE_INFINITY, 1),
        () -> NoncentralChiSquaredDistribution.of(1e-4, 1),
        () -> NoncentralChiSquaredDistribution.of(1, 1).cumulativeProbability(Double.NaN),
        () -> NoncentralTDistribution.noncentralityFor(5, 2, 1),
        () -> NoncentralTDistribution.noncentralityFor(1, 4988190.9, 0.9999),
        () -> NoncentralTDistribution.twoSidedNoncentralityFor(5, 2, 0.01),
        () -> NoncentralFDistribution.noncentralityFor(2, 5, 3, 0.01),
        () -> NoncentralChiSquaredDistribution.noncentralityFor(2, 5, 1.1));
  }

  @ParameterizedTest
  @MethodSource("refused")
  void whatIsNotSupportedIsRefusedWithItsNameAndRange(Executable call) {
    IllegalArgumentException refused = assertThrows(IllegalArgumentException.class, call);
    assertTrue(
        refused.getMessage().matches("\\w+ is \\S+; (it must|no noncentrality).*"),
        refused.getMessage());
  }
}
