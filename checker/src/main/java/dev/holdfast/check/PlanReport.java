package dev.holdfast.check;

import java.util.List;
import java.util.Optional;

/**
 * What a check of one plan came to.
 *
 * @param path the file's path as it is reported
 * @param study the study's id, or its title where it has none; empty for an invalid file
 * @param standing the plan as a whole
 * @param claims every claim with its verdict, in the order of the file
 * @param findings every finding, by place
 */
public record PlanReport(
    String path,
    Optional<String> study,
    Standing standing,
    List<ClaimResult> claims,
    List<Finding> findings) {

  /** What is said of a plan as a whole. */
  public enum Standing {
    /** Every claim stands and nothing blocks. */
    HOLDS("holds"),
    /** The file is no valid plan. */
    INVALID("invalid"),
    /** A claim is short. */
    SHORT("short"),
    /** A claim lies under the target. */
    UNMET("unmet"),
    /** Every claim stands, but something else blocks. */
    BLOCKED("blocked"),
    /** A claim could not be computed, or nothing is claimed. */
    NOT_COMPUTED("not-computed"),
    /** A claim follows only under a convention left unstated. */
    CONDITIONAL("conditional");

    private final String word;

    Standing(String word) {
      this.word = word;
    }

    /** The word of reports. */
    public String word() {
      return word;
    }
  }

  /** Number of findings of a weight. */
  public long count(Weight weight) {
    return findings.stream().filter(finding -> finding.weight() == weight).count();
  }
}
