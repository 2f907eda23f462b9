package dev.holdfast.check.rule;

import dev.holdfast.check.Finding;
import dev.holdfast.check.FindingKind;
import dev.holdfast.check.Rule;
import dev.holdfast.check.StudyView;
import dev.holdfast.plan.Analysis;
import dev.holdfast.plan.Family;
import dev.holdfast.plan.Word;
import java.util.ArrayList;
import java.util.List;
import java.util.Set;
import java.util.stream.Collectors;

/**
 * {@code family-incomplete}: primary analyses share an error rate and one primary analysis is left
 * out, or a family names fewer than two analyses.
 */
final class FamilyIncomplete implements Rule {
  @Override
  public List<Finding> look(StudyView view) {
    List<Finding> found = new ArrayList<>();
    Set<String> named =
        view.plan().families().values().stream()
            .flatMap(family -> family.of().stream())
            .map(Word::text)
            .collect(Collectors.toSet());
    List<Analysis> primary = OutcomesUncorrected.primary(view);
    List<Analysis> left =
        primary.stream().filter(analysis -> !named.contains(analysis.name())).toList();
    boolean someNamed = left.size() < primary.size();
    if (someNamed && left.size() == 1) {
      Analysis analysis = left.get(0);
      found.add(
          Finding.of(
              FindingKind.FAMILY_INCOMPLETE,
              "analyses." + analysis.name(),
              analysis.place(),
              analysis.name()
                  + " tests a primary outcome and stands in no family, although other primary"
                  + " analyses do.",
              "name it in their family",
              "make its outcome secondary"));
    }
    for (Family family : view.plan().families().values()) {
      if (family.of().size() < 2) {
        found.add(
            Finding.of(
                FindingKind.FAMILY_INCOMPLETE,
                "families." + family.name(),
                family.place(),
                "The family '" + family.name() + "' names fewer than two analyses.",
                "name the others",
                "leave the family out"));
      }
    }
    return found;
  }
}
