package dev.holdfast.design;

/**
 * A key of a cell's {@code effect} section.
 *
 * @param name the key
 * @param form which form its value takes
 * @param meaning what it is, as a phrase
 */
public record InputSpec(String name, Form form, String meaning) {
  /** Forms of a value. */
  public enum Form {
    NUMBER("number"),
    BY_GROUP("number by group"),
    ROW("numbers"),
    TABLE("rows of numbers"),
    WORD("word");

    private final String title;

    Form(String title) {
      this.title = title;
    }

    /** The form as a phrase. */
    public String title() {
      return title;
    }
  }

  /** A single number. */
  public static InputSpec number(String name, String meaning) {
    return new InputSpec(name, Form.NUMBER, meaning);
  }

  /** Numbers by group. */
  public static InputSpec byGroup(String name, String meaning) {
    return new InputSpec(name, Form.BY_GROUP, meaning);
  }
}
