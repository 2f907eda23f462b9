package dev.holdfast.design.continuous;

import dev.holdfast.design.Effect;
import dev.holdfast.design.FPower;
import dev.holdfast.design.Ledger;
import dev.holdfast.design.Level;
import dev.holdfast.design.Method;
import dev.holdfast.design.Metric;
import dev.holdfast.design.Step;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;

/**
 * An assumed difference of several means, in one of three measures.
 *
 * @param measure how it is stated
 * @param value the effect in that measure
 * @param pattern how the means lie to each other
 * @param planned the shares of the groups for which f is stated
 * @param range largest difference over f at these shares; NaN where it is not known
 * @param steps how the effect follows from the inputs
 */
record GroupsEffect(
    Measure measure,
    OptionalDouble value,
    GroupPattern pattern,
    double[] planned,
    double range,
    List<Step> steps)
    implements Effect {

  /** Measures of the effect. */
  enum Measure {
    F("f", Double.POSITIVE_INFINITY),
    PARTIAL_ETA_SQUARED("partial-eta-squared", 1),
    LARGEST_DIFFERENCE("largest-difference", Double.POSITIVE_INFINITY);

    private final String key;
    private final double far;

    Measure(String key, double far) {
      this.key = key;
      this.far = far;
    }
  }

  @Override
  public Metric metric() {
    return new Metric(measure.key, 0, measure.far);
  }

  @Override
  public Effect at(double moved) {
    return new GroupsEffect(measure, OptionalDouble.of(moved), pattern, planned, range, List.of());
  }

  @Override
  public Optional<Effect> in(String metric) {
    for (Measure other : Measure.values()) {
      if (other.key.equals(metric) && known(other)) {
        OptionalDouble stated =
            value.isPresent() ? OptionalDouble.of(stated(other)) : OptionalDouble.empty();
        GroupPattern own =
            other == Measure.LARGEST_DIFFERENCE && pattern == GroupPattern.UNKNOWN
                ? GroupPattern.LEAST_FAVOURABLE
                : pattern;
        return Optional.of(new GroupsEffect(other, stated, own, planned, range, steps));
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
    return other != Measure.LARGEST_DIFFERENCE || !Double.isNaN(range);
  }

  /** SD of the means over the SD within groups, at the planned shares. */
  private double f() {
    double effect = value.orElseThrow(() -> new IllegalStateException("no effect is assumed"));
    return switch (measure) {
      case F -> effect;
      case PARTIAL_ETA_SQUARED -> Math.sqrt(effect / (1 - effect));
      case LARGEST_DIFFERENCE -> effect / range;
    };
  }

  private double stated(Measure other) {
    if (other == measure) {
      return value.orElseThrow();
    }
    double f = f();
    return switch (other) {
      case F -> f;
      case PARTIAL_ETA_SQUARED -> f * f / (1 + f * f);
      case LARGEST_DIFFERENCE -> f * range;
    };
  }

  @Override
  public void derive(Ledger ledger) {
    steps.forEach(ledger::take);
  }

  @Override
  public double power(Method method, double[] sizes, Level level, Ledger ledger) {
    double total = 0;
    for (double size : sizes) {
      total += size;
    }
    // Sizes that are not in the planned ratio weigh the same means otherwise.
    double f = f() * pattern.spread(sizes) / pattern.spread(planned);
    double lambda = total * f * f;
    double df1 = sizes.length - 1;
    double df2 = total - sizes.length;
    ledger.step("noncentrality", "lambda = N*f^2", lambda, "N", total, "f", f);
    ledger.step("degrees of freedom", "df1 = k - 1", df1, "k", sizes.length);
    ledger.step("degrees of freedom", "df2 = N - k", df2, "N", total, "k", sizes.length);
    return FPower.power(df1, df2, lambda, level, ledger);
  }
}
