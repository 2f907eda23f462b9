package dev.holdfast.check.rule;

import dev.holdfast.check.Finding;
import dev.holdfast.check.FindingKind;
import dev.holdfast.check.Rule;
import dev.holdfast.check.Situation;
import dev.holdfast.check.StudyView;
import dev.holdfast.plan.Claim;
import dev.holdfast.plan.Figure;
import dev.holdfast.plan.Recruitment;
import java.util.ArrayList;
import java.util.List;
import java.util.Set;

/** {@code not-whole}: a number of participants, pairs or events that is not a whole number. */
final class NotWhole implements Rule {
  private static final Set<String> COUNTS =
      Set.of("sample", "total", "enrol", "events", "clusters");

  @Override
  public List<Finding> look(StudyView view) {
    List<Finding> found = new ArrayList<>();
    for (Situation situation : view.situations()) {
      situation
          .situation()
          .sample()
          .forEach(
              (group, figure) ->
                  look(situation.subject(), "the sample of '" + group + "'", figure, found));
      situation
          .situation()
          .events()
          .ifPresent(figure -> look(situation.subject(), "the number of events", figure, found));
      for (Claim claim : situation.situation().claims()) {
        if (COUNTS.contains(claim.kind())) {
          look(situation.subject(), "the claimed " + claim.kind(), claim.figure(), found);
        }
      }
    }
    view.plan()
        .recruitment()
        .flatMap(Recruitment::enrol)
        .ifPresent(figure -> look("recruitment", "the number enrolled", figure, found));
    return found;
  }

  private static void look(String subject, String what, Figure figure, List<Finding> found) {
    if (figure.value() != Math.rint(figure.value()) || figure.value() < 0) {
      found.add(
          Finding.of(
              FindingKind.NOT_WHOLE,
              subject,
              figure.place(),
              Character.toUpperCase(what.charAt(0))
                  + what.substring(1)
                  + " is "
                  + figure.written()
                  + ", which is no whole number.",
              "round it up"));
    }
  }
}
