package dev.holdfast.check;

import java.util.OptionalDouble;

/** The power that a claimed number or detectable effect is for. */
final class TargetFinder {
  private TargetFinder() {}

  /** The target power of the plan, or else the power that the same case claims. */
  static OptionalDouble find(Situation situation) {
    OptionalDouble target =
        situation.target().isPresent()
            ? situation.target()
            : situation.situation().claims().stream()
                .filter(claim -> claim.kind().equals("power"))
                .mapToDouble(claim -> claim.figure().value())
                .findFirst();
    return target.isPresent() && target.getAsDouble() > 0 && target.getAsDouble() < 1
        ? target
        : OptionalDouble.empty();
  }
}
