package dev.holdfast.check.rule;

import dev.holdfast.check.Finding;
import dev.holdfast.check.FindingKind;
import dev.holdfast.check.Numbers;
import dev.holdfast.check.Rule;
import dev.holdfast.check.Situation;
import dev.holdfast.check.StudyView;
import dev.holdfast.plan.Figure;
import dev.holdfast.plan.Input;
import java.util.ArrayList;
import java.util.List;

/**
 * {@code effect-inconsistent}: an effect stated in two measures, such as d beside a difference and
 * its SD, that disagree by more than the written digits explain; or an input that cannot be.
 */
final class EffectInconsistent implements Rule {
  @Override
  public List<Finding> look(StudyView view) {
    List<Finding> found = new ArrayList<>();
    for (Situation situation : view.situations()) {
      situation
          .inputProblem()
          .ifPresent(
              problem -> {
                Input input = situation.situation().effect().get(problem.key());
                found.add(
                    Finding.of(
                        FindingKind.EFFECT_INCONSISTENT,
                        situation.subject(),
                        input == null ? situation.situation().effectPlace() : input.place(),
                        "In " + situation.analysis().name() + ", " + problem.message() + ".",
                        "correct it under effect"));
              });
      situation
          .effect()
          .ifPresent(
              effect ->
                  effect
                      .measures()
                      .forEach(
                          (measure, value) -> {
                            if (situation.situation().effect().get(measure)
                                instanceof Input.One one) {
                              compare(situation, measure, one.figure(), value, found);
                            }
                          }));
    }
    return found;
  }

  private static void compare(
      Situation situation, String measure, Figure stated, double derived, List<Finding> found) {
    // A last digit and a half: the inputs of the derivation were rounded too.
    double allowed = 1.5 * StrictMath.pow(10, -stated.decimals());
    double relative = 0.005 * Math.abs(derived);
    double apart = Math.abs(Math.abs(stated.value()) - Math.abs(derived));
    if (apart > Math.max(allowed, relative)) {
      found.add(
          Finding.of(
              FindingKind.EFFECT_INCONSISTENT,
              situation.subject(),
              stated.place(),
              situation.analysis().name()
                  + " states "
                  + measure
                  + " "
                  + stated.written()
                  + "; its other inputs give "
                  + Numbers.brief(derived)
                  + ".",
              "leave out one of the two",
              "correct the one that is wrong"));
    }
  }
}
