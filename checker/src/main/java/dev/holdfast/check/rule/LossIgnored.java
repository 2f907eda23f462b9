package dev.holdfast.check.rule;

import dev.holdfast.check.Finding;
import dev.holdfast.check.FindingKind;
import dev.holdfast.check.Losses;
import dev.holdfast.check.Rule;
import dev.holdfast.check.StudyView;
import dev.holdfast.plan.Place;
import dev.holdfast.plan.Recruitment;
import java.util.List;
import java.util.Set;

/**
 * {@code loss-ignored}: the study follows people or animals and plans for none of them to be lost,
 * without saying why.
 */
final class LossIgnored implements Rule {
  private static final Set<String> MAY_LEAVE = Set.of("humans", "animals");

  @Override
  public List<Finding> look(StudyView view) {
    boolean living = MAY_LEAVE.contains(view.plan().study().participants());
    boolean planned =
        view.plan().analyses().values().stream()
            .allMatch(analysis -> Losses.of(view.plan(), analysis).isPresent());
    boolean explained = view.plan().recruitment().flatMap(Recruitment::noLossReason).isPresent();
    if (!living || planned || explained || view.plan().analyses().isEmpty()) {
      return List.of();
    }
    Place place =
        view.plan().recruitment().map(Recruitment::place).orElse(view.plan().study().place());
    return List.of(
        Finding.of(
            FindingKind.LOSS_IGNORED,
            "recruitment",
            place,
            "The plan says nothing of participants lost before the analysis.",
            "give recruitment.loss, with a source",
            "give recruitment.no-loss-reason, where nobody can be lost"));
  }
}
