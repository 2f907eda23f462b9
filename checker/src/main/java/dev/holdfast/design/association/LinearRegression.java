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
import dev.holdfast.design.association.ExplainedVariance.Measure;
import java.util.List;
import java.util.Map;
import java.util.OptionalDouble;
import java.util.Set;

/**
 * Variance of a continuous outcome explained by predictors whose values are fixed: R squared of
 * all, or what some add to it, by the F test.
 */
public final class LinearRegression extends BaseCell {
  private static final Method NONCENTRAL_F =
      new Method(
          "noncentral-f",
          "the noncentral F distribution, lambda = n f squared",
          "gatsonis-sampson-1989",
          Map.of(Convention.REFERENCE, "exact"),
          true,
          true);
  static final Method DEGREES =
      new Method(
          "noncentral-f-degrees",
          "the noncentral F distribution, lambda = f squared (u + v + 1)",
          "cohen-1988",
          Map.of(),
          false,
          true);

  /** The cell. */
  public LinearRegression() {
    super(
        new CellKey(Arrangement.ASSOCIATION, "linear-regression"),
        Set.of(Scale.CONTINUOUS),
        "association, linear regression with fixed predictors",
        "Do predictors explain variance of a continuous outcome?",
        Arms.one(3, Unit.PARTICIPANTS),
        List.of(
            InputSpec.number("r-squared", "share of variance that all predictors explain"),
            InputSpec.number("gain", "what the tested predictors add to R squared"),
            InputSpec.number("r-squared-full", "R squared with the tested predictors"),
            InputSpec.number("f-squared", "variance explained over the variance left"),
            InputSpec.number("predictors", "number of predictors in the full model"),
            InputSpec.number("tested-predictors", "number tested, all unless stated")),
        List.of(NONCENTRAL_F, DEGREES));
  }

  @Override
  public Effect assume(Inputs inputs) {
    double predictors =
        inputs
            .positive("predictors")
            .orElseThrow(
                () ->
                    InputException.missing("the number of predictors (predictors)", "predictors"));
    double tested = inputs.positive("tested-predictors").orElse(predictors);
    for (String key : List.of("predictors", "tested-predictors")) {
      double count = inputs.number(key).orElse(1);
      if (!(count >= 1) || count != Math.rint(count) || count > 1e6) {
        throw InputException.unfit(key, key + " must be a whole number from 1 on");
      }
    }
    if (tested > predictors) {
      throw InputException.unfit(
          "tested-predictors", "tested-predictors must not exceed predictors");
    }
    return effect(inputs, predictors, tested);
  }

  private static Effect effect(Inputs inputs, double predictors, double tested) {
    OptionalDouble all = inputs.share("r-squared");
    OptionalDouble gain = inputs.share("gain");
    OptionalDouble full = inputs.share("r-squared-full");
    OptionalDouble f2 = inputs.positive("f-squared");
    double explained = (full.isPresent() ? full : all).orElse(Double.NaN);
    if (gain.isPresent()) {
      double left =
          Double.isNaN(explained) ? gain.getAsDouble() / f2.orElse(Double.NaN) : 1 - explained;
      if (Double.isNaN(left)) {
        throw InputException.missing(
            "R squared of the full model (r-squared-full)", "r-squared-full");
      }
      if (gain.getAsDouble() > (1 - left) * (1 + 1e-12)) {
        throw InputException.unfit("gain", "gain must not exceed what the full model explains");
      }
      return new ExplainedVariance(Measure.GAIN, left, gain, predictors, tested);
    }
    double left = 1 - explained;
    if (all.isPresent() && tested == predictors) {
      return new ExplainedVariance(Measure.R_SQUARED, left, all, predictors, tested);
    }
    if (f2.isEmpty() && !Double.isNaN(explained) && tested < predictors) {
      return new ExplainedVariance(Measure.GAIN, left, gain, predictors, tested);
    }
    if (f2.isEmpty() && full.isPresent()) {
      return new ExplainedVariance(Measure.R_SQUARED, left, full, predictors, tested);
    }
    return new ExplainedVariance(Measure.F_SQUARED, left, f2, predictors, tested);
  }
}
