package dev.holdfast.check.rule;

import dev.holdfast.check.Finding;
import dev.holdfast.check.FindingKind;
import dev.holdfast.check.Rule;
import dev.holdfast.check.StudyView;
import dev.holdfast.family.ErrorControl;
import dev.holdfast.plan.Analysis;
import dev.holdfast.plan.Family;
import dev.holdfast.plan.Word;
import java.util.ArrayList;
import java.util.List;
import java.util.Set;
import java.util.stream.Collectors;

/**
 * {@code outcomes-uncorrected}: two or more primary analyses stand in no family that controls their
 * error together.
 */
final class OutcomesUncorrected implements Rule {
  @Override
  public List<Finding> look(StudyView view) {
    Set<String> corrected =
        view.plan().families().values().stream()
            .filter(OutcomesUncorrected::corrects)
            .flatMap(family -> family.of().stream())
            .map(Word::text)
            .collect(Collectors.toSet());
    List<Analysis> free = new ArrayList<>();
    int primaries = 0;
    for (Analysis analysis : primary(view)) {
      primaries++;
      if (!corrected.contains(analysis.name())) {
        free.add(analysis);
      }
    }
    if (primaries < 2 || free.size() < 2) {
      return List.of();
    }
    String names = free.stream().map(Analysis::name).collect(Collectors.joining(", "));
    return List.of(
        Finding.of(
            FindingKind.OUTCOMES_UNCORRECTED,
            "analyses." + free.get(1).name(),
            free.get(1).place(),
            free.size()
                + " primary analyses ("
                + names
                + ") stand in no family that controls their error together.",
            "name them in a family with its control",
            "make all but one secondary"));
  }

  private static boolean corrects(Family family) {
    return ErrorControl.of(family.control().text()).map(ErrorControl::corrects).orElse(false);
  }

  /** The analyses of primary outcomes. */
  static List<Analysis> primary(StudyView view) {
    return view.plan().analyses().values().stream()
        .filter(
            analysis ->
                view.plan().outcomes().get(analysis.outcome().text()).role().equals("primary"))
        .toList();
  }
}
