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

/** Mean of one group against a fixed value by Student's t test. */
public final class OneMeanStudent extends BaseCell {
  /** The cell. */
  public OneMeanStudent() {
    super(
        new CellKey(Arrangement.SINGLE_GROUP, "student-t"),
        Set.of(Scale.CONTINUOUS),
        "one group, Student's t test",
        "Does the mean of one group differ from a fixed value?",
        Arms.one(2, Unit.PARTICIPANTS),
        MeanMethods.ONE_GROUP,
        List.of(MeanMethods.NONCENTRAL_T, MeanMethods.NORMAL));
  }

  @Override
  public Effect assume(Inputs inputs) {
    return new MeanEffect(MeanInputs.ofOneGroup(inputs), MeanMethods::oneSample);
  }
}
