package dev.holdfast.design;

/** How the comparison is laid out. */
public enum Arrangement {
  SINGLE_GROUP("single-group", "one group"),
  MATCHED_PAIRS("matched-pairs", "matched pairs"),
  PARALLEL_GROUPS("parallel-groups", "parallel groups"),
  ASSOCIATION("association", "association of variables");

  private final String word;
  private final String title;

  Arrangement(String word, String title) {
    this.word = word;
    this.title = title;
  }

  /** The word of the plan file. */
  public String word() {
    return word;
  }

  /** The name in a sentence. */
  public String title() {
    return title;
  }
}
