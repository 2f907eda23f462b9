package dev.holdfast.design;

/** Whether a test rejects in one direction only. */
public enum Sides {
  ONE("one"),
  TWO("two");

  private final String word;

  Sides(String word) {
    this.word = word;
  }

  /** The word of the plan file. */
  public String word() {
    return word;
  }

  /**
   * Reads the word of the plan file.
   *
   * @throws IllegalArgumentException if it is neither {@code one} nor {@code two}
   */
  public static Sides of(String word) {
    for (Sides sides : values()) {
      if (sides.word.equals(word)) {
        return sides;
      }
    }
    throw new IllegalArgumentException("sides: '" + word + "' is neither one nor two");
  }
}
