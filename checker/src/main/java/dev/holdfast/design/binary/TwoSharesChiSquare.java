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

/**
 * Shares of two parallel groups by Pearson's chi-square test, which two-sided is the pooled z test.
 */
public final class TwoSharesChiSquare extends BaseCell {
  /** The cell. */
  public TwoSharesChiSquare() {
    super(
        new CellKey(Arrangement.PARALLEL_GROUPS, "pearson-chi-square"),
        Set.of(Scale.BINARY),
        "two parallel groups, Pearson's chi-square test",
        "Do the shares of two groups differ?",
        Arms.two(1),
        SharePair.INPUTS,
        List.of(
            TwoShareMethods.POOLED,
            TwoShareMethods.POOLED_CORRECTED,
            TwoShareMethods.UNPOOLED,
            TwoShareMethods.UNPOOLED_CORRECTED,
            TwoShareMethods.CONTROL,
            TwoShareMethods.ARCSINE,
            TwoShareMethods.ENUMERATED,
            TwoShareMethods.FISHER));
  }

  @Override
  public Effect assume(Inputs inputs) {
    return ShareEffect.of(SharePair.of(inputs), false);
  }
}
