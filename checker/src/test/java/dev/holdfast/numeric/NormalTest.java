package dev.holdfast.numeric;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.constraints.DoubleRange;
import org.apache.commons.statistics.distribution.NormalDistribution;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

class NormalTest {

  // Abramowitz and Stegun (1964), table 26.1, column P(x).
  // From memory, not looked up.
  @ParameterizedTest
  @CsvSource({
    "0.5, 0.691462461274013",
    "1, 0.841344746068543",
    "1.5, 0.933192798731142",
    "2, 0.977249868051821"
  })
  void agreesWithThePrintedTable(double x, double printed) {
    assertEquals(printed, Normal.cdf(x), 6e-16);
  }

  // Abramowitz and Stegun (1964), table 26.2: -log10 Q(x).
  // From memory, not looked up.
  @ParameterizedTest
  @CsvSource({"10, 23.11805", "20, 88.56010", "30, 197.30921", "40, 349.43701"})
  void deepTailsAgreeWithThePrintedLogarithms(double x, double printed) {
    assertEquals(printed, -Normal.logSurvival(x) / StrictMath.log(10), 6e-6);
  }

  @Property
  void agreesWithTheLibrary(@ForAll @DoubleRange(min = -37, max = 37) double x) {
    NormalDistribution library = NormalDistribution.of(0, 1);
    // The library rounds x/√2, which its square in the exponent magnifies.
    double rounding = 1e-15 + 3e-16 * x * x;
    assertEquals(1, Normal.survival(x) / library.survivalProbability(x), rounding);
    assertEquals(1, Normal.cdf(x) / library.cumulativeProbability(x), rounding);
  }

  @Property
  void quantilesUndoTails(@ForAll @DoubleRange(min = -700, max = -0.7) double logQ) {
    double x = Normal.survivalQuantile(StrictMath.exp(logQ));
    // The last place of x moves the logarithm of the tail by about x times that much.
    assertEquals(
        StrictMath.log(StrictMath.exp(logQ)), Normal.logSurvival(x), 1e-15 + 1e-15 * x * x);
  }

  @ParameterizedTest
  @ValueSource(doubles = {0.5, 0.2, 0.8, 1e-300, 0.975, Double.MIN_VALUE})
  void theTwoQuantilesMirrorEachOther(double p) {
    assertEquals(-Normal.quantile(p), Normal.survivalQuantile(p));
  }

  @Test
  void quantilesEndAtInfinity() {
    assertEquals(Double.POSITIVE_INFINITY, Normal.quantile(1));
    assertEquals(Double.NEGATIVE_INFINITY, Normal.quantile(0));
  }

  @Property
  void anIntervalIsTheDifferenceOfItsEnds(
      @ForAll @DoubleRange(min = -8, max = 8) double a,
      @ForAll @DoubleRange(min = 0.01, max = 3) double width) {
    double b = a + width;
    double difference =
        a > 0 ? Normal.survival(a) - Normal.survival(b) : Normal.cdf(b) - Normal.cdf(a);
    assertEquals(1, Normal.interval(a, b) / difference, 5e-13);
    assertEquals(StrictMath.log(difference), Normal.logInterval(a, b), 5e-13);
  }

  @Test
  void aShortIntervalKeepsItsDigits() {
    double width = 0x1p-40;
    assertEquals(1, Normal.interval(3, 3 + width) / (width * Normal.density(3 + width / 2)), 1e-15);
  }

  @Test
  void anIntervalFarOutHasALogarithmThoughItUnderflows() {
    assertTrue(Normal.logInterval(50, 51) < -1250);
    assertEquals(Normal.logSurvival(50), Normal.logInterval(50, 51), 1e-15);
  }

  @Test
  void aProbabilityAboveOneIsRefused() {
    IllegalArgumentException refused =
        assertThrows(IllegalArgumentException.class, () -> Normal.quantile(1.5));
    assertTrue(refused.getMessage().contains("1.5"), refused.getMessage());
  }
}
