package dev.holdfast.design;

/**
 * How many entries the sample of a cell has, and what they count.
 *
 * @param least fewest groups
 * @param most most groups
 * @param smallest smallest size of a group for which the test exists
 * @param unit what a size counts
 */
public record Arms(int least, int most, int smallest, Unit unit) {
  /** One sample. */
  public static Arms one(int smallest, Unit unit) {
    return new Arms(1, 1, smallest, unit);
  }

  /** Two groups. */
  public static Arms two(int smallest) {
    return new Arms(2, 2, smallest, Unit.PARTICIPANTS);
  }
}
