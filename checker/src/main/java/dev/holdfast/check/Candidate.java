package dev.holdfast.check;

import dev.holdfast.design.Level;
import dev.holdfast.design.Method;
import java.util.OptionalInt;

/**
 * A way in which a plan's figures may have been made.
 *
 * @param method method of the cell
 * @param zDecimals decimals to which normal quantiles are rounded
 * @param unstated what the plan would have to state to ask for it, such as {@code reference:
 *     normal}; empty for the way that the plan is held to
 */
record Candidate(Method method, OptionalInt zDecimals, String unstated) {
  Level level(Level base) {
    return new Level(base.alpha(), base.sides(), zDecimals);
  }

  String title() {
    return zDecimals.isPresent()
        ? method.title() + " with z rounded to " + zDecimals.getAsInt() + " decimals"
        : method.title();
  }
}
