package dev.holdfast.family;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class ErrorControlTest {
  @ParameterizedTest
  // Šidák (1967), Journal of the American Statistical Association 62, 626-633: levels at 0.05 as
  // tabulated; from memory.
  @CsvSource({"5, 0.0102", "10, 0.0051"})
  void sidakGivesTheTabledLevel(int tests, double level) {
    assertEquals(level, ErrorControl.SIDAK.guaranteedLevel(0.05, tests).getAsDouble(), 6e-5);
  }

  @ParameterizedTest
  @CsvSource({"BONFERRONI, 0.01", "HOLM, 0.01", "FIXED_SEQUENCE, 0.05", "ALL_MUST_SUCCEED, 0.05"})
  void theGuaranteedLevelOfFiveTestsAtFivePercent(ErrorControl control, double level) {
    assertEquals(level, control.guaranteedLevel(0.05, 5).getAsDouble(), 1e-15);
  }

  @Test
  void aProcedureThatIsNotComputedYetGivesNoLevel() {
    assertTrue(ErrorControl.HOMMEL.guaranteedLevel(0.05, 3).isEmpty());
  }

  @Test
  void everyWordOfThePlanFileIsKnown() {
    for (ErrorControl control : ErrorControl.values()) {
      assertEquals(control, ErrorControl.of(control.word()).orElseThrow());
    }
  }

  @Test
  void jointChancesOfIndependentTests() {
    double[] powers = {0.9, 0.9};
    // Two studies at 0.90 both succeed with 0.81: common practice.
    assertEquals(0.81, JointPower.every(powers), 1e-15);
    assertEquals(0.99, JointPower.any(powers), 1e-15);
    assertEquals(1.8, JointPower.expected(powers), 1e-15);
    assertEquals(1.71, JointPower.expectedInSequence(powers), 1e-15);
  }
}
