package dev.holdfast.design;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.HashSet;
import java.util.List;
import java.util.Set;
import java.util.stream.Stream;
import org.junit.jupiter.api.Named;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.MethodSource;

/** What holds of every cell and every one of its methods. */
class CellContractTest {
  private static final Level TWO = Level.of(0.05, Sides.TWO);
  private static final Level ONE = Level.of(0.05, Sides.ONE);

  /** How far the level of an approximation, or that of Welch's test, may pass alpha. */
  private static final double NEARLY = 1.005;

  /** How far the attained level of a test with a normal critical value may pass alpha. */
  private static final double LIBERAL = 1.4;

  static Stream<Arguments> cells() {
    return CellExamples.cells().stream().map(cell -> Arguments.of(Named.of(name(cell), cell)));
  }

  static Stream<Arguments> methods() {
    return CellExamples.cells().stream()
        .flatMap(
            cell ->
                cell.methods().stream()
                    .map(
                        method ->
                            Arguments.of(
                                Named.of(name(cell), cell), Named.of(method.key(), method))));
  }

  static Stream<Arguments> methodsOfRealSizes() {
    return methods()
        .filter(
            each ->
                ((Named<?>) each.get()[1]).getPayload() instanceof Method method
                    && method.realSizes());
  }

  private static String name(Cell cell) {
    return cell.key().toString();
  }

  @ParameterizedTest
  @MethodSource("cells")
  void keysOfMethodsAndInputsAreUnique(Cell cell) {
    Set<String> seen = new HashSet<>();
    cell.methods().forEach(method -> assertTrue(seen.add("m " + method.key()), method.key()));
    cell.inputs().forEach(input -> assertTrue(seen.add("i " + input.name()), input.name()));
  }

  @ParameterizedTest
  @MethodSource("cells")
  void nothingGivenIsEitherMissingByNameOrAnEffectWithoutValue(Cell cell) {
    try {
      Effect effect = cell.assume(new Given().inputs());
      assertTrue(effect.value().isEmpty(), "a value out of nothing");
    } catch (InputException e) {
      assertTrue(e.isMissing(), e.getMessage());
      assertFalse(e.inputs().isEmpty());
      List<String> known = cell.inputs().stream().map(InputSpec::name).toList();
      assertTrue(known.containsAll(e.inputs()), e.inputs() + " are no inputs of the cell");
    }
  }

  @ParameterizedTest
  @MethodSource("cells")
  void measuresGoByKeysOfTheEffectAndHoldTheValue(Cell cell) {
    Effect effect = example(cell);
    List<String> known = cell.inputs().stream().map(InputSpec::name).toList();
    assertTrue(known.containsAll(effect.measures().keySet()), effect.measures().toString());
    assertEquals(
        effect.value().orElseThrow(), effect.measures().get(effect.metric().name()), 1e-15);
  }

  @ParameterizedTest
  @MethodSource("cells")
  void anotherMeasureOfTheSameEffectHasTheSamePower(Cell cell) {
    Effect effect = example(cell);
    double[] sizes = CellExamples.of(cell).sizes();
    Method plain = cell.methods().get(0);
    double power = effect.power(plain, sizes, TWO, Ledger.closed());
    for (String measure : effect.measures().keySet()) {
      effect
          .in(measure)
          .ifPresent(
              other -> {
                assertEquals(measure, other.metric().name());
                assertEquals(power, other.power(plain, sizes, TWO, Ledger.closed()), 1e-9, measure);
              });
    }
  }

  @ParameterizedTest
  @MethodSource("methods")
  void powerIsAChanceAndRisesWithTheEffect(Cell cell, Method method) {
    Effect effect = example(cell);
    double[] sizes = CellExamples.of(cell).sizes();
    double before = 0;
    for (double part : new double[] {0, 0.1, 0.25, 0.5, 0.75, 1, 1.25}) {
      double power = effect.at(between(effect, part)).power(method, sizes, TWO, Ledger.closed());
      assertTrue(power >= 0 && power <= 1, "power " + power);
      assertTrue(power >= before - 1e-12, "power falls from " + before + " to " + power);
      before = power;
    }
  }

  @ParameterizedTest
  @MethodSource("methodsOfRealSizes")
  void powerRisesWithRealSizes(Cell cell, Method method) {
    Effect effect = example(cell);
    double before = 0;
    for (double part : new double[] {0.2, 0.5, 0.8, 1, 1.01, 1.5, 4, 20}) {
      double power = effect.power(method, scaled(cell, part), TWO, Ledger.closed());
      assertTrue(power >= before - 1e-12, "power falls from " + before + " to " + power);
      before = power;
    }
    assertTrue(before > 0.99, "power " + before + " at twenty times the sample");
  }

  @ParameterizedTest
  @MethodSource("methods")
  void withoutAnEffectTheLevelIsLeft(Cell cell, Method method) {
    Effect effect = example(cell);
    double[] sizes = CellExamples.of(cell).sizes();
    Effect none = effect.at(effect.metric().none());
    for (Level level : List.of(ONE, TWO)) {
      double power = none.power(method, sizes, level, Ledger.closed());
      assertTrue(
          power <= level.alpha() * (method.realSizes() ? NEARLY : LIBERAL),
          "power " + power + " without an effect");
      assertTrue(power > level.perSide() / 50, "power " + power + " without an effect");
    }
  }

  @ParameterizedTest
  @MethodSource("methods")
  void oneSideHasNoLessPowerThanTwo(Cell cell, Method method) {
    Effect effect = example(cell);
    double[] sizes = CellExamples.of(cell).sizes();
    double one = effect.power(method, sizes, ONE, Ledger.closed());
    double two = effect.power(method, sizes, TWO, Ledger.closed());
    assertTrue(one >= two - 1e-12, one + " against " + two);
  }

  @ParameterizedTest
  @MethodSource("methods")
  void theLeastSampleReachesTheTargetAndNoSmallerOneDoes(Cell cell, Method method) {
    Effect effect = example(cell);
    Allocation allocation = allocation(cell);
    LeastSample.Found found =
        LeastSample.find(effect, method, allocation, cell.arms(), TWO, 0.8).orElseThrow();
    assertTrue(effect.power(method, found.sizes(), TWO, Ledger.closed()) >= 0.8 - 1e-12);
    if (method.realSizes()) {
      double[] exact = allocation.sizes(found.real());
      assertEquals(0.8, effect.power(method, exact, TWO, Ledger.closed()), 1e-8);
    } else if (found.real() > cell.arms().smallest()) {
      double[] fewer = allocation.wholeSizes((long) found.real() - 1);
      assertTrue(effect.power(method, fewer, TWO, Ledger.closed()) < 0.8);
    }
  }

  @ParameterizedTest
  @MethodSource("methods")
  void theDetectableEffectOfAPowerIsTheEffectThatHasIt(Cell cell, Method method) {
    Effect effect = example(cell);
    double[] sizes = CellExamples.of(cell).sizes();
    double power = effect.power(method, sizes, TWO, Ledger.closed());
    double found = DetectableEffect.find(effect, method, sizes, TWO, power).orElseThrow();
    assertEquals(effect.value().getAsDouble(), found, 1e-6 * Math.abs(found));
  }

  @ParameterizedTest
  @MethodSource("methods")
  void everyStepNamesItsSymbolsAndComesToANumber(Cell cell, Method method) {
    Effect effect = example(cell);
    Ledger ledger = Ledger.open();
    effect.derive(ledger);
    double power = effect.power(method, CellExamples.of(cell).sizes(), TWO, ledger);
    assertFalse(ledger.steps().isEmpty());
    for (Step step : ledger.steps()) {
      assertTrue(step.formula().matches("[A-Za-z][A-Za-z0-9]* = .+"), step.formula());
      assertTrue(step.formula().chars().allMatch(each -> each < 128), step.formula());
      assertTrue(Double.isFinite(step.value()), step.toString());
      step.terms()
          .forEach(term -> assertTrue(term.symbol().matches("[A-Za-z][A-Za-z0-9]*"), step.what()));
    }
    Step last = ledger.steps().get(ledger.steps().size() - 1);
    assertEquals("power", last.what());
    assertEquals(power, last.value(), 1e-12);
  }

  private static Effect example(Cell cell) {
    return cell.assume(CellExamples.of(cell).effect());
  }

  private static double between(Effect effect, double part) {
    double none = effect.metric().none();
    return none + part * (effect.value().getAsDouble() - none);
  }

  private static double[] scaled(Cell cell, double part) {
    double[] sizes = CellExamples.of(cell).sizes().clone();
    for (int i = 0; i < sizes.length; i++) {
      sizes[i] = Math.max(cell.arms().smallest() + 1, sizes[i] * part);
    }
    return sizes;
  }

  private static Allocation allocation(Cell cell) {
    double[] sizes = CellExamples.of(cell).sizes();
    return Allocation.of(java.util.Arrays.stream(sizes).boxed().toList());
  }
}
