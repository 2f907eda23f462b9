package dev.holdfast.check;

import dev.holdfast.plan.Place;
import java.util.List;

/**
 * Something found in a plan.
 *
 * @param kind its kind
 * @param weight what it does to the run
 * @param subject dotted path of what it concerns, such as {@code analyses.fatigue-lower}; may be
 *     empty
 * @param message what is wrong, as sentences; text of the plan in it is not yet made safe for any
 *     output
 * @param remedies what would mend it, each as a phrase
 * @param place where
 */
public record Finding(
    FindingKind kind,
    Weight weight,
    String subject,
    String message,
    List<String> remedies,
    Place place) {

  /** A finding of its kind's own weight. */
  public static Finding of(
      FindingKind kind, String subject, Place place, String message, String... remedies) {
    return new Finding(kind, kind.weight(), subject, message, List.of(remedies), place);
  }
}
