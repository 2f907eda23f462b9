package dev.holdfast.check;

import dev.holdfast.design.Inputs;
import dev.holdfast.plan.Case;
import dev.holdfast.plan.Input;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;

/** Hands the figures of an effect section to a cell, as plain numbers. */
final class EffectInputs {
  private EffectInputs() {}

  /** The figures of a case with other values in force. */
  static Inputs of(Case each, Sampling sampling, Overrides overrides) {
    Map<String, Double> numbers = new LinkedHashMap<>();
    Map<String, Map<String, Double>> named = new LinkedHashMap<>();
    Map<String, List<Double>> rows = new LinkedHashMap<>();
    Map<String, List<List<Double>>> tables = new LinkedHashMap<>();
    Map<String, String> words = new LinkedHashMap<>();
    each.effect()
        .forEach(
            (key, input) -> {
              if (input instanceof Input.One one) {
                numbers.put(key, overrides.value(one.figure()));
              } else if (input instanceof Input.Named byName) {
                Map<String, Double> values = new LinkedHashMap<>();
                byName
                    .figures()
                    .forEach((name, figure) -> values.put(name, overrides.value(figure)));
                named.put(key, values);
              } else if (input instanceof Input.Row row) {
                rows.put(key, row.figures().stream().map(overrides::value).toList());
              } else if (input instanceof Input.Table table) {
                tables.put(
                    key,
                    table.rows().stream()
                        .map(row -> row.stream().map(overrides::value).toList())
                        .toList());
              } else if (input instanceof Input.Word word) {
                words.put(key, word.word());
              }
            });
    return new Inputs(numbers, named, rows, tables, words, sampling.groups(), sampling.weights());
  }
}
