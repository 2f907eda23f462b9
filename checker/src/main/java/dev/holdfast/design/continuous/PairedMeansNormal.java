package dev.holdfast.design.continuous;

import dev.holdfast.design.Arms;
import dev.holdfast.design.Arrangement;
import dev.holdfast.design.BaseCell;
import dev.holdfast.design.CellKey;
import dev.holdfast.design.Effect;
import dev.holdfast.design.Inputs;
import dev.holdfast.design.Scale;
import dev.holdfast.design.Unit;
import java.util.List;
import java.util.Set;

/** Mean difference within pairs by the normal test, the SD of the differences known. */
public final class PairedMeansNormal extends BaseCell {
  /** The cell. */
  public PairedMeansNormal() {
    super(
        new CellKey(Arrangement.MATCHED_PAIRS, "normal"),
        Set.of(Scale.CONTINUOUS),
        "matched pairs, normal test with known SD",
        "Does the mean difference within pairs differ from zero?",
        Arms.one(1, Unit.PAIRS),
        MeanMethods.PAIRS,
        List.of(MeanMethods.NORMAL_EXACT));
  }

  @Override
  public Effect assume(Inputs inputs) {
    return new MeanEffect(MeanInputs.ofPairs(inputs), MeanMethods::oneSample);
  }
}
