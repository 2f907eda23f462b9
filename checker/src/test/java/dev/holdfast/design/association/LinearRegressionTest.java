package dev.holdfast.design.association;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import dev.holdfast.design.Effect;
import dev.holdfast.design.Given;
import dev.holdfast.design.InputException;
import dev.holdfast.design.Ledger;
import dev.holdfast.design.Level;
import dev.holdfast.design.Sides;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class LinearRegressionTest {
  private static final Level LEVEL = Level.of(0.05, Sides.TWO);

  private final LinearRegression cell = new LinearRegression();

  @Test
  void theThreeMeasuresOfOneEffectAgree() {
    Effect gain = cell.assume(subset().number("gain", 0.06).number("r-squared-full", 0.4).inputs());
    assertEquals(0.1, gain.measures().get("f-squared"), 1e-15);
    Effect f2 =
        cell.assume(subset().number("f-squared", 0.1).number("r-squared-full", 0.4).inputs());
    assertEquals(0.06, f2.measures().get("gain"), 1e-15);
    Effect all = cell.assume(all().number("r-squared", 0.2).inputs());
    assertEquals(0.25, all.measures().get("f-squared"), 1e-15);
    assertEquals(0.2, all.in("f-squared").orElseThrow().measures().get("r-squared"), 1e-15);
  }

  @Test
  void whatTheFullModelLeavesFollowsFromTheGainAndFSquared() {
    Effect effect = cell.assume(subset().number("gain", 0.06).number("f-squared", 0.1).inputs());
    assertEquals(0.1, effect.measures().get("f-squared"), 1e-15);
  }

  @Test
  void rSquaredOfAllPredictorsSaysNothingOfSome() {
    Effect effect = cell.assume(subset().number("r-squared", 0.2).inputs());
    assertTrue(effect.value().isEmpty());
    assertEquals("gain", effect.metric().name());
  }

  @Test
  void aGainNeedsWhatTheFullModelExplains() {
    InputException thrown =
        assertThrows(
            InputException.class, () -> cell.assume(subset().number("gain", 0.06).inputs()));
    assertEquals(List.of("r-squared-full"), thrown.inputs());
    assertTrue(thrown.isMissing());
  }

  @ParameterizedTest
  @CsvSource({"gain, 0.5", "tested-predictors, 6", "tested-predictors, 1.5"})
  void whatCannotBeIsRefused(String key, double value) {
    Given given = all().number("r-squared-full", 0.4).number("gain", 0.1).number(key, value);
    InputException thrown = assertThrows(InputException.class, () -> cell.assume(given.inputs()));
    assertEquals(List.of(key), thrown.inputs());
  }

  @Test
  void withAllPredictorsTestedBothNoncentralitiesAreOne() {
    Effect effect = cell.assume(all().number("f-squared", 0.15).inputs());
    assertEquals(power(effect, 0, 70), power(effect, 1, 70), 1e-14);
  }

  @Test
  void ofASubsetTheNoncentralityByDegreesOfFreedomIsSmaller() {
    Effect effect = cell.assume(subset().number("f-squared", 0.15).inputs());
    assertTrue(power(effect, 1, 70) < power(effect, 0, 70));
  }

  @Test
  void aSampleNoLargerThanTheModelHasNoPower() {
    Effect effect = cell.assume(all().number("f-squared", 0.15).inputs());
    assertEquals(0, power(effect, 0, 6));
    assertTrue(power(effect, 0, 7) > 0.05);
  }

  private static Given all() {
    return new Given().number("predictors", 5);
  }

  private static Given subset() {
    return all().number("tested-predictors", 2);
  }

  private double power(Effect effect, int method, double n) {
    return effect.power(cell.methods().get(method), new double[] {n}, LEVEL, Ledger.closed());
  }
}
