package dev.holdfast.design;

import static org.junit.jupiter.api.Assertions.assertTrue;

import dev.holdfast.design.catalogue.Catalogue;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.OptionalInt;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvFileSource;

/**
 * Figures printed outside the project, each named with its source in {@code published/designs.csv},
 * against the cell that gives them. A printed number stands for the real solution or for its whole
 * number above, within the tolerance that the print's rounding allows.
 */
class PublishedValuesTest {
  private final Catalogue catalogue = Catalogue.standard();

  @ParameterizedTest(name = "{13}: {0} {1} at {4}, {5} side(s), power {6}, sizes {3}")
  @CsvFileSource(resources = "/published/designs.csv", numLinesToSkip = 1, maxCharsPerColumn = 600)
  void theCellGivesThePrintedFigure(
      String name,
      String inputs,
      int groups,
      String sizes,
      double alpha,
      int sides,
      Double target,
      String method,
      Integer z,
      String asks,
      double expected,
      double tolerance,
      String provenance,
      String source) {
    String[] key = name.split("/");
    Cell cell = catalogue.find(key[0], key[1]).orElseThrow();
    Effect effect = cell.assume(inputs(inputs, groups));
    Method by =
        cell.methods().stream()
            .filter(each -> method == null || each.key().equals(method))
            .findFirst()
            .orElseThrow();
    Level level =
        new Level(
            alpha,
            sides == 2 ? Sides.TWO : Sides.ONE,
            z == null ? OptionalInt.empty() : OptionalInt.of(z));
    double nearest = Double.POSITIVE_INFINITY;
    for (double computed : computed(cell, effect, by, level, asks, sizes, groups, target)) {
      if (Math.abs(computed - expected) < Math.abs(nearest - expected)) {
        nearest = computed;
      }
    }
    assertTrue(
        Math.abs(nearest - expected) <= tolerance * (1 + 1e-9),
        "printed " + expected + ", computed " + nearest);
  }

  private static List<Double> computed(
      Cell cell,
      Effect effect,
      Method by,
      Level level,
      String asks,
      String sizes,
      int groups,
      Double target) {
    boolean events = cell.arms().unit() == Unit.EVENTS;
    int count = events ? 1 : groups;
    return switch (asks) {
      case "power" -> List.of(effect.power(by, sizes(sizes, count), level, Ledger.closed()));
      case "detectable" ->
          List.of(
              Math.abs(
                  DetectableEffect.find(effect, by, sizes(sizes, count), level, target)
                          .orElseThrow()
                      - effect.metric().none()));
      default -> {
        Allocation allocation =
            sizes == null ? Allocation.equal(count) : Allocation.of(ratio(sizes));
        LeastSample.Found found =
            LeastSample.find(
                    effect,
                    by,
                    allocation,
                    cell.arms(),
                    level,
                    ZPower.effectiveTarget(target, level))
                .orElseThrow();
        yield asks.equals("total")
            ? List.of(found.realTotal(), (double) found.total())
            : List.of(found.real(), found.sizes()[0]);
      }
    };
  }

  private static double[] sizes(String text, int groups) {
    String[] parts = text.split("\\+");
    double[] sizes = new double[groups];
    for (int i = 0; i < groups; i++) {
      sizes[i] = Double.parseDouble(parts.length == 1 ? parts[0] : parts[i]);
    }
    return sizes;
  }

  private static List<Double> ratio(String text) {
    List<Double> ratio = new ArrayList<>();
    for (String part : text.split(":")) {
      ratio.add(Double.parseDouble(part));
    }
    return ratio;
  }

  private static Inputs inputs(String text, int count) {
    Map<String, Double> numbers = new LinkedHashMap<>();
    Map<String, Map<String, Double>> named = new LinkedHashMap<>();
    Map<String, String> words = new LinkedHashMap<>();
    List<String> groups = new ArrayList<>();
    for (String part : text == null ? new String[0] : text.split(" ")) {
      String[] pair = part.split("=");
      if (pair[1].matches("[a-z]+")) {
        words.put(pair[0], pair[1]);
      } else if (pair[0].contains(".")) {
        String[] path = pair[0].split("\\.");
        named
            .computeIfAbsent(path[0], each -> new LinkedHashMap<>())
            .put(path[1], Double.parseDouble(pair[1]));
      } else {
        numbers.put(pair[0], Double.parseDouble(pair[1]));
      }
    }
    if (numbers.containsKey("largest-difference")) {
      for (int i = 0; i < count; i++) {
        groups.add("group" + i);
      }
    }
    return new Inputs(numbers, named, Map.of(), Map.of(), words, groups, List.of());
  }
}
