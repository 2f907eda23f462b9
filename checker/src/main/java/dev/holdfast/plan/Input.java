package dev.holdfast.plan;

import java.util.List;
import java.util.Map;

/** What a key of an {@code effect} section holds; which forms a key may take is its cell's say. */
public sealed interface Input {
  /** Where the value is written. */
  Place place();

  /** One number, or the name of a quantity. */
  record One(Figure figure) implements Input {
    @Override
    public Place place() {
      return figure.place();
    }
  }

  /** Numbers by name, in the order of the file, such as means by group. */
  record Named(Map<String, Figure> figures, Place place) implements Input {}

  /** Numbers in a row. */
  record Row(List<Figure> figures, Place place) implements Input {}

  /** Numbers in rows of equal length. */
  record Table(List<List<Figure>> rows, Place place) implements Input {}

  /** A word from a closed set. */
  record Word(String word, Place place) implements Input {}
}
