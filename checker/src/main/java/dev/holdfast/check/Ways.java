package dev.holdfast.check;

import dev.holdfast.design.Cell;
import dev.holdfast.design.Convention;
import dev.holdfast.design.Method;
import dev.holdfast.plan.Case;
import java.util.ArrayList;
import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import java.util.OptionalInt;

/** The ways in which a case's figures may have been made, as far as its conventions leave them. */
final class Ways {
  private Ways() {}

  /** The ways to compute that the plan's conventions leave open, the plain one first. */
  static List<Candidate> open(Cell cell, Case each, List<Missing> missing) {
    Map<Convention, String> stated = new EnumMap<>(Convention.class);
    for (Convention convention : Convention.values()) {
      boolean known =
          cell.methods().stream().anyMatch(m -> m.conventions().containsKey(convention));
      each.settings()
          .conventions()
          .of(convention.key())
          .filter(word -> known)
          .ifPresent(word -> stated.put(convention, word));
    }
    List<Method> open =
        cell.methods().stream()
            .filter(method -> method.agreesWith(stated))
            .filter(
                method ->
                    each.method().isEmpty() || each.method().get().text().equals(method.key()))
            .toList();
    if (open.isEmpty()) {
      missing.add(
          new Missing(
              "no method of this design goes by the conventions stated ("
                  + describe(stated, each)
                  + ")",
              "see 'holdfast catalogue " + cell.key() + "'"));
      return List.of();
    }
    OptionalInt zDecimals =
        each.settings()
            .conventions()
            .of("z-rounded-to")
            .map(word -> OptionalInt.of(Integer.parseInt(word)))
            .orElse(OptionalInt.empty());
    List<Candidate> candidates = new ArrayList<>();
    for (Method method : open) {
      boolean first = candidates.isEmpty();
      candidates.add(
          new Candidate(method, zDecimals, first ? "" : difference(open.get(0), method)));
    }
    if (zDecimals.isEmpty() && each.method().isEmpty()) {
      for (Method method : open) {
        if (method.realSizes() && !method.exact()) {
          String other = method.equals(open.get(0)) ? "" : difference(open.get(0), method) + ", ";
          candidates.add(new Candidate(method, OptionalInt.of(2), other + "z-rounded-to: 2"));
        }
      }
    }
    return candidates;
  }

  private static String describe(Map<Convention, String> stated, Case each) {
    List<String> words = new ArrayList<>();
    stated.forEach((convention, word) -> words.add(convention.key() + ": " + word));
    each.method().ifPresent(method -> words.add("method: " + method));
    return String.join(", ", words);
  }

  /** What a plan must state to ask for a method rather than for the plain one. */
  private static String difference(Method plain, Method other) {
    List<String> words = new ArrayList<>();
    for (Convention convention : Convention.values()) {
      String word = other.conventions().get(convention);
      if (word != null && !word.equals(plain.conventions().get(convention))) {
        words.add(convention.key() + ": " + word);
      }
    }
    return words.isEmpty() ? "method: " + other.key() : String.join(", ", words);
  }
}
