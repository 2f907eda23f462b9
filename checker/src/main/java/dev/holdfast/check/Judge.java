package dev.holdfast.check;

import dev.holdfast.plan.Claim;
import dev.holdfast.plan.Plan;

/** Judges the claims of analyses, each kind by its own judge. */
final class Judge {
  private final PowerJudge power;
  private final NumberJudge number;
  private final EnrolJudge enrol;

  Judge(Situations situations, Plan plan) {
    this.power = new PowerJudge(situations, plan);
    this.number = new NumberJudge(situations, plan);
    this.enrol = new EnrolJudge(plan);
  }

  Judgement judge(Situation situation, Claim claim) {
    try {
      return byKind(situation, claim);
    } catch (IllegalArgumentException e) {
      return Judgement.notComputed(claim.figure().decimals(), Situations.beyondDomain(e).what());
    }
  }

  private Judgement byKind(Situation situation, Claim claim) {
    return switch (claim.kind()) {
      case "power" -> power.judge(situation, claim);
      case "total", "sample" -> number.judge(situation, claim);
      case "events" ->
          situation.cell().isPresent() && !situation.countsEvents()
              ? Judgement.notComputed(0, "this design counts no events")
              : number.judge(situation, claim);
      case "enrol" -> enrol.judge(situation, claim);
      case "detectable" -> DetectableJudge.judge(situation, claim);
      default ->
          Judgement.notComputed(
              claim.figure().decimals(), "a claimed " + claim.kind() + " is not computed yet");
    };
  }
}
