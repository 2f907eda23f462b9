package dev.holdfast.check.rule;

import dev.holdfast.check.ClaimResult;
import dev.holdfast.check.Finding;
import dev.holdfast.check.FindingKind;
import dev.holdfast.check.Numbers;
import dev.holdfast.check.Rule;
import dev.holdfast.check.Situation;
import dev.holdfast.check.StudyView;
import dev.holdfast.check.Verdict;
import dev.holdfast.plan.Figure;
import java.util.ArrayList;
import java.util.List;

/**
 * {@code under-target}: the sample of an analysis gives less power than the plan itself aims at,
 * whether a claim says so or no claim is made of it.
 */
final class UnderTarget implements Rule {
  @Override
  public List<Finding> look(StudyView view) {
    List<Finding> found = new ArrayList<>();
    for (ClaimResult result : view.claims()) {
      if (result.verdict() == Verdict.UNMET) {
        found.add(
            new Finding(
                FindingKind.UNDER_TARGET,
                FindingKind.UNDER_TARGET.weight(),
                result.subject(),
                Wording.owner(result)
                    + " claims "
                    + Wording.claimed(result)
                    + ", which follows, but "
                    + result.explanation()
                    + "."
                    + Wording.fall(result),
                List.of("enlarge the sample", "lower target-power, with the reason in the plan"),
                result.claim().figure().place()));
      }
    }
    for (Situation situation : view.situations()) {
      if (situation.hasPower()
          && situation.target().isPresent()
          && situation.situation().claims().isEmpty()) {
        check(situation, found);
      }
    }
    return found;
  }

  /** Where nothing is claimed, the sample itself is held against the target. */
  private static void check(Situation situation, List<Finding> found) {
    Figure target = situation.situation().settings().targetPower().orElseThrow();
    double power = situation.power();
    if (Numbers.round(power, Math.max(2, target.decimals())) < target.value()) {
      found.add(
          Finding.of(
              FindingKind.UNDER_TARGET,
              situation.subject(),
              situation.situation().place(),
              situation.analysis().name()
                  + " has a power of "
                  + Numbers.fixed(power, Math.max(2, target.decimals()))
                  + " at its sample, under the target of "
                  + target.written()
                  + ".",
              "enlarge the sample",
              "lower target-power, with the reason in the plan"));
    }
  }
}
