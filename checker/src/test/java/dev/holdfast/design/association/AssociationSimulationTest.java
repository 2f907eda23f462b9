package dev.holdfast.design.association;

import dev.holdfast.design.Given;
import dev.holdfast.design.Level;
import dev.holdfast.design.Sides;
import dev.holdfast.design.Simulation;
import dev.holdfast.numeric.SampleCorrelationDistribution;
import java.util.Arrays;
import org.apache.commons.math3.stat.correlation.PearsonsCorrelation;
import org.apache.commons.math3.stat.regression.OLSMultipleLinearRegression;
import org.apache.commons.statistics.distribution.FDistribution;
import org.apache.commons.statistics.distribution.TDistribution;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;

/** Correlation and regression run on drawn data reject as often as their cells say. */
@Tag("simulation")
class AssociationSimulationTest {
  private static final Level TWO = Level.of(0.05, Sides.TWO);

  @Test
  void theTestOfACorrelation() {
    int n = 22;
    double rho = -0.5;
    TDistribution student = TDistribution.of(n - 2);
    Simulation.confirms(
        new PearsonCorrelation(),
        new Given().number("r", rho).inputs(),
        TWO,
        draw -> {
          double r = correlation(draw, n, rho);
          return 2 * student.survivalProbability(Math.abs(r) * Math.sqrt((n - 2) / (1 - r * r)));
        },
        n);
  }

  @Test
  void theTestOfACorrelationAgainstAnother() {
    int n = 30;
    SampleCorrelationDistribution under = SampleCorrelationDistribution.of(n, 0.3);
    Simulation.confirms(
        new PearsonCorrelation(),
        new Given().number("r", 0.7).number("null-r", 0.3).inputs(),
        TWO,
        draw -> {
          double r = correlation(draw, n, 0.7);
          return 2 * Math.min(under.survivalProbability(r), under.cumulativeProbability(r));
        },
        n);
  }

  @Test
  void theGainOfTwoPredictorsBeyondAnother() {
    int n = 24;
    double[][] all = new double[n][];
    double[][] without = new double[n][];
    double[] mean = new double[n];
    for (int i = 0; i < n; i++) {
      // Fixed values that go together somewhat.
      double dose = i % 4;
      double age = (i * 7) % 11 + dose;
      double cold = i % 2;
      all[i] = new double[] {age, dose, cold};
      without[i] = new double[] {age};
      mean[i] = 0.3 * age + 1.1 * dose - 0.9 * cold;
    }
    double sd = 2;
    double f2 = residual(mean, without) / (sd * sd) / n;
    FDistribution statistic = FDistribution.of(2, n - 4);
    Simulation.confirms(
        new LinearRegression(),
        new Given()
            .number("f-squared", f2)
            .number("predictors", 3)
            .number("tested-predictors", 2)
            .inputs(),
        TWO,
        draw -> {
          double[] outcome = Arrays.stream(mean).map(each -> each + sd * draw.next()).toArray();
          double left = residual(outcome, all);
          double gain = residual(outcome, without) - left;
          return statistic.survivalProbability(gain / 2 / (left / (n - 4)));
        },
        n);
  }

  private static double correlation(Simulation.Normals draw, int n, double rho) {
    double[] first = draw.sample(n, 0, 1);
    double[] second = new double[n];
    for (int i = 0; i < n; i++) {
      second[i] = rho * first[i] + Math.sqrt(1 - rho * rho) * draw.next();
    }
    return new PearsonsCorrelation().correlation(first, second);
  }

  private static double residual(double[] outcome, double[][] predictors) {
    OLSMultipleLinearRegression regression = new OLSMultipleLinearRegression();
    regression.newSampleData(outcome, predictors);
    return regression.calculateResidualSumOfSquares();
  }
}
