package dev.holdfast.design;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.function.ToDoubleFunction;
import org.apache.commons.rng.UniformRandomProvider;
import org.apache.commons.rng.simple.RandomSource;
import org.apache.commons.statistics.distribution.ContinuousDistribution;
import org.apache.commons.statistics.distribution.NormalDistribution;

/**
 * Draws the raw data of a study again and again, runs the real test on them, and compares how often
 * it rejects with the power that a cell computes.
 */
public final class Simulation {
  /** Number of studies drawn. */
  public static final int STUDIES = 20_000;

  private static final long SEED = 20_260_502;

  private Simulation() {}

  /** A source of independent standard normal numbers. */
  public interface Normals {
    /** The next one. */
    double next();

    /** The next ones, shifted and scaled. */
    default double[] sample(int size, double mean, double sd) {
      double[] values = new double[size];
      for (int i = 0; i < size; i++) {
        values[i] = mean + sd * next();
      }
      return values;
    }
  }

  /**
   * Asserts that the share of studies whose p value is below alpha lies within four standard errors
   * of the power by the cell's best method.
   *
   * @param cell the cell
   * @param effect its inputs
   * @param level level of the test
   * @param study draws the data of one study and gives the p value of the test
   * @param sizes the sample
   */
  public static void confirms(
      Cell cell, Inputs effect, Level level, ToDoubleFunction<Normals> study, double... sizes) {
    double power = cell.assume(effect).power(cell.best(), sizes, level, Ledger.closed());
    UniformRandomProvider random = RandomSource.XO_RO_SHI_RO_128_PP.create(SEED);
    ContinuousDistribution.Sampler normal = NormalDistribution.of(0, 1).createSampler(random);
    int rejected = 0;
    for (int i = 0; i < STUDIES; i++) {
      if (study.applyAsDouble(normal::sample) < level.alpha()) {
        rejected++;
      }
    }
    double error = Math.sqrt(power * (1 - power) / STUDIES);
    assertEquals(power, (double) rejected / STUDIES, 4 * error, cell.key().toString());
  }
}
