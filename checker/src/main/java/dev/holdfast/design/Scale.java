package dev.holdfast.design;

/** What kind of values an outcome takes. */
public enum Scale {
  CONTINUOUS("continuous"),
  BINARY("binary"),
  ORDERED("ordered"),
  CATEGORIES("categories"),
  COUNT("count"),
  TIME_TO_EVENT("time-to-event");

  private final String word;

  Scale(String word) {
    this.word = word;
  }

  /** The word of the plan file. */
  public String word() {
    return word;
  }
}
