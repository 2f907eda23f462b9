package dev.holdfast.check;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Verdicts on single claims; the figures of the two-group t test are those of Cohen (1988). */
class VerdictTest {
  private static String compared(String d, int n, String settings, String claims) {
    return Plans.analysis(
        "continuous",
        """
        arrangement: parallel-groups
        test: student-t
        %s
        effect: { d: %s }
        sample: { first: %d, second: %d }
        claims: { %s }
        """
            .formatted(settings, d, n, n, claims));
  }

  private static Verdict verdict(String yaml, String claim) {
    return Plans.claim(Plans.check(yaml), claim).verdict();
  }

  @ParameterizedTest
  // 64 a group at d = 0.5 have a power of 0.8015 (Cohen 1988, Table 2.3.5: 0.80 at 64).
  @CsvSource({
    "0.5, 64, power: 0.80, HOLDS",
    "0.5, 64, power: 0.8015, HOLDS",
    "0.5, 64, power: 0.81, CONDITIONAL",
    "0.5, 64, power: 0.90, SHORT",
    "0.5, 80, power: 0.80, UNDERSTATED",
    "0.5, 80, power: { at-least: 0.80 }, HOLDS",
    "0.5, 64, power: { at-least: 0.81 }, CONDITIONAL",
    "0.5, 64, power: { about: 0.80 }, HOLDS",
    "0.5, 64, power: { about: 0.9 }, SHORT",
  })
  void aClaimedPowerIsComparedAtItsWrittenDecimals(
      String d, int n, String claim, Verdict expected) {
    assertEquals(expected, verdict(compared(d, n, "", claim), "power"));
  }

  @Test
  void aPowerAboveTheClaimHoldsWhereTheSampleIsTheLeastThatReachesIt() {
    // 17 a group is the least for 0.80 at d = 1; its power is 0.8070.
    assertEquals(Verdict.HOLDS, verdict(compared("1.0", 17, "", "power: 0.80"), "power"));
  }

  @Test
  void aPowerThatFollowsButLiesUnderTheTargetIsUnmet() {
    PlanReport report = Plans.check(compared("0.5", 64, "target-power: 0.90", "power: 0.80"));
    assertEquals(Verdict.UNMET, Plans.claim(report, "power").verdict());
    assertEquals(1, Plans.findings(report, FindingKind.UNDER_TARGET).size());
    assertEquals(PlanReport.Standing.UNMET, report.standing());
  }

  @ParameterizedTest
  @CsvSource({
    "128, HOLDS", // 64 a group
    "130, HOLDS", // one more a group counts as rounding
    "126, CONDITIONAL", // 63 a group by the normal approximation
    "150, UNDERSTATED",
    "110, SHORT",
  })
  void aClaimedTotalIsTheLeastThatReachesTheTarget(int total, Verdict expected) {
    String yaml = compared("0.50", total / 2, "target-power: 0.80", "total: " + total);
    assertEquals(expected, verdict(yaml, "total"));
  }

  @Test
  void aStatedConventionIsUsedAlone() {
    String settings = "target-power: 0.80\nconventions: { reference: normal }";
    assertEquals(Verdict.HOLDS, verdict(compared("0.50", 63, settings, "total: 126"), "total"));
    String student = "target-power: 0.80\nconventions: { reference: student-t }";
    assertEquals(Verdict.SHORT, verdict(compared("0.50", 63, student, "total: 126"), "total"));
  }

  @Test
  void aConditionalVerdictNamesTheConventionThatFits() {
    PlanReport report = Plans.check(compared("0.50", 63, "target-power: 0.80", "total: 126"));
    assertTrue(
        Plans.claim(report, "total").explanation().contains("reference: normal"),
        Plans.claim(report, "total").explanation());
    assertEquals(1, Plans.findings(report, FindingKind.CONVENTION_UNSTATED).size());
  }

  @Test
  void aPlanWithAConditionalClaimDoesNotHold() {
    PlanReport report =
        Plans.check(
            Plans.TWO_MEANS
                .replace("aloud: 64, silent: 64", "aloud: 63, silent: 63")
                .replace("power: 0.80, total: 128", "total: 126"));
    assertEquals(PlanReport.Standing.CONDITIONAL, report.standing(), report.findings().toString());
  }

  @Test
  void anEffectPrintedWithOneDigitMayStandForWhatItWasRoundedFrom() {
    // 0.6 gives 45 a group; 42 needs 0.62.
    PlanReport report = Plans.check(compared("0.6", 42, "target-power: 0.80", "total: 84"));
    ClaimResult total = Plans.claim(report, "total");
    assertEquals(Verdict.CONDITIONAL, total.verdict());
    assertTrue(total.explanation().contains("printed digits"), total.explanation());
  }

  @ParameterizedTest
  // By the noncentral t distribution 64 a group detect 0.4990 with a power of 0.80.
  @CsvSource({"0.50, HOLDS", "0.499, HOLDS", "0.45, SHORT", "0.60, UNDERSTATED"})
  void aClaimedDetectableEffectIsTheSmallestAtTheSample(String claimed, Verdict expected) {
    String yaml =
        Plans.analysis(
            "continuous",
            """
            arrangement: parallel-groups
            test: student-t
            target-power: 0.80
            sample: { first: 64, second: 64 }
            claims: { detectable: %s }
            """
                .formatted(claimed));
    assertEquals(expected, verdict(yaml, "detectable"));
  }

  @ParameterizedTest
  // 100 analysed, 20 % lost: 125 by division, 120 by multiplication (both common practice).
  @CsvSource({"125, HOLDS", "126, HOLDS", "120, CONDITIONAL", "110, SHORT", "150, UNDERSTATED"})
  void anEnrolmentIsTheSampleDividedByWhatRemains(int enrol, Verdict expected) {
    String yaml = compared("0.57", 50, "loss: 0.20", "enrol: " + enrol);
    assertEquals(expected, verdict(yaml, "enrol"));
  }

  @Test
  void anEnrolmentByStatedMultiplicationHolds() {
    String settings = "loss: 0.20\nconventions: { loss-by: multiplication }";
    assertEquals(Verdict.HOLDS, verdict(compared("0.57", 50, settings, "enrol: 120"), "enrol"));
  }

  @ParameterizedTest
  @CsvSource(
      delimiter = '|',
      value = {
        "sides: two | alpha",
        "alpha: 0.05 | sides",
      })
  void alphaAndSidesAreNeverGuessed(String given, String missing) {
    String yaml =
        compared("0.5", 64, given, "power: 0.80")
            .replace("defaults: { alpha: 0.05, sides: two }\n", "");
    ClaimResult power = Plans.claim(Plans.check(yaml), "power");
    assertEquals(Verdict.NOT_COMPUTED, power.verdict());
    assertTrue(
        power.explanation().contains(missing.equals("alpha") ? "alpha" : "one side or two"),
        power.explanation());
  }

  @Test
  void aMissingSpreadIsNamed() {
    String yaml =
        Plans.analysis(
            "continuous",
            """
            arrangement: parallel-groups
            test: student-t
            effect: { difference: 5 }
            sample: { first: 64, second: 64 }
            claims: { power: 0.80 }
            """);
    PlanReport report = Plans.check(yaml);
    assertTrue(Plans.claim(report, "power").explanation().contains("the SD (sd, or sds by group)"));
    assertEquals(PlanReport.Standing.NOT_COMPUTED, notBlocked(report));
  }

  /** The standing but for sources, which the short plans of this test leave out. */
  private static PlanReport.Standing notBlocked(PlanReport report) {
    boolean onlySources =
        report.findings().stream()
            .filter(finding -> finding.weight() == Weight.BLOCKS)
            .allMatch(finding -> finding.kind() == FindingKind.SOURCE_MISSING);
    assertTrue(onlySources, report.findings().toString());
    return report.claims().stream().anyMatch(each -> each.verdict() == Verdict.NOT_COMPUTED)
        ? PlanReport.Standing.NOT_COMPUTED
        : report.standing();
  }

  @Test
  void aSectionThatIsNotComputedYetLeavesTheClaimUncomputed() {
    PlanReport report =
        Plans.check(
            Plans.TWO_MEANS.replace(
                "    sample:", "    clusters: { icc: 0.05, size: 8 }\n    sample:"));
    ClaimResult power = Plans.claim(report, "power");
    assertEquals(Verdict.NOT_COMPUTED, power.verdict());
    assertTrue(power.explanation().contains("clusters"), power.explanation());
    assertEquals(PlanReport.Standing.NOT_COMPUTED, report.standing());
  }

  @Test
  void absurdFiguresAreNotComputedRatherThanAFault() {
    ClaimResult power = Plans.claim(Plans.check(compared("1e12", 64, "", "power: 0.80")), "power");
    assertEquals(Verdict.NOT_COMPUTED, power.verdict());
    assertTrue(power.explanation().contains("noncentrality"), power.explanation());
  }

  @Test
  void eachCaseOfAGridIsJudgedByItself() {
    // Cohen (1988), Table 2.4.1: 64 a group at 0.5, 26 at 0.8.
    String yaml =
        Plans.analysis(
            "continuous",
            """
            arrangement: parallel-groups
            test: student-t
            target-power: 0.80
            cases:
              - { effect: { d: 0.5 }, sample: { a: 64, b: 64 }, claims: { total: 128 } }
              - { effect: { d: 0.8 }, sample: { a: 20, b: 20 }, claims: { total: 40 } }
            """);
    PlanReport report = Plans.check(yaml);
    assertEquals(Verdict.HOLDS, report.claims().get(0).verdict());
    assertEquals(Verdict.SHORT, report.claims().get(1).verdict());
    assertEquals(2, report.claims().get(1).caseNumber().getAsInt());
  }

  @Test
  void theExactFigureStandsBesideTheStatedMethods() {
    String yaml =
        Plans.analysis(
            "binary",
            """
            arrangement: parallel-groups
            test: pearson-chi-square
            effect: { shares: { a: 0.45, b: 0.30 } }
            sample: { a: 163, b: 163 }
            claims: { power: 0.80 }
            """);
    ClaimResult power = Plans.claim(Plans.check(yaml), "power");
    assertTrue(power.best().isPresent());
    assertEquals(power.computed().getAsDouble(), power.best().getAsDouble(), 0.01);
    assertFalse(power.bestMethod().isEmpty());
  }

  @Test
  void aPlanWithEverythingInPlaceHolds() {
    PlanReport report = Plans.check(Plans.TWO_MEANS);
    assertEquals(PlanReport.Standing.HOLDS, report.standing(), report.findings().toString());
    assertTrue(report.findings().isEmpty(), report.findings().toString());
  }
}
