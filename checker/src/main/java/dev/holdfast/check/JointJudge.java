package dev.holdfast.check;

import dev.holdfast.family.ErrorControl;
import dev.holdfast.family.JointPower;
import dev.holdfast.plan.Claim;
import dev.holdfast.plan.Family;
import dev.holdfast.plan.Word;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.stream.Collectors;

/** Judges what a family claims of its analyses together. */
final class JointJudge {
  private JointJudge() {}

  static Judgement judge(Family family, Claim claim, List<Situation> situations) {
    int decimals = Math.max(2, claim.figure().decimals());
    Map<String, List<Situation>> byName =
        situations.stream().collect(Collectors.groupingBy(each -> each.analysis().name()));
    List<String> reasons = new ArrayList<>();
    List<Double> powers = new ArrayList<>();
    for (Word name : family.of()) {
      List<Situation> its = byName.getOrDefault(name.text(), List.of());
      if (its.size() != 1) {
        reasons.add("the analysis '" + name + "' has several cases");
      } else {
        Optional<String> missing = NotComputed.power(its.get(0));
        missing.ifPresent(reason -> reasons.add("for '" + name + "' " + reason));
        if (missing.isEmpty()) {
          powers.add(its.get(0).power());
        }
      }
    }
    boolean sequence = family.control().text().equals(ErrorControl.FIXED_SEQUENCE.word());
    boolean needsIndependence = !claim.kind().equals("expected") || sequence;
    if (needsIndependence && !family.independent()) {
      reasons.add(
          "the joint chance of correlated tests is not computed yet, and the plan does not state"
              + " that the tests are independent");
    }
    if (!reasons.isEmpty()) {
      return Judgement.notComputed(decimals, String.join("; ", reasons));
    }
    double[] each = powers.stream().mapToDouble(Double::doubleValue).toArray();
    double computed =
        switch (claim.kind()) {
          case "every" -> JointPower.every(each);
          case "any" -> sequence ? each[0] : JointPower.any(each);
          default -> sequence ? JointPower.expectedInSequence(each) : JointPower.expected(each);
        };
    double rounded = Numbers.round(computed, claim.figure().decimals());
    double claimed = claim.figure().value();
    Verdict verdict =
        switch (claim.relation()) {
          case IS ->
              rounded == claimed
                  ? Verdict.HOLDS
                  : rounded > claimed ? Verdict.UNDERSTATED : Verdict.SHORT;
          case AT_LEAST -> rounded >= claimed ? Verdict.HOLDS : Verdict.SHORT;
          case ABOUT ->
              Math.abs(computed - claimed) <= 0.01
                  ? Verdict.HOLDS
                  : computed > claimed ? Verdict.UNDERSTATED : Verdict.SHORT;
        };
    String method =
        sequence
            ? "multiplication along the sequence, the tests independent"
            : claim.kind().equals("expected")
                ? "the sum of the powers"
                : "multiplication, the tests independent";
    return new Judgement(verdict, OptionalDouble.of(computed), method, decimals, "");
  }
}
