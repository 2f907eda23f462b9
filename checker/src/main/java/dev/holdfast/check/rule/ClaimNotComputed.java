package dev.holdfast.check.rule;

import dev.holdfast.check.ClaimResult;
import dev.holdfast.check.Finding;
import dev.holdfast.check.FindingKind;
import dev.holdfast.check.Missing;
import dev.holdfast.check.Rule;
import dev.holdfast.check.StudyView;
import dev.holdfast.check.Verdict;
import java.util.ArrayList;
import java.util.List;
import java.util.stream.Collectors;

/**
 * {@code claim-not-computed}: what a claim needs is missing, or cannot be computed yet; or the plan
 * claims nothing although it says that its sample rests on power.
 */
final class ClaimNotComputed implements Rule {
  @Override
  public List<Finding> look(StudyView view) {
    List<Finding> found = new ArrayList<>();
    for (ClaimResult result : view.claims()) {
      if (result.verdict() == Verdict.NOT_COMPUTED) {
        found.add(
            new Finding(
                FindingKind.CLAIM_NOT_COMPUTED,
                FindingKind.CLAIM_NOT_COMPUTED.weight(),
                result.subject(),
                Wording.owner(result)
                    + " claims "
                    + Wording.claimed(result)
                    + ", which is not computed: "
                    + result.explanation()
                    + "."
                    + Wording.fall(result),
                remedies(view, result),
                result.claim().figure().place()));
      }
    }
    if (view.claims().isEmpty() && view.plan().study().justification().equals("power")) {
      found.add(
          Finding.of(
              FindingKind.CLAIM_NOT_COMPUTED,
              "study",
              view.plan().study().place(),
              "The study is justified by power and no analysis claims any figure.",
              "add claims, such as the power at the sample",
              "change justification, if the sample rests on something else"));
    }
    return found;
  }

  /** What would supply all that is missing, as one remedy: a part of it would not help. */
  private static List<String> remedies(StudyView view, ClaimResult result) {
    String all =
        Wording.situation(view, result).stream()
            .flatMap(situation -> situation.missing().stream())
            .map(Missing::remedy)
            .distinct()
            .collect(Collectors.joining("; "));
    return all.isEmpty() ? List.of() : List.of(all);
  }
}
