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

/** Share of one group against a fixed value by the normal test with the null variance. */
public final class OneShareNormal extends BaseCell {
  /** The cell. */
  public OneShareNormal() {
    super(
        new CellKey(Arrangement.SINGLE_GROUP, "proportion-z"),
        Set.of(Scale.BINARY),
        "one group, normal test of a share",
        "Does the share of one group differ from a fixed value?",
        Arms.one(1, Unit.PARTICIPANTS),
        OneShareMethods.INPUTS,
        List.of(
            OneShareMethods.NULL_VARIANCE,
            OneShareMethods.NULL_VARIANCE_CORRECTED,
            OneShareMethods.OWN_VARIANCE,
            OneShareMethods.OWN_VARIANCE_CORRECTED,
            OneShareMethods.ARCSINE,
            OneShareMethods.ENUMERATED));
  }

  @Override
  public Effect assume(Inputs inputs) {
    return OneShareEffect.of(inputs);
  }
}
