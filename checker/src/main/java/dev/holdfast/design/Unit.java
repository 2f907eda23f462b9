package dev.holdfast.design;

/** What the sizes of a sample count. */
public enum Unit {
  PARTICIPANTS("participant", "participants"),
  PAIRS("pair", "pairs"),
  EVENTS("event", "events");

  private final String one;
  private final String many;

  Unit(String one, String many) {
    this.one = one;
    this.many = many;
  }

  /** The word for a number of them. */
  public String word(double number) {
    return number == 1 ? one : many;
  }
}
