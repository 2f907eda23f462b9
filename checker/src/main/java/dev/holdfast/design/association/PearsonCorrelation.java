package dev.holdfast.design.association;

import dev.holdfast.design.Arms;
import dev.holdfast.design.Arrangement;
import dev.holdfast.design.BaseCell;
import dev.holdfast.design.CellKey;
import dev.holdfast.design.Convention;
import dev.holdfast.design.Effect;
import dev.holdfast.design.InputException;
import dev.holdfast.design.InputSpec;
import dev.holdfast.design.Inputs;
import dev.holdfast.design.Method;
import dev.holdfast.design.Scale;
import dev.holdfast.design.Unit;
import java.util.List;
import java.util.Map;
import java.util.OptionalDouble;
import java.util.Set;

/**
 * Pearson correlation of two normal variables, against zero or another fixed value: by the exact
 * distribution of r, or by Fisher's z.
 */
public final class PearsonCorrelation extends BaseCell {
  static final Method EXACT =
      new Method(
          "exact-r",
          "the exact distribution of r",
          "hotelling-1953",
          Map.of(Convention.REFERENCE, "exact"),
          true,
          true);
  static final Method FISHER =
      new Method(
          "fisher-z",
          "Fisher's z",
          "fisher-1921",
          Map.of(Convention.REFERENCE, "normal"),
          false,
          true);
  static final Method FISHER_BIAS =
      new Method(
          "fisher-z-bias",
          "Fisher's z with its bias r/(2(n - 1))",
          "fisher-1921",
          Map.of(Convention.REFERENCE, "normal"),
          false,
          true);
  static final Method FISHER_T =
      new Method(
          "fisher-z-t",
          "Fisher's z with its bias r/(2(n - 1)), the critical correlation by Student's t",
          "cohen-1988",
          Map.of(Convention.REFERENCE, "student-t"),
          false,
          true);

  /** The cell. */
  public PearsonCorrelation() {
    super(
        new CellKey(Arrangement.ASSOCIATION, "pearson-r"),
        Set.of(Scale.CONTINUOUS),
        "association, Pearson correlation",
        "Does a correlation differ from zero, or from a fixed value?",
        Arms.one(4, Unit.PARTICIPANTS),
        List.of(
            InputSpec.number("r", "correlation assumed"),
            InputSpec.number("null-r", "correlation under the null hypothesis, 0 unless stated")),
        List.of(EXACT, FISHER, FISHER_BIAS, FISHER_T));
  }

  @Override
  public Effect assume(Inputs inputs) {
    return new CorrelationEffect(correlation(inputs, "r"), correlation(inputs, "null-r").orElse(0));
  }

  private static OptionalDouble correlation(Inputs inputs, String key) {
    OptionalDouble value = inputs.number(key);
    if (value.isPresent() && !(Math.abs(value.getAsDouble()) < 1)) {
      throw InputException.unfit(key, key + " must lie between -1 and 1");
    }
    return value;
  }
}
