package dev.holdfast.check.rule;

import dev.holdfast.check.ClaimResult;
import dev.holdfast.check.Finding;
import dev.holdfast.check.FindingKind;
import dev.holdfast.check.Rule;
import dev.holdfast.check.StudyView;
import dev.holdfast.check.Verdict;
import dev.holdfast.check.Weight;
import java.util.ArrayList;
import java.util.List;

/**
 * {@code power-drift}, {@code total-drift}, {@code detectable-drift}, {@code joint-power-drift}: a
 * claimed figure and the one that the assumptions give have parted. Where more is claimed than they
 * give, it blocks; where clearly less, it is a note.
 */
final class Drift implements Rule {
  @Override
  public List<Finding> look(StudyView view) {
    List<Finding> found = new ArrayList<>();
    for (ClaimResult result : view.claims()) {
      if (result.verdict() == Verdict.SHORT) {
        found.add(
            new Finding(
                kind(result),
                kind(result).weight(),
                result.subject(),
                sentence(result) + Wording.fall(result),
                Wording.remedies(view, result),
                result.claim().figure().place()));
      } else if (result.verdict() == Verdict.UNDERSTATED) {
        String slack = result.explanation().isEmpty() ? "" : ": " + result.explanation();
        found.add(
            new Finding(
                kind(result),
                Weight.NOTES,
                result.subject(),
                sentence(result).replaceAll("\\.$", "") + slack + ".",
                List.of("claim " + Wording.computed(result) + ", or keep it as a margin"),
                result.claim().figure().place()));
      }
    }
    return found;
  }

  private static String sentence(ClaimResult result) {
    return Wording.owner(result)
        + " claims "
        + Wording.claimed(result)
        + "; its assumptions give "
        + Wording.computed(result)
        + " by "
        + result.method()
        + ".";
  }

  private static FindingKind kind(ClaimResult result) {
    return switch (result.claim().kind()) {
      case "power" -> FindingKind.POWER_DRIFT;
      case "detectable" -> FindingKind.DETECTABLE_DRIFT;
      case "every", "any", "expected" -> FindingKind.JOINT_POWER_DRIFT;
      default -> FindingKind.TOTAL_DRIFT;
    };
  }
}
