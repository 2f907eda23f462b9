package dev.holdfast.design;

import java.util.ArrayList;
import java.util.List;

/**
 * Takes down the steps of a computation, so that a formula and its explanation stand in one place.
 * A closed ledger, as used in searches, discards them.
 */
public final class Ledger {
  private static final Ledger CLOSED = new Ledger(null);

  private final List<Step> steps;

  private Ledger(List<Step> steps) {
    this.steps = steps;
  }

  /** A ledger that keeps its steps. */
  public static Ledger open() {
    return new Ledger(new ArrayList<>());
  }

  /** A ledger that discards its steps. */
  public static Ledger closed() {
    return CLOSED;
  }

  /** Whether steps are kept. */
  public boolean isOpen() {
    return steps != null;
  }

  /**
   * One step of a computation.
   *
   * @param what what is computed, as a phrase
   * @param formula symbol and formula, such as {@code delta = d * sqrt(n1*n2/(n1+n2))}
   * @param value its value
   * @param terms symbols of the formula and their values, in turn
   */
  public void step(String what, String formula, double value, Object... terms) {
    if (steps == null) {
      return;
    }
    List<Step.Term> given = new ArrayList<>(terms.length / 2);
    for (int i = 0; i < terms.length; i += 2) {
      given.add(new Step.Term((String) terms[i], ((Number) terms[i + 1]).doubleValue()));
    }
    steps.add(new Step(what, formula, value, given));
  }

  /** Takes over a step that was written down elsewhere. */
  public void take(Step step) {
    if (steps != null) {
      steps.add(step);
    }
  }

  /** The steps so far, in order. */
  public List<Step> steps() {
    return steps == null ? List.of() : List.copyOf(steps);
  }
}
