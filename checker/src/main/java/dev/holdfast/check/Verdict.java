package dev.holdfast.check;

/** What became of a claim. */
public enum Verdict {
  /** The assumptions give what is claimed. */
  HOLDS("holds"),
  /** They do under a convention that the plan does not state. */
  CONDITIONAL("conditional"),
  /** More is claimed than the assumptions give. */
  SHORT("short"),
  /** The assumptions give clearly more than is claimed. */
  UNDERSTATED("understated"),
  /** The figure follows, but lies under the target. */
  UNMET("unmet"),
  /** Something needed is missing, or the claim cannot be computed yet. */
  NOT_COMPUTED("not-computed");

  private final String word;

  Verdict(String word) {
    this.word = word;
  }

  /** The word of reports. */
  public String word() {
    return word;
  }

  /** Whether a plan with such a claim still holds. */
  public boolean stands() {
    return this == HOLDS || this == UNDERSTATED;
  }
}
