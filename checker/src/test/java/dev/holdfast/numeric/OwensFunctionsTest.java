package dev.holdfast.numeric;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import net.jqwik.api.Arbitraries;
import net.jqwik.api.Arbitrary;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.Provide;
import net.jqwik.api.constraints.DoubleRange;
import org.junit.jupiter.api.Test;

class OwensFunctionsTest {

  // Owen (1956), Annals of Mathematical Statistics 27, section 2: special values.
  @Property
  void owensTHasItsSpecialValues(
      @ForAll @DoubleRange(min = -20, max = 20) double h,
      @ForAll @DoubleRange(min = 0, max = 1000) double a) {
    assertEquals(StrictMath.atan(a) / (2 * Math.PI), OwensT.of(0, a), 1e-15);
    assertEquals(1, OwensT.of(h, 1) / (0.5 * Normal.cdf(h) * Normal.survival(h)), 1e-13);
    assertEquals(
        1, OwensT.of(h, Double.POSITIVE_INFINITY) / (0.5 * Normal.survival(Math.abs(h))), 1e-15);
    assertEquals(0, OwensT.of(h, 0));
  }

  @Property
  void owensTIsEvenInHAndOddInA(
      @ForAll @DoubleRange(min = -30, max = 30) double h,
      @ForAll @DoubleRange(min = -50, max = 50) double a) {
    double value = OwensT.of(h, a);
    assertEquals(value, OwensT.of(-h, a), Double.MIN_VALUE);
    assertEquals(value, -OwensT.of(h, -a), Double.MIN_VALUE);
  }

  @Property
  void owensTGrowsWithAAndFallsWithH(
      @ForAll @DoubleRange(min = 0, max = 30) double h,
      @ForAll @DoubleRange(min = 0, max = 50) double a) {
    assertTrue(OwensT.of(h, a) <= OwensT.of(h, a + 0.01) * (1 + 1e-14));
    assertTrue(OwensT.of(h + 0.01, a) <= OwensT.of(h, a) * (1 + 1e-14));
  }

  @Property
  void theTwoPartsOfOwensQMakeTheDistributionFunction(
      @ForAll @DoubleRange(min = 1, max = 400) double df,
      @ForAll @DoubleRange(min = -6, max = 6) double t,
      @ForAll @DoubleRange(min = -6, max = 6) double delta,
      @ForAll @DoubleRange(min = 0, max = 2) double scale) {
    double limit = scale * Math.sqrt(df);
    double whole = NoncentralTDistribution.of(df, delta).cumulativeProbability(t);
    double parts = OwensQ.lower(df, t, delta, limit) + OwensQ.upper(df, t, delta, limit);
    assertEquals(1, parts / whole, 1e-12);
  }

  @Test
  void owensQEndsWithItsLimits() {
    assertEquals(0, OwensQ.lower(5, 1, 2, 0));
    assertEquals(0, OwensQ.upper(5, 1, 2, Double.POSITIVE_INFINITY));
  }

  @Property
  void equivalencePowerIsTheDifferenceOfTwoOwensQ(
      @ForAll @DoubleRange(min = 2, max = 200) double df,
      @ForAll @DoubleRange(min = 0.5, max = 3) double t,
      @ForAll @DoubleRange(min = 0.5, max = 9) double lower,
      @ForAll @DoubleRange(min = -9, max = -0.5) double upper) {
    double limit = (lower - upper) * Math.sqrt(df) / (2 * t);
    double difference = OwensQ.lower(df, -t, upper, limit) - OwensQ.lower(df, t, lower, limit);
    double power = TwoOneSidedTests.power(df, t, lower, upper);
    assertEquals(difference, power, 1e-14);
    assertEquals(1, power + TwoOneSidedTests.typeTwoError(df, t, lower, upper), 1e-15);
  }

  /** Sizes of parameters over six decades to both sides of 1. */
  @Provide
  Arbitrary<Double> sizes() {
    return Arbitraries.longs().between(-(1L << 40), 1L << 40).map(n -> StrictMath.exp(n * 12e-12));
  }

  @Property
  void anyParametersGiveProbabilities(
      @ForAll("sizes") double df,
      @ForAll("sizes") double t,
      @ForAll("sizes") double delta,
      @ForAll("sizes") double width,
      @ForAll boolean isNegative) {
    double first = isNegative ? -delta : delta;
    double second = Math.max(-1e6, first - width);
    double degrees = Math.max(1e-3, df);
    double power = TwoOneSidedTests.power(degrees, t, first, second);
    double error = TwoOneSidedTests.typeTwoError(degrees, t, first, second);
    assertTrue(power >= 0 && power <= 1, () -> "power " + power);
    assertTrue(error >= 0 && error <= 1, () -> "error " + error);
    assertEquals(1, power + error, 1e-15);
    double parts = OwensQ.lower(degrees, t, first, width) + OwensQ.upper(degrees, t, first, width);
    double whole = NoncentralTDistribution.of(degrees, first).cumulativeProbability(t);
    assertEquals(whole, parts, 1e-9 * whole + Double.MIN_NORMAL);
  }

  @Test
  void equivalenceThatNeedsAnImpossibleSpreadKeepsItsNumbers() {
    assertEquals(
        1,
        TwoOneSidedTests.power(169.46749028625035, 0.00341580314702759, 1.6, -222.9)
            + TwoOneSidedTests.typeTwoError(169.46749028625035, 0.00341580314702759, 1.6, -222.9),
        1e-15);
  }

  @Test
  void equivalenceWithKnownVarianceIsAnIntervalOfTheNormal() {
    double exact = TwoOneSidedTests.power(1e12, 1.6, 4, -3);
    double limit = TwoOneSidedTests.power(Double.POSITIVE_INFINITY, 1.6, 4, -3);
    assertEquals(Normal.interval(1.6 - 4, -1.6 + 3), limit, 1e-16);
    assertEquals(limit, exact, 1e-11);
  }

  @Test
  void boundsInTheWrongOrderLeaveNoPower() {
    assertEquals(0, TwoOneSidedTests.power(20, 1.7, -1, 1));
    assertEquals(1, TwoOneSidedTests.typeTwoError(20, 1.7, -1, 1));
  }

  @Test
  void aNegativeLimitIsRefusedByName() {
    IllegalArgumentException refused =
        assertThrows(IllegalArgumentException.class, () -> OwensQ.lower(5, 1, 2, -1));
    assertTrue(refused.getMessage().startsWith("limit is -1.0"), refused.getMessage());
  }
}
