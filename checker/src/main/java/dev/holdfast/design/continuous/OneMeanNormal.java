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

/** Mean of one group against a fixed value by the normal test, the SD known. */
public final class OneMeanNormal extends BaseCell {
  /** The cell. */
  public OneMeanNormal() {
    super(
        new CellKey(Arrangement.SINGLE_GROUP, "normal"),
        Set.of(Scale.CONTINUOUS),
        "one group, normal test with known SD",
        "Does the mean of one group differ from a fixed value?",
        Arms.one(1, Unit.PARTICIPANTS),
        MeanMethods.ONE_GROUP,
        List.of(MeanMethods.NORMAL_EXACT));
  }

  @Override
  public Effect assume(Inputs inputs) {
    return new MeanEffect(MeanInputs.ofOneGroup(inputs), MeanMethods::oneSample);
  }
}
