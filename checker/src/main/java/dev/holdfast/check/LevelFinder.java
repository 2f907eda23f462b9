package dev.holdfast.check;

import dev.holdfast.design.Level;
import dev.holdfast.design.Sides;
import dev.holdfast.family.ErrorControl;
import dev.holdfast.plan.Analysis;
import dev.holdfast.plan.Case;
import dev.holdfast.plan.Family;
import dev.holdfast.plan.Figure;
import dev.holdfast.plan.Plan;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;

/**
 * The level at which an analysis is tested: its own where it states one, otherwise what the control
 * of its family leaves it of the study's level. Nothing is guessed.
 */
final class LevelFinder {
  private LevelFinder() {}

  record Found(Optional<Level> level, String origin, List<Missing> missing) {}

  static Found find(Plan plan, Analysis analysis, Case each, Overrides overrides) {
    List<Missing> missing = new ArrayList<>();
    if (each.settings().sides().isEmpty()) {
      missing.add(
          new Missing(
              "whether the test has one side or two is not given",
              "state sides under defaults or in the analysis"));
    }
    Optional<Figure> alpha = each.settings().alpha();
    Optional<Family> family = familyOf(plan, analysis.name());
    String origin = "";
    OptionalDouble level = OptionalDouble.empty();
    if (alpha.isPresent() && (family.isEmpty() || isOwn(alpha.get()))) {
      level = OptionalDouble.of(overrides.value(alpha.get()));
    } else if (family.isPresent()) {
      Family its = family.get();
      Figure given = its.levels().get(analysis.name());
      Optional<Figure> shared = its.alpha().isPresent() ? its.alpha() : alpha;
      if (given != null) {
        level = OptionalDouble.of(overrides.value(given));
        origin = "the level that the family '" + its.name() + "' gives it";
      } else if (shared.isPresent()) {
        double whole = overrides.value(shared.get());
        ErrorControl control = ErrorControl.of(its.control().text()).orElseThrow();
        level = control.guaranteedLevel(whole, its.of().size());
        if (level.isEmpty()) {
          missing.add(
              new Missing(
                  "the level under the control '" + its.control() + "' is not computed yet",
                  "state the alpha used in the analysis, or a level for it in the family"));
          return new Found(Optional.empty(), origin, missing);
        }
        origin =
            "the level that "
                + its.control()
                + " guarantees to each of "
                + its.of().size()
                + " tests at "
                + Numbers.brief(whole)
                + " in all";
      }
    }
    if (level.isEmpty()) {
      missing.add(
          new Missing("alpha is not given", "state alpha under defaults or in the analysis"));
    } else if (!(level.getAsDouble() > 0 && level.getAsDouble() < 1)) {
      missing.add(new Missing("alpha does not lie between 0 and 1", "correct alpha"));
      level = OptionalDouble.empty();
    }
    if (level.isEmpty() || each.settings().sides().isEmpty()) {
      return new Found(Optional.empty(), origin, missing);
    }
    Sides sides = Sides.of(each.settings().sides().get().text());
    return new Found(Optional.of(Level.of(level.getAsDouble(), sides)), origin, missing);
  }

  /** The first family that names an analysis. */
  static Optional<Family> familyOf(Plan plan, String analysis) {
    return plan.families().values().stream()
        .filter(family -> family.of().stream().anyMatch(word -> word.text().equals(analysis)))
        .findFirst();
  }

  /** Whether an alpha is the analysis's own rather than the study's default. */
  static boolean isOwn(Figure alpha) {
    return !alpha.place().pointer().startsWith("/defaults/");
  }
}
