package dev.holdfast.check;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.junit.jupiter.api.Test;

class FallTest {
  private static Fall fall(String from, String to) {
    PlanReport report = Plans.check(Plans.TWO_MEANS.replace(from, to), Plans.TWO_MEANS);
    return Plans.claim(report, "power").fall().orElseThrow();
  }

  @Test
  void aFallenClaimNamesTheQuantityThatMoved() {
    Fall fall = fall("value: 10,", "value: 11.5,");
    assertEquals("HEAD", fall.revision());
    assertEquals(0.8015, fall.before(), 5e-5);
    assertEquals(1, fall.moved().size());
    Fall.Move move = fall.moved().get(0);
    assertEquals("score-sd", move.name());
    assertEquals("10", move.from());
    assertEquals("11.5", move.to());
    assertEquals(8, move.place().line());
    assertEquals(0.8015, move.restores().getAsDouble(), 5e-5);
  }

  @Test
  void theQuantityThatCostMostComesFirst() {
    PlanReport report =
        Plans.check(
            Plans.TWO_MEANS.replace("value: 5,", "value: 4.9,").replace("value: 10,", "value: 13,"),
            Plans.TWO_MEANS);
    Fall fall = Plans.claim(report, "power").fall().orElseThrow();
    assertEquals("score-sd", fall.moved().get(0).name());
    assertEquals("gain", fall.moved().get(1).name());
  }

  @Test
  void aChangeOfSidesOrTestIsNamedToo() {
    Fall fall = fall("test: student-t", "test: welch-t\n    alpha: 0.01");
    assertTrue(fall.moved().stream().anyMatch(move -> move.name().equals("test")));
    assertTrue(fall.moved().stream().anyMatch(move -> move.name().equals("alpha")));
  }

  @Test
  void aRaisedClaimIsNamedAsWhatMoved() {
    Fall fall = fall("power: 0.80,", "power: 0.95,");
    assertEquals("the claim itself", fall.moved().get(0).name());
  }

  @Test
  void whatStandsHasNoFall() {
    PlanReport report =
        Plans.check(Plans.TWO_MEANS.replace("value: 10,", "value: 9.9,"), Plans.TWO_MEANS);
    assertTrue(report.claims().stream().allMatch(result -> result.fall().isEmpty()));
  }

  @Test
  void theFindingTellsTheFall() {
    PlanReport report =
        Plans.check(Plans.TWO_MEANS.replace("value: 10,", "value: 11.5,"), Plans.TWO_MEANS);
    String message = Plans.findings(report, FindingKind.POWER_DRIFT).get(0).message();
    assertTrue(
        message.contains("At HEAD it was 0.80; since then score-sd moved from 10 to 11.5 (line 8)"),
        message);
  }
}
