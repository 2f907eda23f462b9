package dev.holdfast.design;

/**
 * The two coordinates that name a cell of the grid. A test's name is unique within an arrangement
 * over all scales; which scales the cell serves is the cell's own to say.
 *
 * @param arrangement arrangement of the comparison
 * @param test trade name of the test, kebab-case
 */
public record CellKey(Arrangement arrangement, String test) {
  @Override
  public String toString() {
    return arrangement.word() + "/" + test;
  }
}
