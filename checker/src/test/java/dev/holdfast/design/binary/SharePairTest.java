package dev.holdfast.design.binary;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import dev.holdfast.design.Given;
import dev.holdfast.design.InputException;
import java.util.List;
import java.util.Set;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class SharePairTest {
  @Test
  void sharesFollowTheOrderOfTheGroups() {
    SharePair pair =
        SharePair.of(
            new Given().named("shares", "usual", 0.2, "new", 0.35).groups("new", "usual").inputs());
    assertEquals(0.35, pair.first(), 1e-15);
    assertEquals(0.2, pair.base(), 1e-15);
    assertFalse(pair.falls());
  }

  @ParameterizedTest(name = "{0} {1}")
  @CsvSource({
    "difference, 0.12, 0.32",
    "difference, -0.12, 0.08",
    "ratio, 1.5, 0.3",
    "ratio, 0.5, 0.1",
    "odds-ratio, 2, 0.3333333333333333",
    "odds-ratio, 0.25, 0.058823529411764705"
  })
  void anEffectIsRelativeToTheBase(String key, double value, double first) {
    SharePair pair =
        SharePair.of(new Given().number("base-share", 0.2).number(key, value).inputs());
    assertEquals(first, pair.first(), 1e-15);
    assertEquals(first < 0.2, pair.falls());
    assertEquals(value, pair.measures().get(key), 1e-12);
  }

  @Test
  void hFromABaseLeadsBackToTheShare() {
    double h = 2 * Math.asin(Math.sqrt(0.35)) - 2 * Math.asin(Math.sqrt(0.2));
    Given given = new Given().number("base-share", 0.2).number("h", h);
    assertEquals(0.35, SharePair.of(given.inputs()).first(), 1e-14);
    double lower = 2 * Math.asin(Math.sqrt(0.2)) - 2 * Math.asin(Math.sqrt(0.1));
    given = new Given().number("base-share", 0.2).number("h", lower).word("direction", "decrease");
    assertEquals(0.1, SharePair.of(given.inputs()).first(), 1e-14);
  }

  @Test
  void aDecreaseTurnsADifferenceDown() {
    Given given = new Given().number("base-share", 0.4).number("difference", 0.1);
    assertEquals(0.3, SharePair.of(given.word("direction", "decrease").inputs()).first(), 1e-15);
  }

  @Test
  void aBaseAloneGivesTheDirectionOfADetectableEffect() {
    Given given = new Given().number("base-share", 0.4).word("direction", "decrease");
    SharePair pair = SharePair.of(given.inputs());
    assertTrue(pair.value().isEmpty());
    assertEquals(-0.4, pair.far(), 0);
  }

  @Test
  void everyMeasureComesFromTheShares() {
    SharePair pair = SharePair.of(new Given().named("shares", "a", 0.3, "b", 0.2).inputs());
    assertEquals(
        Set.of("base-share", "h", "difference", "ratio", "odds-ratio"), pair.measures().keySet());
    assertEquals(12.0 / 7, pair.measures().get("odds-ratio"), 1e-12);
  }

  @Test
  void measuresThatAreNotFiniteAreLeftOut() {
    SharePair pair = SharePair.of(new Given().named("shares", "a", 0.3, "b", 0).inputs());
    assertEquals(Set.of("base-share", "h", "difference"), pair.measures().keySet());
  }

  @Test
  void whatCannotBeIsRefusedByItsKey() {
    refused("shares", new Given().named("shares", "a", 0.3, "b", 1.2));
    refused("shares", new Given().named("shares", "a", 0, "b", 0));
    refused("shares", new Given().named("shares", "a", 0.3, "b", 0.2, "c", 0.1));
    refused("base-share", new Given().number("base-share", 20).number("difference", 0.1));
    refused("difference", new Given().number("base-share", 0.2).number("difference", 0.9));
    refused("ratio", new Given().number("base-share", 0.6).number("ratio", 2));
    refused("h", new Given().number("base-share", 0.2).number("h", 3));
    refused(
        "direction", new Given().named("shares", "a", 0.3, "b", 0.2).word("direction", "decrease"));
    refused(
        "direction",
        new Given().number("base-share", 0.2).number("ratio", 0.5).word("direction", "increase"));
  }

  @Test
  void withoutSharesTheKeysThatWouldSupplyThemAreNamed() {
    InputException missing =
        assertThrows(
            InputException.class,
            () -> SharePair.of(new Given().number("difference", 0.1).inputs()));
    assertTrue(missing.isMissing());
    assertEquals(List.of("shares", "base-share"), missing.inputs());
  }

  private static void refused(String key, Given given) {
    InputException problem = assertThrows(InputException.class, () -> SharePair.of(given.inputs()));
    assertFalse(problem.isMissing());
    assertEquals(List.of(key), problem.inputs());
  }
}
