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
import dev.holdfast.design.ZPower;
import java.util.List;
import java.util.Set;

/** Means of two parallel groups by the normal test, the SDs known and not necessarily equal. */
public final class ParallelMeansNormal extends BaseCell {
  /** The cell. */
  public ParallelMeansNormal() {
    super(
        new CellKey(Arrangement.PARALLEL_GROUPS, "normal"),
        Set.of(Scale.CONTINUOUS),
        "two parallel groups, normal test with known SDs",
        "Do the means of two groups differ?",
        Arms.two(1),
        MeanMethods.TWO_GROUPS,
        List.of(MeanMethods.NORMAL_EXACT));
  }

  @Override
  public Effect assume(Inputs inputs) {
    return new MeanEffect(MeanInputs.ofGroups(inputs), ParallelMeansNormal::power);
  }

  private static double power(
      MeanDifference means, Method method, double[] sizes, Level level, Ledger ledger) {
    double error = MeanMethods.standardError(means, sizes[0], sizes[1], ledger);
    double delta = means.size() / error;
    ledger.step(
        "noncentrality", "delta = difference/SE", delta, "difference", means.size(), "SE", error);
    return ZPower.power(delta, level, ledger);
  }
}
