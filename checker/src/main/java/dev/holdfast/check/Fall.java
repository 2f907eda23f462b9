package dev.holdfast.check;

import dev.holdfast.plan.Place;
import java.util.List;
import java.util.OptionalDouble;

/**
 * What a claim was before an edit, and what moved.
 *
 * @param revision the revision compared with
 * @param before what was computed then
 * @param moved the quantities and figures that differ, those that matter most first
 */
public record Fall(String revision, double before, List<Move> moved) {
  /**
   * A figure that differs from the earlier revision.
   *
   * @param name name of the quantity, or dotted path of the figure
   * @param from as written then; empty if it is new
   * @param to as written now; empty if it is gone
   * @param restores what the claim would compute to if only this had not moved; empty where that
   *     has no answer, as for a word
   * @param place where it is written now
   */
  public record Move(String name, String from, String to, OptionalDouble restores, Place place) {}
}
