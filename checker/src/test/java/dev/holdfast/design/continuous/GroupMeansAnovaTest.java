package dev.holdfast.design.continuous;

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
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.constraints.DoubleRange;
import net.jqwik.api.constraints.IntRange;
import org.junit.jupiter.api.Test;

class GroupMeansAnovaTest {
  private static final Level LEVEL = Level.of(0.05, Sides.TWO);

  private final GroupMeansAnova cell = new GroupMeansAnova();

  @Test
  void meansAreWeighedByTheSizesOfTheirGroups() {
    Effect effect = cell.assume(means().weights(10.0, 30.0).inputs());
    // p1 p2 (m1 - m2)^2 = 3/16 of 16
    assertEquals(Math.sqrt(3) / 8, effect.value().orElseThrow(), 1e-15);
    assertEquals(4, effect.measures().get("largest-difference"), 1e-14);
  }

  @Test
  void otherSizesThanThePlannedWeighTheSameMeansOtherwise() {
    Effect planned = cell.assume(means().weights(10.0, 30.0).inputs());
    Effect even = cell.assume(means().weights(20.0, 20.0).inputs());
    assertEquals(power(even, 20, 20), power(planned, 20, 20), 1e-13);
  }

  @Test
  void aStatedFIsTakenAsItIsWhateverTheSizes() {
    Effect effect =
        cell.assume(new Given().number("f", 0.25).groups("a", "b").weights(10.0, 30.0).inputs());
    assertEquals(power(effect, 20, 20), power(effect, 10, 30), 1e-13);
  }

  @Property(tries = 200)
  void noPlaceOfTheOtherMeansHasLessPowerThanTheLeastFavourable(
      @ForAll @DoubleRange(min = 0, max = 1) double place,
      @ForAll @IntRange(min = 2, max = 60) int first,
      @ForAll @IntRange(min = 2, max = 60) int second,
      @ForAll @IntRange(min = 2, max = 60) int third) {
    double[] sizes = {first, second, third};
    double least = GroupPattern.LEAST_FAVOURABLE.spread(sizes);
    for (double[] means :
        List.of(
            new double[] {0, 1, place}, new double[] {0, place, 1}, new double[] {place, 0, 1})) {
      assertTrue(GroupPattern.of(means).spread(sizes) >= least - 1e-12);
    }
  }

  @Test
  void theLeastFavourablePatternOfEqualGroupsHasTheUsualF() {
    Effect effect = cell.assume(range().number("sd", 5).inputs());
    // Kutner et al. (2005): f = D/SD/sqrt(2 k)
    assertEquals(6 / 5.0 / Math.sqrt(6), effect.measures().get("f"), 1e-15);
    assertEquals("largest-difference", effect.metric().name());
  }

  @Test
  void twoGroupsHaveThePowerOfStudentsTest() {
    double student =
        new ParallelMeansStudent()
            .assume(new Given().number("difference", 4).number("sd", 8).inputs())
            .power(
                new ParallelMeansStudent().best(), new double[] {30, 50}, LEVEL, Ledger.closed());
    assertEquals(student, power(cell.assume(means().weights(30.0, 50.0).inputs()), 30, 50), 1e-12);
  }

  @Test
  void partialEtaSquaredGivesF() {
    Effect effect = cell.assume(new Given().number("partial-eta-squared", 0.2).inputs());
    assertEquals(0.5, effect.value().orElseThrow(), 1e-15);
    assertEquals(0.2, effect.in("partial-eta-squared").orElseThrow().value().orElseThrow(), 1e-15);
  }

  @Test
  void meansThatAreEqualLeaveTheLevel() {
    Effect effect =
        cell.assume(
            new Given().named("means", "a", 0.1, "b", 0.1, "c", 0.1).number("sd", 3).inputs());
    assertEquals(0.05, power(effect, 9, 12, 20), 1e-12);
  }

  @Test
  void meansWithoutAnSdMissIt() {
    InputException thrown =
        assertThrows(
            InputException.class,
            () -> cell.assume(new Given().named("means", "a", 1, "b", 2).inputs()));
    assertEquals(List.of("sd"), thrown.inputs());
    assertTrue(thrown.isMissing());
  }

  @Test
  void meansWithFNeedNoSd() {
    Effect effect =
        cell.assume(new Given().named("means", "a", 1, "b", 2).number("f", 0.25).inputs());
    assertEquals(0.25, effect.value().orElseThrow());
  }

  @Test
  void anSdAloneIsEnoughToAskForTheLargestDifferenceDetected() {
    Effect effect = cell.assume(new Given().number("sd", 5).groups("a", "b", "c").inputs());
    Effect asked = effect.in("largest-difference").orElseThrow();
    Effect stated = cell.assume(range().number("sd", 5).inputs());
    assertEquals(power(stated, 20, 20, 20), power(asked.at(6), 20, 20, 20), 1e-13);
  }

  private static Given means() {
    return new Given().named("means", "a", 10, "b", 14).number("sd", 8).groups("a", "b");
  }

  private static Given range() {
    return new Given().number("largest-difference", 6).groups("a", "b", "c");
  }

  private double power(Effect effect, double... sizes) {
    return effect.power(cell.best(), sizes, LEVEL, Ledger.closed());
  }
}
