package dev.holdfast.design.continuous;

import dev.holdfast.design.Arms;
import dev.holdfast.design.Arrangement;
import dev.holdfast.design.BaseCell;
import dev.holdfast.design.CellKey;
import dev.holdfast.design.Effect;
import dev.holdfast.design.Inputs;
import dev.holdfast.design.Ledger;
import dev.holdfast.design.Level;
import dev.holdfast.design.Method;
import dev.holdfast.design.Scale;
import dev.holdfast.design.TPower;
import dev.holdfast.design.ZPower;
import java.util.List;
import java.util.Set;
import org.apache.commons.statistics.distribution.TDistribution;

/**
 * Means of two parallel groups by Student's t test, which takes the variance as common to both.
 *
 * <p>The plain method assumes so too, and takes two SDs for one, the root of the mean of their
 * squares. The exact method gives the power that the test has when they differ.
 */
public final class ParallelMeansStudent extends BaseCell {
  /** The cell. */
  public ParallelMeansStudent() {
    super(
        new CellKey(Arrangement.PARALLEL_GROUPS, "student-t"),
        Set.of(Scale.CONTINUOUS),
        "two parallel groups, Student's t test",
        "Do the means of two groups differ?",
        Arms.two(2),
        MeanMethods.TWO_GROUPS,
        List.of(MeanMethods.COMMON_VARIANCE, MeanMethods.VARIANCES_APART, MeanMethods.NORMAL));
  }

  @Override
  public Effect assume(Inputs inputs) {
    return new MeanEffect(MeanInputs.ofGroups(inputs), ParallelMeansStudent::power);
  }

  private static double power(
      MeanDifference means, Method method, double[] sizes, Level level, Ledger ledger) {
    double n1 = sizes[0];
    double n2 = sizes[1];
    double df = n1 + n2 - 2;
    if (method.equals(MeanMethods.VARIANCES_APART) && means.sdFirst() != means.sdSecond()) {
      return apart(means, n1, n2, level, ledger);
    }
    double d = means.d();
    double delta = d * Math.sqrt(n1 * n2 / (n1 + n2));
    ledger.step(
        "noncentrality", "delta = d*sqrt(n1*n2/(n1 + n2))", delta, "d", d, "n1", n1, "n2", n2);
    if (method.equals(MeanMethods.NORMAL)) {
      return ZPower.power(delta, level, ledger);
    }
    ledger.step("degrees of freedom", "df = n1 + n2 - 2", df, "n1", n1, "n2", n2);
    return TPower.power(df, delta, level, ledger);
  }

  private static double apart(
      MeanDifference means, double n1, double n2, Level level, Ledger ledger) {
    double error = MeanMethods.standardError(means, n1, n2, ledger);
    double delta = means.size() / error;
    ledger.step(
        "noncentrality", "delta = difference/SE", delta, "difference", means.size(), "SE", error);
    double critical = TDistribution.of(n1 + n2 - 2).inverseSurvivalProbability(level.perSide());
    double first = means.sdFirst() / error * (means.sdFirst() / error) * (1 / n1 + 1 / n2);
    double second = means.sdSecond() / error * (means.sdSecond() / error) * (1 / n1 + 1 / n2);
    // The standard error that the test estimates from the pooled variance, over the true one.
    double power =
        VarianceRatio.power(
            n1 - 1,
            n2 - 1,
            delta,
            level,
            (b, rest) -> critical * Math.sqrt(first * b + second * rest));
    ledger.step("power", MeanMethods.OVER_THE_RATIO, power, "n1", n1, "n2", n2);
    return power;
  }
}
