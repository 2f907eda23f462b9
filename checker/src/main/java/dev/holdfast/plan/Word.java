package dev.holdfast.plan;

/**
 * A word of a plan with its place: a name that refers to something, or a member of a closed set.
 *
 * @param text the word
 * @param place where it is written
 */
public record Word(String text, Place place) {
  @Override
  public String toString() {
    return text;
  }
}
