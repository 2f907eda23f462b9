package dev.holdfast.design.association;

import dev.holdfast.design.Effect;
import dev.holdfast.design.FPower;
import dev.holdfast.design.Ledger;
import dev.holdfast.design.Level;
import dev.holdfast.design.Method;
import dev.holdfast.design.Metric;
import java.util.LinkedHashMap;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;

/**
 * Variance that predictors explain, in one of three measures.
 *
 * @param measure the measure
 * @param left variance left by the full model, which a gain is held against; NaN if unknown
 * @param value the effect in the measure
 * @param predictors in the full model
 * @param tested of them tested
 */
record ExplainedVariance(
    Measure measure, double left, OptionalDouble value, double predictors, double tested)
    implements Effect {
  /** Measures of the effect. */
  enum Measure {
    R_SQUARED("r-squared"),
    GAIN("gain"),
    F_SQUARED("f-squared");

    private final String key;

    Measure(String key) {
      this.key = key;
    }
  }

  @Override
  public Metric metric() {
    double far =
        switch (measure) {
          case GAIN -> 1 - left;
          case R_SQUARED -> 1;
          case F_SQUARED -> Double.POSITIVE_INFINITY;
        };
    return new Metric(measure.key, 0, far);
  }

  @Override
  public Effect at(double moved) {
    return new ExplainedVariance(measure, left, OptionalDouble.of(moved), predictors, tested);
  }

  @Override
  public Optional<Effect> in(String metric) {
    for (Measure other : Measure.values()) {
      if (other.key.equals(metric) && known(other)) {
        OptionalDouble stated =
            value.isPresent() ? OptionalDouble.of(stated(other)) : OptionalDouble.empty();
        return Optional.of(new ExplainedVariance(other, left, stated, predictors, tested));
      }
    }
    return Optional.empty();
  }

  @Override
  public Map<String, Double> measures() {
    Map<String, Double> measures = new LinkedHashMap<>();
    for (Measure other : Measure.values()) {
      if (value.isPresent() && known(other)) {
        measures.put(other.key, stated(other));
      }
    }
    return measures;
  }

  private boolean known(Measure other) {
    return switch (other) {
      case R_SQUARED -> tested == predictors;
      case GAIN -> !Double.isNaN(left) && tested < predictors || measure == Measure.GAIN;
      case F_SQUARED -> true;
    };
  }

  private double stated(Measure other) {
    double effect = value.orElseThrow(() -> new IllegalStateException("no effect is assumed"));
    if (other == measure) {
      return effect;
    }
    double f2 = fSquared();
    return switch (other) {
      case R_SQUARED -> f2 / (1 + f2);
      case GAIN -> f2 * left;
      case F_SQUARED -> f2;
    };
  }

  private double fSquared() {
    double effect = value.orElseThrow(() -> new IllegalStateException("no effect is assumed"));
    return switch (measure) {
      case GAIN -> effect / left;
      case R_SQUARED -> effect / (1 - effect);
      case F_SQUARED -> effect;
    };
  }

  @Override
  public void derive(Ledger ledger) {
    if (value.isEmpty()) {
      return;
    }
    double effect = value.getAsDouble();
    if (measure == Measure.GAIN) {
      ledger.step("effect", "f2 = gain/(1 - R2)", fSquared(), "gain", effect, "R2", 1 - left);
    } else if (measure == Measure.R_SQUARED) {
      ledger.step("effect", "f2 = R2/(1 - R2)", fSquared(), "R2", effect);
    }
  }

  @Override
  public double power(Method method, double[] sizes, Level level, Ledger ledger) {
    double n = sizes[0];
    double df2 = n - predictors - 1;
    if (df2 <= 0) {
      return 0;
    }
    double f2 = fSquared();
    boolean degrees = method.equals(LinearRegression.DEGREES);
    ledger.step("degrees of freedom", "df1 = tested", tested, "tested", tested);
    ledger.step(
        "degrees of freedom", "df2 = n - predictors - 1", df2, "n", n, "predictors", predictors);
    if (df2 <= 0) {
      ledger.step("power", "power = 0, for want of degrees of freedom", 0);
      return 0;
    }
    double lambda = degrees ? f2 * (tested + df2 + 1) : n * f2;
    ledger.step(
        "noncentrality",
        degrees ? "lambda = f2*(df1 + df2 + 1)" : "lambda = n*f2",
        lambda,
        "f2",
        f2,
        "n",
        n,
        "df1",
        tested,
        "df2",
        df2);
    return FPower.power(tested, df2, lambda, level, ledger);
  }
}
