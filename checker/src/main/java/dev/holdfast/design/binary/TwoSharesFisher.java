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

/** Shares of two parallel groups by Fisher's exact test. */
public final class TwoSharesFisher extends BaseCell {
  /** The cell. */
  public TwoSharesFisher() {
    super(
        new CellKey(Arrangement.PARALLEL_GROUPS, "fisher-exact"),
        Set.of(Scale.BINARY),
        "two parallel groups, Fisher's exact test",
        "Do the shares of two groups differ?",
        Arms.two(1),
        SharePair.INPUTS,
        List.of(
            TwoShareMethods.FISHER_EXACT,
            TwoShareMethods.POOLED_CORRECTED,
            TwoShareMethods.UNPOOLED_CORRECTED,
            TwoShareMethods.POOLED,
            TwoShareMethods.UNPOOLED,
            TwoShareMethods.ARCSINE));
  }

  @Override
  public Effect assume(Inputs inputs) {
    return ShareEffect.of(SharePair.of(inputs), false);
  }
}
