package dev.holdfast.check;

import dev.holdfast.design.Method;
import dev.holdfast.design.catalogue.Catalogue;
import dev.holdfast.plan.Claim;
import dev.holdfast.plan.Family;
import dev.holdfast.plan.Plan;
import dev.holdfast.plan.PlanProblem;
import dev.holdfast.plan.PlanReading;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.OptionalInt;

/** Checks plans. Immutable; one instance serves any number of threads. */
public final class Checker {
  private final Situations situations;
  private final List<Rule> rules;
  private final boolean headroomOfAll;

  /**
   * A checker.
   *
   * @param catalogue the designs it knows
   * @param rules the rules it applies
   * @param headroomOfAll whether headroom is worked out for claims that stand too; it takes much
   *     longer than all the rest
   */
  public Checker(Catalogue catalogue, List<Rule> rules, boolean headroomOfAll) {
    this.situations = new Situations(catalogue);
    this.rules = List.copyOf(rules);
    this.headroomOfAll = headroomOfAll;
  }

  /** Checks one plan as it was read. */
  public PlanReport check(PlanReading reading) {
    return check(reading, Optional.empty(), "");
  }

  /**
   * Checks one plan and says of each claim that no longer stands what moved since another reading
   * of it.
   *
   * @param reading the plan now
   * @param before the plan at the earlier revision; if that was invalid, nothing is compared
   * @param revision name of that revision, as it is reported
   */
  public PlanReport check(PlanReading reading, PlanReading before, String revision) {
    return check(reading, before.plan(), revision);
  }

  private PlanReport check(PlanReading reading, Optional<Plan> before, String revision) {
    if (reading.plan().isEmpty()) {
      return invalid(reading);
    }
    Plan plan = reading.plan().get();
    List<Situation> all = situations.of(plan, Overrides.NONE);
    Judge judge = new Judge(situations, plan);
    Optional<Comparison> comparison =
        before.map(earlier -> comparison(plan, earlier, revision, judge));
    Headrooms headrooms = new Headrooms(situations, plan);
    List<ClaimResult> results = new ArrayList<>();
    for (Situation situation : all) {
      for (Claim claim : situation.situation().claims()) {
        ClaimResult result = result(situation, claim, judge.judge(situation, claim));
        boolean wanted =
            headroomOfAll || result.verdict() == Verdict.SHORT || result.verdict() == Verdict.UNMET;
        List<Headroom> room =
            wanted && result.computed().isPresent() ? headrooms.of(situation, claim) : List.of();
        Optional<Fall> fall = comparison.flatMap(each -> each.fall(result, situation));
        results.add(with(result, room, fall));
      }
    }
    results.addAll(joint(plan, all));
    results.sort(Comparator.comparing(result -> result.claim().figure().place()));
    StudyView view = new StudyView(reading, plan, all, results);
    List<Finding> findings = new ArrayList<>();
    for (Rule rule : rules) {
      findings.addAll(rule.look(view));
    }
    findings.sort(
        Comparator.comparing(Finding::place)
            .thenComparing(Finding::kind)
            .thenComparing(Finding::subject)
            .thenComparing(Finding::message));
    String name = plan.study().id().orElse(plan.study().title());
    return new PlanReport(
        reading.path(), Optional.of(name), standing(results, findings), results, findings);
  }

  private Comparison comparison(Plan plan, Plan earlier, String revision, Judge judge) {
    List<Situation> then = situations.of(earlier, Overrides.NONE);
    Judge thenJudge = new Judge(situations, earlier);
    List<ClaimResult> resultsThen = new ArrayList<>();
    for (Situation situation : then) {
      for (Claim claim : situation.situation().claims()) {
        resultsThen.add(result(situation, claim, thenJudge.judge(situation, claim)));
      }
    }
    return new Comparison(plan, earlier, revision, resultsThen, then, situations, judge);
  }

  private static PlanReport invalid(PlanReading reading) {
    List<Finding> findings = new ArrayList<>();
    for (PlanProblem problem : reading.problems()) {
      findings.add(
          problem.remedy().isEmpty()
              ? Finding.of(FindingKind.PLAN_INVALID, "", problem.place(), problem.message())
              : Finding.of(
                  FindingKind.PLAN_INVALID,
                  "",
                  problem.place(),
                  problem.message(),
                  problem.remedy()));
    }
    return new PlanReport(
        reading.path(), Optional.empty(), PlanReport.Standing.INVALID, List.of(), findings);
  }

  private static ClaimResult result(Situation situation, Claim claim, Judgement judgement) {
    OptionalDouble best = OptionalDouble.empty();
    String bestMethod = "";
    if (claim.kind().equals("power") && judgement.computed().isPresent()) {
      best = situation.bestPower();
      Method method = situation.cell().orElseThrow().best();
      bestMethod = best.isPresent() ? method.title() : "";
    }
    return new ClaimResult(
        situation.subject(),
        situation.number(),
        claim,
        judgement.verdict(),
        judgement.computed(),
        judgement.method(),
        best,
        bestMethod,
        judgement.decimals(),
        judgement.explanation(),
        List.of(),
        Optional.empty());
  }

  private static ClaimResult with(ClaimResult result, List<Headroom> room, Optional<Fall> fall) {
    return new ClaimResult(
        result.subject(),
        result.caseNumber(),
        result.claim(),
        result.verdict(),
        result.computed(),
        result.method(),
        result.best(),
        result.bestMethod(),
        result.decimals(),
        result.explanation(),
        room,
        fall);
  }

  private static List<ClaimResult> joint(Plan plan, List<Situation> all) {
    List<ClaimResult> results = new ArrayList<>();
    for (Family family : plan.families().values()) {
      for (Claim claim : family.claims()) {
        Judgement judgement = JointJudge.judge(family, claim, all);
        results.add(
            new ClaimResult(
                "families." + family.name(),
                OptionalInt.empty(),
                claim,
                judgement.verdict(),
                judgement.computed(),
                judgement.method(),
                OptionalDouble.empty(),
                "",
                judgement.decimals(),
                judgement.explanation(),
                List.of(),
                Optional.empty()));
      }
    }
    return results;
  }

  private static PlanReport.Standing standing(List<ClaimResult> results, List<Finding> findings) {
    if (has(results, Verdict.SHORT)) {
      return PlanReport.Standing.SHORT;
    }
    if (has(results, Verdict.UNMET)) {
      return PlanReport.Standing.UNMET;
    }
    if (findings.stream().anyMatch(finding -> finding.weight() == Weight.BLOCKS)) {
      return PlanReport.Standing.BLOCKED;
    }
    if (results.isEmpty() || has(results, Verdict.NOT_COMPUTED)) {
      return PlanReport.Standing.NOT_COMPUTED;
    }
    if (has(results, Verdict.CONDITIONAL)) {
      return PlanReport.Standing.CONDITIONAL;
    }
    return PlanReport.Standing.HOLDS;
  }

  private static boolean has(List<ClaimResult> results, Verdict verdict) {
    return results.stream().anyMatch(result -> result.verdict() == verdict);
  }
}
