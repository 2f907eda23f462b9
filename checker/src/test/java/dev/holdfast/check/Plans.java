package dev.holdfast.check;

import dev.holdfast.check.rule.Rules;
import dev.holdfast.design.catalogue.Catalogue;
import dev.holdfast.plan.PlanReader;
import dev.holdfast.plan.PlanReading;
import dev.holdfast.plan.Schemas;
import java.nio.charset.StandardCharsets;
import java.util.List;

/** Plans written in tests, and what a check makes of them. */
public final class Plans {
  private static final PlanReader READER = new PlanReader(new Schemas());

  private Plans() {}

  /** Two groups, difference 5, SD 10, one primary outcome; everything holds at 64 a group. */
  public static final String TWO_MEANS =
      """
      format: holdfast-plan/1
      study: { title: Reading aloud, justification: power, participants: humans }
      defaults: { alpha: 0.05, sides: two, target-power: 0.80 }
      quantities:
        gain:
          { value: 5, unit: points, source: { kind: smallest-worthwhile, reason: agreed } }
        score-sd:
          { value: 10, unit: points, source: { kind: own-records, reason: last year } }
        loss: { value: 0.10, source: { kind: own-records, reason: last year } }
      outcomes:
        score: { role: primary, scale: continuous, unit: points }
      analyses:
        main:
          outcome: score
          arrangement: parallel-groups
          test: student-t
          effect: { difference: gain, sd: score-sd }
          sample: { aloud: 64, silent: 64 }
          claims: { power: 0.80, total: 128 }
      recruitment: { enrol: 143, loss: loss }
      """;

  public static PlanReading read(String yaml) {
    return READER.read("study-plan.yaml", yaml.getBytes(StandardCharsets.UTF_8));
  }

  public static PlanReport check(String yaml) {
    return checker(false).check(read(yaml));
  }

  public static PlanReport check(String yaml, String before) {
    return checker(false).check(read(yaml), read(before), "HEAD");
  }

  public static Checker checker(boolean headroomOfAll) {
    return new Checker(Catalogue.standard(), Rules.standard(), headroomOfAll);
  }

  /** The plan above with one analysis of its own: everything below {@code main}, unindented. */
  public static String analysis(String scale, String analysis) {
    return """
    format: holdfast-plan/1
    study: { title: A study, justification: power, participants: samples }
    defaults: { alpha: 0.05, sides: two }
    outcomes:
      outcome: { role: primary, scale: %s }
    analyses:
      main:
        outcome: outcome
    %s"""
        .formatted(scale, analysis.indent(4));
  }

  /** The findings of a kind. */
  public static List<Finding> findings(PlanReport report, FindingKind kind) {
    return report.findings().stream().filter(finding -> finding.kind() == kind).toList();
  }

  /** The one claim of a kind. */
  public static ClaimResult claim(PlanReport report, String kind) {
    List<ClaimResult> found =
        report.claims().stream().filter(result -> result.claim().kind().equals(kind)).toList();
    if (found.size() != 1) {
      throw new AssertionError(
          found.size() + " claims of kind " + kind + "; findings: " + report.findings());
    }
    return found.get(0);
  }
}
