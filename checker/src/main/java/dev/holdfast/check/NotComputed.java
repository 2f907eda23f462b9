package dev.holdfast.check;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/** Says what is missing for a claim, in one sentence. */
final class NotComputed {
  private NotComputed() {}

  static Optional<String> power(Situation situation) {
    List<String> reasons = common(situation);
    value(situation, reasons);
    sizes(situation, reasons);
    return sentence(reasons);
  }

  static Optional<String> number(Situation situation) {
    List<String> reasons = common(situation);
    value(situation, reasons);
    target(situation, reasons);
    return sentence(reasons);
  }

  static Optional<String> detectable(Situation situation) {
    List<String> reasons = common(situation);
    sizes(situation, reasons);
    target(situation, reasons);
    return sentence(reasons);
  }

  private static List<String> common(Situation situation) {
    List<String> reasons = new ArrayList<>();
    situation.missing().forEach(missing -> reasons.add(missing.what()));
    return reasons;
  }

  private static void value(Situation situation, List<String> reasons) {
    if (situation.effect().isPresent() && situation.effect().get().value().isEmpty()) {
      reasons.add("the effect (" + situation.effect().get().metric().name() + ") is not given");
    }
  }

  private static void sizes(Situation situation, List<String> reasons) {
    if (situation.cell().isPresent() && situation.sizes().isEmpty()) {
      reasons.add(
          situation.countsEvents()
              ? "the number of events is not given"
              : "the sample analysed is not given");
    }
  }

  private static void target(Situation situation, List<String> reasons) {
    if (TargetFinder.find(situation).isEmpty()) {
      reasons.add("the power aimed at is not given (target-power)");
    }
  }

  private static Optional<String> sentence(List<String> reasons) {
    return reasons.isEmpty() ? Optional.empty() : Optional.of(String.join("; ", reasons));
  }
}
