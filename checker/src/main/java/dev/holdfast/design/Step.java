package dev.holdfast.design;

import java.util.List;

/**
 * One step of a computation.
 *
 * @param what what is computed, as a phrase
 * @param formula symbol and formula; symbols are letters and digits, starting with a letter
 * @param value its value
 * @param terms the symbols of the formula that have a value, in order
 */
public record Step(String what, String formula, double value, List<Term> terms) {
  /** A symbol and its value. */
  public record Term(String symbol, double value) {}
}
