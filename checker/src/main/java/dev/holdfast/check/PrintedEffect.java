package dev.holdfast.check;

import dev.holdfast.plan.Figure;
import dev.holdfast.plan.Input;
import java.util.List;
import java.util.Optional;

/**
 * The one standardised effect that a case rests on, where it does: such a figure is usually printed
 * rounded, while the sample was computed from all its digits.
 */
final class PrintedEffect {
  private static final List<String> STANDARDISED =
      List.of(
          "d",
          "d-between",
          "f",
          "f-squared",
          "partial-eta-squared",
          "w",
          "h",
          "r",
          "r-squared",
          "gain",
          "hazard-ratio",
          "ratio",
          "odds-ratio");

  private PrintedEffect() {}

  /** The effect; empty where there are several, or where the plan states its conventions. */
  static Optional<Figure> find(Situation situation) {
    if (!situation.situation().settings().conventions().stated().isEmpty()) {
      return Optional.empty();
    }
    Figure found = null;
    for (String key : STANDARDISED) {
      if (situation.situation().effect().get(key) instanceof Input.One one) {
        if (found != null) {
          return Optional.empty();
        }
        found = one.figure();
      }
    }
    boolean raw =
        situation.situation().effect().containsKey("difference")
            || situation.situation().effect().containsKey("means");
    return raw ? Optional.empty() : Optional.ofNullable(found);
  }
}
