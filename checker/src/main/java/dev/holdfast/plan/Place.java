package dev.holdfast.plan;

/**
 * Where something stands in a plan file.
 *
 * @param line line, from 1
 * @param column column in code points, from 1
 * @param pointer JSON Pointer (RFC 6901) of the value, {@code ""} for the whole document
 */
public record Place(int line, int column, String pointer) implements Comparable<Place> {
  /** The first character of a file, for what concerns the file as a whole. */
  public static final Place START = new Place(1, 1, "");

  @Override
  public int compareTo(Place other) {
    int byLine = Integer.compare(line, other.line);
    if (byLine != 0) {
      return byLine;
    }
    int byColumn = Integer.compare(column, other.column);
    return byColumn != 0 ? byColumn : pointer.compareTo(other.pointer);
  }
}
