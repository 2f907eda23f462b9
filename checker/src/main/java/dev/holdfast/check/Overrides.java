package dev.holdfast.check;

import dev.holdfast.plan.Figure;
import java.util.Map;

/**
 * Values that stand in for figures of a plan, to ask what would follow if they were others.
 *
 * @param values by the name of a quantity, or by the JSON Pointer of a figure written in place
 */
record Overrides(Map<String, Double> values) {
  static final Overrides NONE = new Overrides(Map.of());

  static Overrides of(String key, double value) {
    return new Overrides(Map.of(key, value));
  }

  /** The value of a figure with this in force. */
  double value(Figure figure) {
    Double value = values.get(key(figure));
    return value == null ? figure.value() : value;
  }

  /** The key under which a figure is replaced. */
  static String key(Figure figure) {
    return figure.quantity().orElse(figure.place().pointer());
  }
}
