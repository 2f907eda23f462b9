package dev.holdfast.design.times;

import static org.junit.jupiter.api.Assertions.assertEquals;

import dev.holdfast.design.Allocation;
import dev.holdfast.design.Cell;
import dev.holdfast.design.Given;
import dev.holdfast.design.LeastSample;
import dev.holdfast.design.Level;
import dev.holdfast.design.Sides;
import org.apache.commons.statistics.distribution.NormalDistribution;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** The least number of events is the one that the printed formula gives. */
class ClosedFormTest {
  @ParameterizedTest(name = "hazard ratio {0}, groups {1}:{2}")
  @CsvSource({"0.7, 1, 1", "1.5, 1, 1", "0.6, 2, 1", "0.8, 1, 3"})
  void events(double ratio, double first, double second) {
    NormalDistribution normal = NormalDistribution.of(0, 1);
    double z = normal.inverseSurvivalProbability(0.025) + normal.inverseSurvivalProbability(0.1);
    double share = first / (first + second);
    double log = Math.log(ratio);
    double r = first / second;
    // Schoenfeld (1983), Biometrics 39; Freedman (1982), Statistics in Medicine 1
    double schoenfeld = z * z / (share * (1 - share) * log * log);
    double freedman = z * z * (1 + r * ratio) * (1 + r * ratio) / (r * (1 - ratio) * (1 - ratio));
    assertEquals(schoenfeld, least(0, ratio, first, second), 1e-7 * schoenfeld);
    assertEquals(freedman, least(1, ratio, first, second), 1e-7 * freedman);
  }

  private static double least(int method, double ratio, double first, double second) {
    Cell cell = new ParallelTimesLogRank();
    return LeastSample.find(
            cell.assume(
                new Given()
                    .number("hazard-ratio", ratio)
                    .groups("a", "b")
                    .weights(first, second)
                    .inputs()),
            cell.methods().get(method),
            Allocation.equal(1),
            cell.arms(),
            Level.of(0.05, Sides.TWO),
            0.9)
        .orElseThrow()
        .real();
  }
}
