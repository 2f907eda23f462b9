package dev.holdfast.design.continuous;

import static org.junit.jupiter.api.Assertions.assertEquals;

import dev.holdfast.design.Cell;
import dev.holdfast.design.Given;
import dev.holdfast.design.Inputs;
import dev.holdfast.design.Ledger;
import dev.holdfast.design.Level;
import dev.holdfast.design.Sides;
import java.util.function.DoubleBinaryOperator;
import org.apache.commons.statistics.distribution.ChiSquaredDistribution;
import org.apache.commons.statistics.distribution.NormalDistribution;
import org.apache.commons.statistics.distribution.TDistribution;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/**
 * Exact powers of two-sample t tests against another route to them: the normal power given both
 * sample variances, summed over the chi-square law of each.
 */
class VarianceRatioTest {
  private static final double DIFFERENCE_IN_ERRORS = 2.8;
  private static final Level TWO = Level.of(0.05, Sides.TWO);

  @ParameterizedTest(name = "sizes {0} and {1}, SDs {2} and {3}")
  @CsvSource({"2, 2, 1, 1", "3, 20, 4, 1", "5, 5, 9, 5", "30, 90, 9, 5", "10, 12, 6, 9"})
  void welchsTestHasThePowerOfTheDoubleSum(double n1, double n2, double s1, double s2) {
    double expected =
        doubleSum(
            n1,
            n2,
            s1,
            s2,
            (v1, v2) -> {
              double e1 = v1 / n1;
              double e2 = v2 / n2;
              double df = (e1 + e2) * (e1 + e2) / (e1 * e1 / (n1 - 1) + e2 * e2 / (n2 - 1));
              return TDistribution.of(df).inverseSurvivalProbability(0.025) * Math.sqrt(e1 + e2);
            });
    assertEquals(expected, power(new ParallelMeansWelch(), n1, n2, s1, s2), 1e-8);
  }

  @ParameterizedTest(name = "sizes {0} and {1}, SDs {2} and {3}")
  @CsvSource({"2, 3, 1, 4", "3, 20, 4, 1", "5, 5, 9, 5", "30, 90, 9, 5", "10, 12, 6, 9"})
  void studentsTestHasThePowerOfTheDoubleSum(double n1, double n2, double s1, double s2) {
    double critical = TDistribution.of(n1 + n2 - 2).inverseSurvivalProbability(0.025);
    double expected =
        doubleSum(
            n1,
            n2,
            s1,
            s2,
            (v1, v2) -> {
              double pooled = ((n1 - 1) * v1 + (n2 - 1) * v2) / (n1 + n2 - 2);
              return critical * Math.sqrt(pooled * (1 / n1 + 1 / n2));
            });
    assertEquals(expected, power(new ParallelMeansStudent(), n1, n2, s1, s2), 1e-8);
  }

  @ParameterizedTest(name = "sizes {0} and {1}")
  @CsvSource({"4, 4", "7, 19", "120, 80"})
  void studentsTestNeedsNoAveragingWhereTheSdsAreOne(double n1, double n2) {
    Cell cell = new ParallelMeansStudent();
    double nearly = power(cell, n1, n2, 1, 1 + 1e-9);
    assertEquals(power(cell, n1, n2, 1, 1), nearly, 1e-8);
  }

  private static double power(Cell cell, double n1, double n2, double s1, double s2) {
    Inputs inputs =
        new Given()
            .number("difference", DIFFERENCE_IN_ERRORS * error(n1, n2, s1, s2))
            .named("sds", "a", s1, "b", s2)
            .inputs();
    return cell.assume(inputs).power(cell.best(), new double[] {n1, n2}, TWO, Ledger.closed());
  }

  private static double error(double n1, double n2, double s1, double s2) {
    return Math.sqrt(s1 * s1 / n1 + s2 * s2 / n2);
  }

  /**
   * Sum over both sample variances.
   *
   * @param bound the difference from which on the test is significant, given the sample variances
   */
  private static double doubleSum(
      double n1, double n2, double s1, double s2, DoubleBinaryOperator bound) {
    double step = 0.25;
    double[][] first = variances(n1, s1, step);
    double[][] second = variances(n2, s2, step);
    double error = error(n1, n2, s1, s2);
    NormalDistribution normal = NormalDistribution.of(DIFFERENCE_IN_ERRORS, 1);
    double power = 0;
    for (double[] one : first) {
      for (double[] other : second) {
        double passed = bound.applyAsDouble(one[0], other[0]) / error;
        double given = normal.survivalProbability(passed) + normal.cumulativeProbability(-passed);
        power += one[1] * other[1] * given;
      }
    }
    return power;
  }

  /** Sample variances and their weights, equidistant in the logit of their probability. */
  private static double[][] variances(double n, double sd, double step) {
    ChiSquaredDistribution law = ChiSquaredDistribution.of(n - 1);
    int half = (int) (30 / step);
    double[][] variances = new double[2 * half + 1][];
    for (int k = -half; k <= half; k++) {
      double below = 1 / (1 + Math.exp(-k * step));
      double above = 1 / (1 + Math.exp(k * step));
      double quantile =
          k < 0 ? law.inverseCumulativeProbability(below) : law.inverseSurvivalProbability(above);
      variances[k + half] = new double[] {sd * sd * quantile / (n - 1), below * above * step};
    }
    return variances;
  }
}
