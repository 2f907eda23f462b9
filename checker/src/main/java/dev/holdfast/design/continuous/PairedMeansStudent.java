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

/** Mean difference within pairs by Student's t test. */
public final class PairedMeansStudent extends BaseCell {
  /** The cell. */
  public PairedMeansStudent() {
    super(
        new CellKey(Arrangement.MATCHED_PAIRS, "student-t"),
        Set.of(Scale.CONTINUOUS),
        "matched pairs, Student's t test",
        "Does the mean difference within pairs differ from zero?",
        Arms.one(2, Unit.PAIRS),
        MeanMethods.PAIRS,
        List.of(MeanMethods.NONCENTRAL_T, MeanMethods.NORMAL));
  }

  @Override
  public Effect assume(Inputs inputs) {
    return new MeanEffect(MeanInputs.ofPairs(inputs), MeanMethods::oneSample);
  }
}
