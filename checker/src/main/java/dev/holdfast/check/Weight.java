package dev.holdfast.check;

/** What a finding does to a run. Heavier first. */
public enum Weight {
  /** The run fails. */
  BLOCKS("blocks"),
  /** Worth a look; the run does not fail. */
  WARNS("warns"),
  /** For information. */
  NOTES("notes");

  private final String word;

  Weight(String word) {
    this.word = word;
  }

  /** The word of reports and policies. */
  public String word() {
    return word;
  }
}
