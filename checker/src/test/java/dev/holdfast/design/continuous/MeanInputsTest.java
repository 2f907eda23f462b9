package dev.holdfast.design.continuous;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import dev.holdfast.design.Effect;
import dev.holdfast.design.Given;
import dev.holdfast.design.InputException;
import dev.holdfast.design.Ledger;
import dev.holdfast.design.Step;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.function.Executable;

/** What a plan states of a difference of means, and what follows from it. */
class MeanInputsTest {
  private static final double CLOSE = 1e-12;

  @Test
  void groupsGiveTheirDifferenceWhateverItsSign() {
    MeanDifference found =
        MeanInputs.ofGroups(new Given().named("means", "a", 10, "b", 14).number("sd", 8).inputs());
    assertEquals(4, found.size());
    assertEquals(0.5, found.d());
    assertTrue(found.raw());
  }

  @Test
  void twoSdsMakeOneByTheMeanOfTheirSquares() {
    MeanDifference found =
        MeanInputs.ofGroups(new Given().number("d", 0.5).named("sds", "a", 6, "b", 8).inputs());
    assertEquals(Math.sqrt(50), found.measures().get("sd"), CLOSE);
    assertEquals(0.5 * Math.sqrt(50), found.size(), CLOSE);
  }

  @Test
  void sdsFollowTheOrderOfTheSample() {
    MeanDifference found =
        MeanInputs.ofGroups(
            new Given()
                .number("difference", 5)
                .named("sds", "b", 8, "a", 6)
                .groups("a", "b")
                .inputs());
    assertEquals(6, found.sdFirst());
    assertEquals(8, found.sdSecond());
  }

  @Test
  void aDifferenceAndItsDGiveTheSd() {
    Given given = new Given().number("difference", -4).number("d", -0.5);
    for (MeanDifference found :
        List.of(MeanInputs.ofGroups(given.inputs()), MeanInputs.ofOneGroup(given.inputs()))) {
      assertEquals(8, found.sdFirst());
      assertTrue(found.raw());
    }
  }

  @Test
  void dStatedBesideADifferenceAndItsSdIsLeftToCompare() {
    MeanDifference found =
        MeanInputs.ofGroups(
            new Given().number("difference", 4).number("sd", 8).number("d", 0.9).inputs());
    assertEquals(0.5, found.measures().get("d"));
  }

  @Test
  void anSdAloneIsEnoughToAskForTheDetectableDifference() {
    Effect effect = new ParallelMeansStudent().assume(new Given().number("sd", 8).inputs());
    assertTrue(effect.value().isEmpty());
    assertEquals("difference", effect.metric().name());
    assertEquals("d", effect.in("d").orElseThrow().metric().name());
  }

  @Test
  void aDifferenceWithoutAnSdNamesTheKeysThatWouldGiveOne() {
    Given given = new Given().number("difference", 4);
    assertEquals(List.of("sd", "sds"), missing(() -> MeanInputs.ofGroups(given.inputs())).inputs());
    assertEquals(List.of("sd"), missing(() -> MeanInputs.ofOneGroup(given.inputs())).inputs());
    assertEquals(
        List.of("sd-of-difference", "sd", "correlation"),
        missing(() -> MeanInputs.ofPairs(given.inputs())).inputs());
  }

  @Test
  void aMeanNeedsTheFixedValue() {
    Given given = new Given().number("mean", 13).number("sd", 6);
    assertEquals(
        List.of("null-mean"), missing(() -> MeanInputs.ofOneGroup(given.inputs())).inputs());
    assertEquals(3, MeanInputs.ofOneGroup(given.number("null-mean", 10).inputs()).size());
  }

  @Test
  void pairsGetTheSdOfTheirDifferenceFromTwoSdsAndTheirCorrelation() {
    MeanDifference found =
        MeanInputs.ofPairs(
            new Given()
                .number("difference", 5)
                .named("sds", "before", 6, "after", 8)
                .number("correlation", 0.5)
                .inputs());
    assertEquals(Math.sqrt(52), found.sdFirst(), CLOSE);
    assertEquals(Math.sqrt(52), found.measures().get("sd-of-difference"), CLOSE);
    assertEquals(5 / Math.sqrt(50), found.measures().get("d-between"), CLOSE);
  }

  @Test
  void aDOfTheMeasurementsTurnsIntoOneOfTheDifferencesByTheCorrelation() {
    Given given = new Given().number("d-between", 0.5);
    assertEquals(
        List.of("correlation"), missing(() -> MeanInputs.ofPairs(given.inputs())).inputs());
    MeanDifference found = MeanInputs.ofPairs(given.number("correlation", 0.875).inputs());
    assertEquals(1, found.d(), CLOSE);
    assertEquals(0.5, found.measures().get("d-between"), CLOSE);
  }

  @Test
  void bothSdsTurnADOfTheMeasurementsIntoOneOfTheDifferences() {
    MeanDifference found =
        MeanInputs.ofPairs(
            new Given()
                .number("d-between", 0.5)
                .number("sd", 10)
                .number("sd-of-difference", 8)
                .inputs());
    assertEquals(5, found.size(), CLOSE);
    assertEquals(0.625, found.d(), CLOSE);
  }

  @Test
  void theSdsOfPairsAreTwoAndAboveZero() {
    for (Given given :
        List.of(
            new Given().named("sds", "before", 6),
            new Given().named("sds", "before", 6, "after", 0))) {
      InputException refused =
          assertThrows(InputException.class, () -> MeanInputs.ofPairs(given.inputs()));
      assertEquals(List.of("sds"), refused.inputs());
    }
  }

  @Test
  void aCorrelationOfOneIsRefused() {
    InputException refused =
        assertThrows(
            InputException.class,
            () -> MeanInputs.ofPairs(new Given().number("correlation", 1).inputs()));
    assertEquals(List.of("correlation"), refused.inputs());
  }

  @Test
  void everyConversionIsWrittenDown() {
    Ledger ledger = Ledger.open();
    new PairedMeansStudent()
        .assume(
            new Given().number("difference", 5).number("sd", 8).number("correlation", 0.5).inputs())
        .derive(ledger);
    assertEquals(
        List.of("SD = sqrt(s1^2 + s2^2 - 2*r*s1*s2)", "d = difference/SD"),
        ledger.steps().stream().map(Step::formula).toList());
  }

  private static InputException missing(Executable reading) {
    InputException thrown = assertThrows(InputException.class, reading);
    assertTrue(thrown.isMissing(), thrown.getMessage());
    return thrown;
  }
}
