package dev.holdfast.check.rule;

import dev.holdfast.check.Finding;
import dev.holdfast.check.FindingKind;
import dev.holdfast.check.Rule;
import dev.holdfast.check.StudyView;
import dev.holdfast.plan.Outcome;
import dev.holdfast.plan.Quantity;
import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Optional;
import java.util.Set;

/**
 * {@code unit-mismatch}: a raw difference, a mean or an SD is in another unit than the outcome, or
 * than the figure beside it.
 */
final class UnitMismatch implements Rule {
  private static final Set<String> IN_THE_OUTCOMES_UNIT =
      Set.of(
          "difference",
          "sd",
          "sds",
          "means",
          "mean",
          "null-mean",
          "sd-of-difference",
          "largest-difference");

  @Override
  public List<Finding> look(StudyView view) {
    List<Finding> found = new ArrayList<>();
    Set<String> seen = new HashSet<>();
    for (Assumed.Assumption each : Assumed.of(view)) {
      if (!IN_THE_OUTCOMES_UNIT.contains(each.key()) || each.figure().quantity().isEmpty()) {
        continue;
      }
      Quantity quantity = view.plan().quantities().get(each.figure().quantity().get());
      String analysis = each.subject().substring("analyses.".length());
      Outcome outcome =
          view.plan().outcomes().get(view.plan().analyses().get(analysis).outcome().text());
      Optional<String> expected = expected(view, outcome, each);
      if (outcome.scale().equals("continuous")
          && quantity.unit().isPresent()
          && expected.isPresent()
          && !quantity.unit().get().equals(expected.get())
          && seen.add(each.subject() + " " + quantity.name())) {
        found.add(
            Finding.of(
                FindingKind.UNIT_MISMATCH,
                each.subject(),
                each.figure().place(),
                "'"
                    + quantity.name()
                    + "' is in "
                    + quantity.unit().get()
                    + "; "
                    + analysis
                    + " needs it in "
                    + expected.get()
                    + ".",
                "convert it, with its source, or correct the unit"));
      }
    }
    return found;
  }

  /** The outcome's unit, or else that of the first figure of the same effect that has one. */
  private static Optional<String> expected(
      StudyView view, Outcome outcome, Assumed.Assumption assumption) {
    if (outcome.unit().isPresent()) {
      return outcome.unit();
    }
    return Assumed.of(view).stream()
        .filter(each -> each.subject().equals(assumption.subject()))
        .filter(each -> IN_THE_OUTCOMES_UNIT.contains(each.key()))
        .flatMap(each -> each.figure().quantity().stream())
        .flatMap(name -> view.plan().quantities().get(name).unit().stream())
        .findFirst();
  }
}
