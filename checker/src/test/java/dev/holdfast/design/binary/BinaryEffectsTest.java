package dev.holdfast.design.binary;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import dev.holdfast.design.Cell;
import dev.holdfast.design.Effect;
import dev.holdfast.design.Given;
import dev.holdfast.design.InputException;
import dev.holdfast.design.Ledger;
import dev.holdfast.design.Level;
import dev.holdfast.design.Method;
import dev.holdfast.design.Sides;
import java.util.List;
import java.util.OptionalInt;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.constraints.DoubleRange;
import net.jqwik.api.constraints.IntRange;
import org.junit.jupiter.api.Test;

class BinaryEffectsTest {
  private static final Level TWO = Level.of(0.05, Sides.TWO);

  @Property(tries = 100)
  void swappingTheGroupsLeavesThePowerOfEveryTestThatHasNoBase(
      @ForAll @DoubleRange(min = 0.02, max = 0.98) double p1,
      @ForAll @DoubleRange(min = 0.02, max = 0.98) double p2,
      @ForAll @IntRange(min = 5, max = 60) int n1,
      @ForAll @IntRange(min = 5, max = 60) int n2) {
    for (Method method : new TwoSharesChiSquare().methods()) {
      if (!method.key().equals("control-variance")) {
        double power = power(p1, p2, n1, n2, method);
        assertEquals(power, power(p2, p1, n2, n1, method), 1e-12, method.key());
        assertEquals(power, power(1 - p1, 1 - p2, n1, n2, method), 1e-9, method.key());
      }
    }
  }

  private static double power(double p1, double p2, int n1, int n2, Method method) {
    return new TwoSharesChiSquare()
        .assume(new Given().named("shares", "a", p1, "b", p2).inputs())
        .power(method, new double[] {n1, n2}, TWO, Ledger.closed());
  }

  @Test
  void aOneSidedExactTestLooksWhereTheEffectLies() {
    Cell cell = new OneShareExact();
    Level one = Level.of(0.05, Sides.ONE);
    double[] sizes = {50};
    double above =
        cell.assume(new Given().number("null-share", 0.3).number("share", 0.45).inputs())
            .power(cell.best(), sizes, one, Ledger.closed());
    double below =
        cell.assume(new Given().number("null-share", 0.7).number("share", 0.55).inputs())
            .power(cell.best(), sizes, one, Ledger.closed());
    assertEquals(above, below, 1e-12);
    assertTrue(above > 0.5);
  }

  @Test
  void roundedQuantilesDoNotTouchAnEnumeratedTest() {
    Level rounded = new Level(0.05, Sides.TWO, OptionalInt.of(0));
    for (Cell cell : List.of(new TwoSharesChiSquare(), new TwoSharesFisher())) {
      Effect effect = cell.assume(new Given().named("shares", "a", 0.5, "b", 0.2).inputs());
      double[] sizes = {40, 40};
      assertEquals(
          effect.power(cell.best(), sizes, TWO, Ledger.closed()),
          effect.power(cell.best(), sizes, rounded, Ledger.closed()),
          0);
    }
  }

  @Test
  void aCorrectionLargerThanTheDifferenceLeavesNoMoreThanTheLevel() {
    Cell cell = new TwoSharesNormal();
    Method corrected = cell.methods().get(1);
    Effect effect = cell.assume(new Given().named("shares", "a", 0.5, "b", 0.45).inputs());
    double power = effect.power(corrected, new double[] {15, 15}, TWO, Ledger.closed());
    assertTrue(power > 0 && power <= 0.025, "power " + power);
  }

  @Test
  void noVarianceIsTakenFromAShareOfOne() {
    Cell cell = new OneShareNormal();
    Effect effect = cell.assume(new Given().number("null-share", 0.8).number("share", 1).inputs());
    for (Method method : cell.methods()) {
      boolean own = method.key().startsWith("own-variance");
      assertEquals(own, effect.beyondReach(method, new double[] {20}).isPresent(), method.key());
      if (!own) {
        double power = effect.power(method, new double[] {20}, TWO, Ledger.closed());
        assertTrue(power >= 0 && power <= 1, method.key() + " " + power);
      }
    }
  }

  @Test
  void aBaseShareOfZeroLeavesAChanceOrAReason() {
    Cell cell = new TwoSharesChiSquare();
    Effect effect = cell.assume(new Given().named("shares", "a", 0.2, "b", 0).inputs());
    double[] sizes = {40, 40};
    for (Method method : cell.methods()) {
      boolean control = method.key().equals("control-variance");
      assertEquals(control, effect.beyondReach(method, sizes).isPresent(), method.key());
      if (!control) {
        double power = effect.power(method, sizes, TWO, Ledger.closed());
        assertTrue(power > 0.5 && power <= 1, method.key() + " " + power);
      }
    }
  }

  @Test
  void enumerationsSayWhereTheyEnd() {
    Cell cell = new TwoSharesFisher();
    Effect effect = cell.assume(new Given().named("shares", "a", 0.5, "b", 0.49).inputs());
    assertTrue(effect.beyondReach(cell.best(), new double[] {4000, 4000}).isEmpty());
    assertTrue(effect.beyondReach(cell.best(), new double[] {4000, 40000}).isPresent());
    assertTrue(effect.beyondReach(cell.methods().get(1), new double[] {4e6, 4e6}).isEmpty());
  }

  @Test
  void discordantPairsAreStatedInFourWays() {
    for (Given given :
        List.of(
            new Given().named("discordant", "lost", 0.1, "gained", 0.2),
            new Given().number("discordant-share", 0.3).number("difference", 0.1),
            new Given().number("discordant-share", 0.3).number("odds-ratio", 2),
            new Given().number("difference", 0.1).number("odds-ratio", 2))) {
      Effect effect = DiscordantEffect.of(given.inputs());
      assertEquals(0.3, effect.measures().get("discordant-share"), 1e-12);
      assertEquals(0.1, effect.measures().get("difference"), 1e-12);
      assertEquals(2, effect.measures().get("odds-ratio"), 1e-9);
    }
  }

  @Test
  void discordantPairsThatCannotBeAreRefused() {
    refused("discordant", new Given().named("discordant", "lost", 0.6, "gained", 0.5));
    refused("discordant", new Given().named("discordant", "lost", 0, "gained", 0));
    refused("odds-ratio", new Given().number("discordant-share", 0.3).number("odds-ratio", 0.5));
    refused("odds-ratio", new Given().number("difference", 0.1).number("odds-ratio", 1));
    refused("odds-ratio", new Given().number("difference", 0.9).number("odds-ratio", 2));
    refused("difference", new Given().number("discordant-share", 0.3).number("difference", 0.4));
  }

  private static void refused(String key, Given given) {
    InputException problem =
        assertThrows(InputException.class, () -> DiscordantEffect.of(given.inputs()));
    assertFalse(problem.isMissing());
    assertEquals(List.of(key), problem.inputs());
  }
}
