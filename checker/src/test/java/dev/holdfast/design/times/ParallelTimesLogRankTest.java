package dev.holdfast.design.times;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import dev.holdfast.design.Cell;
import dev.holdfast.design.Effect;
import dev.holdfast.design.Given;
import dev.holdfast.design.InputException;
import java.util.List;
import org.junit.jupiter.api.Test;

class ParallelTimesLogRankTest {
  private final Cell cell = new ParallelTimesLogRank();

  @Test
  void theHazardRatioIsTheRatioOfTheLogsOfSurvival() {
    Effect effect = cell.assume(groups().named("survival", "new", 0.7, "usual", 0.6).inputs());
    assertEquals(Math.log(0.7) / Math.log(0.6), effect.measures().get("hazard-ratio"), 1e-15);
    assertEquals(0.35, effect.eventShare().orElseThrow(), 1e-15);
  }

  @Test
  void survivalCountsBeforeAPrintedRatio() {
    Effect effect =
        cell.assume(
            groups()
                .named("survival", "new", 0.7, "usual", 0.6)
                .number("hazard-ratio", 0.7)
                .inputs());
    assertEquals(0.6982, effect.value().orElseThrow(), 5e-5);
  }

  @Test
  void theHazardRatioOfExponentialTimesIsThatOfTheMediansUpsideDown() {
    Effect effect = cell.assume(groups().named("medians", "new", 12, "usual", 9).inputs());
    assertEquals(0.75, effect.value().orElseThrow(), 1e-15);
    assertTrue(effect.eventShare().isEmpty());
  }

  @Test
  void theChanceOfAnEventIsTheMeanOverTheGroups() {
    Effect effect =
        cell.assume(
            groups()
                .weights(200.0, 100.0)
                .number("hazard-ratio", 0.7)
                .named("event-shares", "new", 0.3, "usual", 0.45)
                .inputs());
    assertEquals(0.35, effect.eventShare().orElseThrow(), 1e-15);
    assertEquals(0.35, effect.measures().get("event-share"), 1e-15);
  }

  @Test
  void aStatedChanceOfAnEventIsUsedAsItIs() {
    Effect effect =
        cell.assume(groups().number("hazard-ratio", 0.7).number("event-share", 0.4).inputs());
    assertEquals(0.4, effect.eventShare().orElseThrow(), 0);
  }

  @Test
  void theSearchForADetectableRatioKeepsItsDirection() {
    assertEquals(0, cell.assume(groups().number("hazard-ratio", 0.7).inputs()).metric().far(), 0);
    assertEquals(
        Double.POSITIVE_INFINITY,
        cell.assume(groups().number("hazard-ratio", 1.4).inputs()).metric().far(),
        0);
  }

  @Test
  void whatCannotBeIsRefused() {
    refused("hazard-ratio", groups().number("hazard-ratio", 0));
    refused("survival", groups().named("survival", "new", 0.7, "usual", 1));
    refused("survival", groups().named("survival", "new", 70, "usual", 60));
    refused("medians", groups().named("medians", "new", 12, "usual", -1));
    refused("event-shares", groups().named("event-shares", "new", 0.3, "usual", 45));
    refused("survival", groups().named("survival", "new", 0.7, "other", 0.6));
    refused("hazard-ratio", groups().groups("a", "b", "c").number("hazard-ratio", 0.7));
  }

  private static Given groups() {
    return new Given().groups("new", "usual");
  }

  private void refused(String key, Given given) {
    InputException problem = assertThrows(InputException.class, () -> cell.assume(given.inputs()));
    assertFalse(problem.isMissing());
    assertEquals(List.of(key), problem.inputs());
  }
}
