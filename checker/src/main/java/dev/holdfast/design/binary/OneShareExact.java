package dev.holdfast.design.binary;

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

/** Share of one group against a fixed value by the exact binomial test. */
public final class OneShareExact extends BaseCell {
  /** The cell. */
  public OneShareExact() {
    super(
        new CellKey(Arrangement.SINGLE_GROUP, "exact-binomial"),
        Set.of(Scale.BINARY),
        "one group, exact binomial test",
        "Does the share of one group differ from a fixed value?",
        Arms.one(1, Unit.PARTICIPANTS),
        OneShareMethods.INPUTS,
        List.of(
            OneShareMethods.BINOMIAL,
            OneShareMethods.NULL_VARIANCE,
            OneShareMethods.NULL_VARIANCE_CORRECTED,
            OneShareMethods.OWN_VARIANCE,
            OneShareMethods.OWN_VARIANCE_CORRECTED,
            OneShareMethods.ARCSINE));
  }

  @Override
  public Effect assume(Inputs inputs) {
    return OneShareEffect.of(inputs);
  }
}
