package dev.holdfast.plan;

import java.util.Optional;

/**
 * A figure that a plan claims to follow from its assumptions.
 *
 * @param kind {@code power}, {@code sample}, {@code total}, {@code enrol}, {@code events}, {@code
 *     clusters}, {@code size}, {@code detectable}, {@code width}; for a family {@code every},
 *     {@code any}, {@code expected}
 * @param group the group of a {@code sample} claim
 * @param relation how the figure is meant
 * @param figure the figure
 * @param metric the metric of a {@code detectable} claim, when stated
 */
public record Claim(
    String kind, Optional<String> group, Relation relation, Figure figure, Optional<Word> metric) {

  /** How a claimed figure is meant. */
  public enum Relation {
    /** This figure, to its written decimals. */
    IS,
    /** This figure or more. */
    AT_LEAST,
    /** A round figure. */
    ABOUT
  }
}
