package dev.holdfast.check;

import dev.holdfast.design.DetectableEffect;
import dev.holdfast.design.Effect;
import dev.holdfast.plan.Claim;
import java.util.Optional;
import java.util.OptionalDouble;

/** Judges a claimed smallest detectable effect. */
final class DetectableJudge {
  private DetectableJudge() {}

  static Judgement judge(Situation situation, Claim claim) {
    int decimals = claim.figure().decimals();
    Optional<String> missing = NotComputed.detectable(situation);
    if (missing.isPresent()) {
      return Judgement.notComputed(decimals, missing.get());
    }
    Optional<Effect> measured = measured(situation, claim);
    if (measured.isEmpty()) {
      return Judgement.notComputed(
          decimals,
          "the effect of this design cannot be stated as " + claim.metric().orElseThrow().text());
    }
    Effect effect = measured.get();
    Candidate plain = situation.plain();
    OptionalDouble found = find(situation, effect, plain);
    if (found.isEmpty()) {
      return Judgement.notComputed(
          decimals, "no effect in its range is detected with the power aimed at");
    }
    double none = effect.metric().none();
    double claimed = claim.figure().value();
    double computed = found.getAsDouble();
    Verdict verdict;
    String explanation = "";
    double excess =
        Numbers.round(away(claimed, none), decimals)
            - Numbers.round(away(computed, none), decimals);
    boolean fits =
        switch (claim.relation()) {
          case IS -> excess == 0;
          case AT_LEAST -> excess >= 0;
          case ABOUT -> Math.abs(excess) <= 0.025 * away(claimed, none);
        };
    if (fits) {
      verdict = Verdict.HOLDS;
    } else {
      Optional<String> other = otherWay(situation, effect, claim);
      if (other.isPresent()) {
        verdict = Verdict.CONDITIONAL;
        explanation = other.get();
      } else if (excess > 0) {
        verdict = Verdict.UNDERSTATED;
        explanation = "the sample detects a smaller effect";
      } else {
        verdict = Verdict.SHORT;
      }
    }
    return new Judgement(
        verdict, found, plain.title(), decimals + (excess == 0 && !fits ? 2 : 0), explanation);
  }

  static boolean stands(Situation situation, Claim claim) {
    if (NotComputed.detectable(situation).isPresent()) {
      return false;
    }
    Optional<Effect> effect = measured(situation, claim);
    OptionalDouble found =
        effect.isPresent()
            ? find(situation, effect.get(), situation.plain())
            : OptionalDouble.empty();
    double none = effect.map(each -> each.metric().none()).orElse(0.0);
    return found.isPresent()
        && away(claim.figure().value(), none)
            >= Numbers.round(away(found.getAsDouble(), none), claim.figure().decimals());
  }

  /** The effect in the measure in which the claim is stated. */
  private static Optional<Effect> measured(Situation situation, Claim claim) {
    Effect effect = situation.effect().orElseThrow();
    return claim.metric().isEmpty() ? Optional.of(effect) : effect.in(claim.metric().get().text());
  }

  private static OptionalDouble find(Situation situation, Effect effect, Candidate way) {
    double target = TargetFinder.find(situation).getAsDouble();
    return DetectableEffect.find(
        effect,
        way.method(),
        situation.sizes().orElseThrow(),
        way.level(situation.level().orElseThrow()),
        situation.effectiveTarget(way, target));
  }

  private static Optional<String> otherWay(Situation situation, Effect effect, Claim claim) {
    for (Candidate way : situation.candidates()) {
      if (way.unstated().isEmpty()
          || !situation.reachable(way.method(), situation.sizes().orElseThrow())) {
        continue;
      }
      OptionalDouble found = find(situation, effect, way);
      if (found.isPresent()
          && Numbers.round(found.getAsDouble(), claim.figure().decimals())
              == claim.figure().value()) {
        return Optional.of(
            "it follows by "
                + way.title()
                + " ("
                + way.unstated()
                + "), which the plan does not state");
      }
    }
    return Optional.empty();
  }

  /** Distance from no effect, whatever the sign in which the plan writes it. */
  private static double away(double value, double none) {
    return none == 0 ? Math.abs(value) : Math.abs(value - none);
  }
}
