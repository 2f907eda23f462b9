package dev.holdfast.design.binary;

import dev.holdfast.design.Arms;
import dev.holdfast.design.Arrangement;
import dev.holdfast.design.BaseCell;
import dev.holdfast.design.CellKey;
import dev.holdfast.design.Effect;
import dev.holdfast.design.Inputs;
import dev.holdfast.design.Scale;
import java.util.List;
import java.util.Set;

/** Shares of two parallel groups by the difference of their arcsine transforms. */
public final class TwoSharesArcsine extends BaseCell {
  /** The cell. */
  public TwoSharesArcsine() {
    super(
        new CellKey(Arrangement.PARALLEL_GROUPS, "arcsine"),
        Set.of(Scale.BINARY),
        "two parallel groups, arcsine test",
        "Do the shares of two groups differ?",
        Arms.two(1),
        SharePair.INPUTS,
        List.of(TwoShareMethods.ARCSINE));
  }

  @Override
  public Effect assume(Inputs inputs) {
    return ShareEffect.of(SharePair.of(inputs), true);
  }
}
