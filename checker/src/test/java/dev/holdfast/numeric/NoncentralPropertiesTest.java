package dev.holdfast.numeric;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import net.jqwik.api.Arbitraries;
import net.jqwik.api.Arbitrary;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.Provide;
import net.jqwik.api.constraints.DoubleRange;

/**
 * What must hold for every supported parameter and every argument. Monotone means up to the
 * rounding of the two values compared.
 */
class NoncentralPropertiesTest {
  private static final double ROUNDING = 4e-12;

  /** Degrees of freedom over the whole supported range, its ends among them. */
  @Provide
  Arbitrary<Double> degreesOfFreedom() {
    return Arbitraries.oneOf(
        logUniform(1e-3, 1e12),
        logUniform(0.5, 500),
        Arbitraries.of(1e-3, 0.5, 1.0, 2.0, 3.0, 30.0, 1e6, 1e12));
  }

  /** Square roots of noncentralities. */
  @Provide
  Arbitrary<Double> effects() {
    return Arbitraries.oneOf(
        Arbitraries.doubles().between(0, 10),
        logUniform(1e-150, 1e6),
        Arbitraries.of(0.0, Double.MIN_VALUE, 1e-30, 60.0, 199.9, 200.1, 1e6));
  }

  /** Positive arguments over the whole range of doubles. */
  @Provide
  Arbitrary<Double> arguments() {
    return Arbitraries.oneOf(
        logUniform(1e-320, 1e308),
        logUniform(1e-3, 1e4),
        Arbitraries.of(Double.MIN_VALUE, Double.MAX_VALUE, 1e308, Double.POSITIVE_INFINITY, 0.0));
  }

  private static Arbitrary<Double> logUniform(double low, double high) {
    double from = StrictMath.log(low);
    double length = StrictMath.log(high) - from;
    // The generator of doubles yields few digits; fractions of whole numbers yield them all.
    return Arbitraries.longs()
        .between(0, 1L << 40)
        .map(n -> StrictMath.exp(from + length * (n * 0x1p-40)))
        .map(v -> Math.min(high, Math.max(low, v)));
  }

  @Property
  void chiSquaredTailsAreProbabilitiesInOrder(
      @ForAll("degreesOfFreedom") double df,
      @ForAll("effects") double effect,
      @ForAll("arguments") double x,
      @ForAll("arguments") double other) {
    TwoTailed distribution = NoncentralChiSquaredDistribution.of(df, effect * effect);
    checkTails(distribution, x, other);
    checkTails(distribution, df + effect * effect, (df + effect * effect) * (1 + 1e-9));
  }

  @Property
  void fTailsAreProbabilitiesInOrder(
      @ForAll("degreesOfFreedom") double df1,
      @ForAll("degreesOfFreedom") double df2,
      @ForAll("effects") double effect,
      @ForAll("arguments") double x,
      @ForAll("arguments") double other) {
    TwoTailed distribution = NoncentralFDistribution.of(df1, df2, effect * effect);
    checkTails(distribution, x, other);
    double mean = 1 + effect * effect / df1;
    checkTails(distribution, mean, mean * (1 + 1e-9));
  }

  @Property
  void betaTailsAreProbabilitiesInOrder(
      @ForAll("degreesOfFreedom") double df1,
      @ForAll("degreesOfFreedom") double df2,
      @ForAll("effects") double effect,
      @ForAll @DoubleRange(min = 0, max = 1) double x,
      @ForAll("arguments") double other) {
    TwoTailed distribution = NoncentralBetaDistribution.of(df1 / 2, df2 / 2, effect * effect);
    checkTails(distribution, x, Math.min(1, other));
  }

  @Property
  void tTailsAreProbabilitiesInOrder(
      @ForAll("degreesOfFreedom") double df,
      @ForAll("effects") double effect,
      @ForAll boolean isNegative,
      @ForAll("arguments") double x,
      @ForAll("arguments") double other) {
    double delta = isNegative ? -effect : effect;
    TwoTailed distribution = NoncentralTDistribution.of(df, delta);
    checkTails(distribution, x, other);
    checkTails(distribution, -x, other);
    checkTails(distribution, delta, delta + 1e-6);
  }

  private static void checkTails(TwoTailed distribution, double x, double other) {
    double cdf = distribution.cumulativeProbability(x);
    double survival = distribution.survivalProbability(x);
    assertTrue(cdf >= 0 && cdf <= 1, () -> "cdf " + cdf);
    assertTrue(survival >= 0 && survival <= 1, () -> "survival " + survival);
    assertEquals(1, cdf + survival, 2e-16);
    assertTrue(distribution.density(x) >= 0, () -> "density " + distribution.density(x));
    double low = Math.min(x, other);
    double high = Math.max(x, other);
    double cdfBelow = distribution.cumulativeProbability(low);
    double cdfAbove = distribution.cumulativeProbability(high);
    assertTrue(
        cdfBelow <= cdfAbove * (1 + ROUNDING) + Double.MIN_NORMAL,
        () -> "cdf falls from " + cdfBelow + " to " + cdfAbove);
    double survivalBelow = distribution.survivalProbability(low);
    double survivalAbove = distribution.survivalProbability(high);
    assertTrue(
        survivalAbove <= survivalBelow * (1 + ROUNDING) + Double.MIN_NORMAL,
        () -> "survival rises from " + survivalBelow + " to " + survivalAbove);
  }

  @Property
  void tailsAreMonotoneInTheNoncentrality(
      @ForAll("degreesOfFreedom") double df1,
      @ForAll("degreesOfFreedom") double df2,
      @ForAll("effects") double effect,
      @ForAll("effects") double other,
      @ForAll("arguments") double x) {
    double low = Math.min(effect, other);
    double high = Math.max(effect, other);
    checkRise(
        NoncentralChiSquaredDistribution.of(df1, low * low),
        NoncentralChiSquaredDistribution.of(df1, high * high),
        x);
    checkRise(
        NoncentralFDistribution.of(df1, df2, low * low),
        NoncentralFDistribution.of(df1, df2, high * high),
        x);
    checkRise(NoncentralTDistribution.of(df2, low), NoncentralTDistribution.of(df2, high), x);
    checkRise(NoncentralTDistribution.of(df2, -high), NoncentralTDistribution.of(df2, low), -x);
  }

  private static void checkRise(TwoTailed less, TwoTailed more, double x) {
    double before = less.survivalProbability(x);
    double after = more.survivalProbability(x);
    assertTrue(
        before <= after * (1 + ROUNDING) + Double.MIN_NORMAL,
        () -> "survival falls from " + before + " to " + after);
  }

  @Property
  void quantilesUndoTails(
      @ForAll @DoubleRange(min = 0.5, max = 1000) double df1,
      @ForAll @DoubleRange(min = 0.5, max = 1000) double df2,
      @ForAll @DoubleRange(min = 0, max = 30) double effect,
      @ForAll @DoubleRange(min = -60, max = -0.7) double logP) {
    double p = StrictMath.exp(logP);
    checkQuantiles(NoncentralChiSquaredDistribution.of(df1, effect * effect), p);
    checkQuantiles(NoncentralFDistribution.of(df1, df2, effect * effect), p);
    checkQuantiles(NoncentralTDistribution.of(df1, effect), p);
    checkQuantiles(NoncentralTDistribution.of(df1, -effect), p);
  }

  private static void checkQuantiles(TwoTailed distribution, double p) {
    double lower = distribution.inverseCumulativeProbability(p);
    // A quantile can be no better than its own last place, seen through the tail's steepness.
    double slack = 2 * Math.ulp(lower) * distribution.density(lower) / p;
    assertEquals(1, distribution.cumulativeProbability(lower) / p, 4e-12 + slack);
    double upper = distribution.inverseSurvivalProbability(p);
    double upperSlack = 2 * Math.ulp(upper) * distribution.density(upper) / p;
    assertEquals(1, distribution.survivalProbability(upper) / p, 4e-12 + upperSlack);
  }

  @Property
  void theNoncentralityForAPowerGivesThatPower(
      @ForAll @DoubleRange(min = 1, max = 1000) double df1,
      @ForAll @DoubleRange(min = 1, max = 1000) double df2,
      @ForAll @DoubleRange(min = 0.06, max = 0.99) double power) {
    double x = NoncentralFDistribution.of(df1, df2, 0).inverseSurvivalProbability(0.05);
    double lambda = NoncentralFDistribution.noncentralityFor(df1, df2, x, power);
    assertEquals(power, NoncentralFDistribution.of(df1, df2, lambda).survivalProbability(x), 1e-12);
    double t = NoncentralTDistribution.of(df2, 0).inverseSurvivalProbability(0.025);
    double delta = NoncentralTDistribution.noncentralityFor(df2, t, power);
    assertEquals(power, NoncentralTDistribution.of(df2, delta).survivalProbability(t), 1e-12);
    double twoSided = NoncentralTDistribution.twoSidedNoncentralityFor(df2, t, power);
    assertEquals(power, NoncentralTDistribution.of(df2, twoSided).probabilityOutside(t), 1e-12);
  }

  @Property
  void theSquareOfATIsAnF(
      @ForAll @DoubleRange(min = 0.5, max = 1e4) double df,
      @ForAll @DoubleRange(min = 0, max = 40) double delta,
      @ForAll @DoubleRange(min = 0.01, max = 12) double t) {
    NoncentralTDistribution distribution = NoncentralTDistribution.of(df, delta);
    double beyond = distribution.survivalProbability(t) + distribution.cumulativeProbability(-t);
    double asF = NoncentralFDistribution.of(1, df, delta * delta).survivalProbability(t * t);
    assertEquals(1, distribution.probabilityOutside(t) / beyond, 1e-11);
    assertEquals(1, asF / beyond, 1e-11);
  }
}
