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
import java.util.Optional;
import java.util.OptionalDouble;

/**
 * {@code method-optimistic}: a claim is true by the method that the plan states, and the best
 * method gives less than is claimed, or a number claimed does not reach its target by the best
 * method.
 */
final class MethodOptimistic implements Rule {
  @Override
  public List<Finding> look(StudyView view) {
    List<Finding> found = new ArrayList<>();
    for (ClaimResult result : view.claims()) {
      if (result.verdict() == Verdict.HOLDS || result.verdict() == Verdict.UNDERSTATED) {
        Wording.situation(view, result).flatMap(each -> look(each, result)).ifPresent(found::add);
      }
    }
    return found;
  }

  private static Optional<Finding> look(Situation situation, ClaimResult result) {
    double wanted;
    int decimals;
    if (result.claim().kind().equals("power")) {
      wanted = result.claim().figure().value();
      decimals = Math.max(2, result.claim().figure().decimals());
    } else if (result.claim().kind().equals("total")
        && situation.target().isPresent()
        && situation.hasPower()
        && situation.situation().claims().stream()
            .noneMatch(claim -> claim.kind().equals("power"))) {
      Figure target = situation.situation().settings().targetPower().orElseThrow();
      wanted = target.value();
      decimals = Math.max(2, target.decimals());
    } else {
      return Optional.empty();
    }
    OptionalDouble best = situation.bestPower();
    if (best.isEmpty() || Numbers.round(best.getAsDouble(), decimals) >= wanted) {
      return Optional.empty();
    }
    return Optional.of(
        Finding.of(
            FindingKind.METHOD_OPTIMISTIC,
            result.subject(),
            result.claim().figure().place(),
            Wording.owner(result)
                + " claims "
                + Wording.claimed(result)
                + ", true by "
                + result.method()
                + "; by "
                + situation.cell().orElseThrow().best().title()
                + " the power at this sample is "
                + Numbers.fixed(best.getAsDouble(), decimals)
                + ".",
            "enlarge the sample",
            "state the power by the better method"));
  }
}
