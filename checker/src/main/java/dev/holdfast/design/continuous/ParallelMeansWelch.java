package dev.holdfast.design.continuous;

import dev.holdfast.design.Arms;
import dev.holdfast.design.Arrangement;
import dev.holdfast.design.BaseCell;
import dev.holdfast.design.CellKey;
import dev.holdfast.design.Convention;
import dev.holdfast.design.Effect;
import dev.holdfast.design.Inputs;
import dev.holdfast.design.Ledger;
import dev.holdfast.design.Level;
import dev.holdfast.design.Method;
import dev.holdfast.design.Scale;
import dev.holdfast.design.TPower;
import dev.holdfast.design.ZPower;
import java.util.List;
import java.util.Map;
import java.util.Set;
import org.apache.commons.statistics.distribution.TDistribution;

/**
 * Means of two parallel groups by Welch's t test, the variances not assumed equal.
 *
 * <p>The plain method takes Satterthwaite's degrees of freedom at the true variances; the exact one
 * averages over those that the samples will give.
 */
public final class ParallelMeansWelch extends BaseCell {
  private static final Method SATTERTHWAITE =
      new Method(
          "satterthwaite",
          "the noncentral t distribution with Satterthwaite's degrees of freedom",
          "satterthwaite-1946",
          Map.of(Convention.REFERENCE, "student-t"),
          false,
          true);
  private static final Method EXACT =
      new Method(
          "welch-exact",
          "integration over the variance ratio",
          "moser-stevens-watts-1989",
          Map.of(Convention.REFERENCE, "exact"),
          true,
          true);

  /** The cell. */
  public ParallelMeansWelch() {
    super(
        new CellKey(Arrangement.PARALLEL_GROUPS, "welch-t"),
        Set.of(Scale.CONTINUOUS),
        "two parallel groups, Welch's t test",
        "Do the means of two groups differ?",
        Arms.two(2),
        MeanMethods.TWO_GROUPS,
        List.of(SATTERTHWAITE, EXACT, MeanMethods.NORMAL));
  }

  @Override
  public Effect assume(Inputs inputs) {
    return new MeanEffect(MeanInputs.ofGroups(inputs), ParallelMeansWelch::power);
  }

  private static double power(
      MeanDifference means, Method method, double[] sizes, Level level, Ledger ledger) {
    double n1 = sizes[0];
    double n2 = sizes[1];
    double error = MeanMethods.standardError(means, n1, n2, ledger);
    double delta = means.size() / error;
    ledger.step(
        "noncentrality", "delta = difference/SE", delta, "difference", means.size(), "SE", error);
    if (method.equals(MeanMethods.NORMAL)) {
      return ZPower.power(delta, level, ledger);
    }
    double first = means.sdFirst() * means.sdFirst() / n1;
    double second = means.sdSecond() * means.sdSecond() / n2;
    if (method.equals(EXACT)) {
      double power = exact(first, second, n1 - 1, n2 - 1, delta, level);
      ledger.step("power", MeanMethods.OVER_THE_RATIO, power, "n1", n1, "n2", n2);
      return power;
    }
    double df = satterthwaite(first, second, n1 - 1, n2 - 1);
    ledger.step(
        "degrees of freedom",
        "df = (v1 + v2)^2/(v1^2/(n1 - 1) + v2^2/(n2 - 1))",
        df,
        "v1",
        first,
        "v2",
        second,
        "n1",
        n1,
        "n2",
        n2);
    return TPower.power(df, delta, level, ledger);
  }

  private static double satterthwaite(double v1, double v2, double m1, double m2) {
    double sum = v1 + v2;
    return sum * sum / (v1 * v1 / m1 + v2 * v2 / m2);
  }

  private static double exact(
      double v1, double v2, double m1, double m2, double delta, Level level) {
    double m = m1 + m2;
    return VarianceRatio.power(
        m1,
        m2,
        delta,
        level,
        (b, rest) -> {
          // The two squared standard errors as the samples estimate them, for a sum of m.
          double e1 = v1 * b * m / m1;
          double e2 = v2 * rest * m / m2;
          double df = satterthwaite(e1, e2, m1, m2);
          return TDistribution.of(df).inverseSurvivalProbability(level.perSide())
              * Math.sqrt((e1 + e2) / (v1 + v2));
        });
  }
}
