package dev.holdfast.design;

import java.util.Collection;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;

/**
 * The figures of an {@code effect} section as a cell reads them: numbers only, without places.
 *
 * @param numbers single numbers by key
 * @param named numbers by name, such as means by group
 * @param rows numbers in a row
 * @param tables rows of numbers
 * @param words words
 * @param groups the names of the groups, in the order of the sample; empty when the plan names none
 * @param weights relative sizes of the groups, in the same order; equal when nothing is said
 */
public record Inputs(
    Map<String, Double> numbers,
    Map<String, Map<String, Double>> named,
    Map<String, List<Double>> rows,
    Map<String, List<List<Double>>> tables,
    Map<String, String> words,
    List<String> groups,
    List<Double> weights) {

  /** Inputs of single numbers only, with groups that the plan does not name. */
  public static Inputs of(Map<String, Double> numbers) {
    return new Inputs(numbers, Map.of(), Map.of(), Map.of(), Map.of(), List.of(), List.of());
  }

  /** Whether a key is given in any form. */
  public boolean has(String name) {
    return numbers.containsKey(name)
        || named.containsKey(name)
        || rows.containsKey(name)
        || tables.containsKey(name)
        || words.containsKey(name);
  }

  /** A single number. */
  public OptionalDouble number(String name) {
    Double value = numbers.get(name);
    return value == null ? OptionalDouble.empty() : OptionalDouble.of(value);
  }

  /**
   * A single number above zero.
   *
   * @throws InputException if it is given and not above zero
   */
  public OptionalDouble positive(String name) {
    OptionalDouble value = number(name);
    if (value.isPresent() && !(value.getAsDouble() > 0)) {
      throw InputException.unfit(name, name + " must be above 0");
    }
    return value;
  }

  /**
   * A share, strictly between 0 and 1.
   *
   * @throws InputException if it is given and outside
   */
  public OptionalDouble share(String name) {
    OptionalDouble value = number(name);
    if (value.isPresent() && !(value.getAsDouble() > 0 && value.getAsDouble() < 1)) {
      throw InputException.unfit(name, name + " must lie between 0 and 1");
    }
    return value;
  }

  /**
   * Numbers by group, in the order of the groups; in the order of the file when the plan names no
   * groups elsewhere.
   *
   * @throws InputException if the names are not those of the groups
   */
  public Optional<double[]> byGroup(String name) {
    Map<String, Double> given = named.get(name);
    if (given == null) {
      return Optional.empty();
    }
    if (groups.isEmpty()) {
      return Optional.of(toArray(given.values()));
    }
    double[] ordered = new double[groups.size()];
    for (int i = 0; i < ordered.length; i++) {
      Double value = given.get(groups.get(i));
      if (value == null) {
        throw InputException.unfit(
            name, name + " has no entry for the group '" + groups.get(i) + "' of the sample");
      }
      ordered[i] = value;
    }
    for (String key : given.keySet()) {
      if (!groups.contains(key)) {
        throw InputException.unfit(
            name, name + " names '" + key + "', which is no group of the sample");
      }
    }
    return Optional.of(ordered);
  }

  /** Numbers by names that are not groups, such as categories, in the order of the file. */
  public Optional<double[]> byName(String name) {
    return Optional.ofNullable(named.get(name)).map(given -> toArray(given.values()));
  }

  /** Rows of numbers. */
  public Optional<double[][]> table(String name) {
    return Optional.ofNullable(tables.get(name))
        .map(table -> table.stream().map(Inputs::toArray).toArray(double[][]::new));
  }

  /** A word. */
  public Optional<String> word(String name) {
    return Optional.ofNullable(words.get(name));
  }

  /**
   * The share of the sample in each group, summing to one.
   *
   * @param count number of groups, used when the plan gives no sizes
   */
  public double[] shares(int count) {
    double[] shares = new double[count];
    double sum = 0;
    for (int i = 0; i < count; i++) {
      shares[i] = weights.size() == count ? weights.get(i) : 1;
      sum += shares[i];
    }
    for (int i = 0; i < count; i++) {
      shares[i] /= sum;
    }
    return shares;
  }

  private static double[] toArray(Collection<Double> values) {
    return values.stream().mapToDouble(Double::doubleValue).toArray();
  }
}
