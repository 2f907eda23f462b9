package dev.holdfast.design;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;

/** Writes the inputs of a cell as a plan would give them. */
public final class Given {
  private final Map<String, Double> numbers = new LinkedHashMap<>();
  private final Map<String, Map<String, Double>> named = new LinkedHashMap<>();
  private final Map<String, List<List<Double>>> tables = new LinkedHashMap<>();
  private final Map<String, String> words = new LinkedHashMap<>();
  private List<String> groups = List.of();
  private List<Double> weights = List.of();

  /** A single number. */
  public Given number(String key, double value) {
    numbers.put(key, value);
    return this;
  }

  /** Two or more numbers by name: name, number, name, number. */
  public Given named(String key, Object... pairs) {
    Map<String, Double> values = new LinkedHashMap<>();
    for (int i = 0; i < pairs.length; i += 2) {
      values.put((String) pairs[i], ((Number) pairs[i + 1]).doubleValue());
    }
    named.put(key, values);
    return this;
  }

  /** Rows of numbers. */
  public Given table(String key, double[]... rows) {
    List<List<Double>> table = new ArrayList<>();
    for (double[] row : rows) {
      table.add(Arrays.stream(row).boxed().toList());
    }
    tables.put(key, table);
    return this;
  }

  /** A word. */
  public Given word(String key, String word) {
    words.put(key, word);
    return this;
  }

  /** The groups of the sample. */
  public Given groups(String... names) {
    groups = List.of(names);
    return this;
  }

  /** The sizes of the groups, or their ratio. */
  public Given weights(Double... sizes) {
    weights = List.of(sizes);
    return this;
  }

  /** The inputs. */
  public Inputs inputs() {
    return new Inputs(numbers, named, Map.of(), tables, words, groups, weights);
  }
}
