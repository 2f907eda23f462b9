package dev.holdfast.check.rule;

import dev.holdfast.check.Finding;
import dev.holdfast.check.FindingKind;
import dev.holdfast.check.Rule;
import dev.holdfast.check.StudyView;
import dev.holdfast.plan.Analysis;
import java.util.ArrayList;
import java.util.List;

/**
 * {@code one-sided-unexplained}: a superiority test on one side, without the reason why the other
 * side is of no interest.
 */
final class OneSidedUnexplained implements Rule {
  @Override
  public List<Finding> look(StudyView view) {
    List<Finding> found = new ArrayList<>();
    for (Analysis analysis : view.plan().analyses().values()) {
      boolean oneSided =
          analysis.cases().stream()
              .anyMatch(
                  each ->
                      each.settings()
                          .sides()
                          .filter(word -> word.text().equals("one"))
                          .isPresent());
      if (oneSided
          && analysis.aim().text().equals("superiority")
          && analysis.oneSidedReason().isEmpty()) {
        found.add(
            Finding.of(
                FindingKind.ONE_SIDED_UNEXPLAINED,
                "analyses." + analysis.name(),
                analysis.place(),
                analysis.name() + " tests one side only and does not say why.",
                "give one-sided-reason",
                "test two sides"));
      }
    }
    return found;
  }
}
