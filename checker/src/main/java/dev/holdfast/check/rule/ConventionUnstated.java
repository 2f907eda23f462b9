package dev.holdfast.check.rule;

import dev.holdfast.check.ClaimResult;
import dev.holdfast.check.Finding;
import dev.holdfast.check.FindingKind;
import dev.holdfast.check.Rule;
import dev.holdfast.check.StudyView;
import dev.holdfast.check.Verdict;
import java.util.ArrayList;
import java.util.List;

/**
 * {@code convention-unstated}: a claim follows only by a convention that the plan does not state.
 */
final class ConventionUnstated implements Rule {
  @Override
  public List<Finding> look(StudyView view) {
    List<Finding> found = new ArrayList<>();
    for (ClaimResult result : view.claims()) {
      if (result.verdict() == Verdict.CONDITIONAL) {
        found.add(
            new Finding(
                FindingKind.CONVENTION_UNSTATED,
                FindingKind.CONVENTION_UNSTATED.weight(),
                result.subject(),
                Wording.owner(result)
                    + " claims "
                    + Wording.claimed(result)
                    + "; by "
                    + result.method()
                    + " its assumptions give "
                    + Wording.computed(result)
                    + ", but "
                    + result.explanation()
                    + "."
                    + Wording.fall(result),
                List.of(
                    "state the convention under conventions, if it was meant",
                    "claim " + Wording.computed(result)),
                result.claim().figure().place()));
      }
    }
    return found;
  }
}
