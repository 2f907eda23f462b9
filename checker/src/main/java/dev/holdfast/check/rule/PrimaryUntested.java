package dev.holdfast.check.rule;

import dev.holdfast.check.Finding;
import dev.holdfast.check.FindingKind;
import dev.holdfast.check.Rule;
import dev.holdfast.check.StudyView;
import dev.holdfast.plan.Outcome;
import java.util.ArrayList;
import java.util.List;

/** {@code primary-untested}: no analysis tests a primary outcome. */
final class PrimaryUntested implements Rule {
  @Override
  public List<Finding> look(StudyView view) {
    List<Finding> found = new ArrayList<>();
    for (Outcome outcome : view.plan().outcomes().values()) {
      boolean tested =
          view.plan().analyses().values().stream()
              .anyMatch(analysis -> analysis.outcome().text().equals(outcome.name()));
      if (outcome.role().equals("primary") && !tested) {
        found.add(
            Finding.of(
                FindingKind.PRIMARY_UNTESTED,
                "outcomes." + outcome.name(),
                outcome.place(),
                "No analysis tests the primary outcome '" + outcome.name() + "'.",
                "add its analysis",
                "make it secondary"));
      }
    }
    return found;
  }
}
