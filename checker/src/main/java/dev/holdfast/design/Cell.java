package dev.holdfast.design;

import java.util.List;
import java.util.Set;

/**
 * A cell of the grid of study designs: an arrangement and a test, on one or more scales. A cell
 * says what is its own: its inputs, how an effect follows from them, and the power of that effect
 * by each published method. The search for the least sample and for the smallest detectable effect,
 * rounding and explanation are written once for all cells.
 */
public interface Cell {
  /** Its coordinates. */
  CellKey key();

  /** The scales of outcome that it serves. */
  Set<Scale> scales();

  /** Its name, as a phrase: "two parallel groups, Student's t test". */
  String title();

  /** What the test asks, as a sentence. */
  String question();

  /** The keys of its {@code effect} section. */
  List<InputSpec> inputs();

  /**
   * The methods that compute its power. The first is the plain one of the test: the method that a
   * plan without conventions is held to.
   */
  List<Method> methods();

  /** The groups of its sample. */
  Arms arms();

  /**
   * Builds the assumed effect.
   *
   * @throws InputException if something needed is missing, or something given cannot be
   */
  Effect assume(Inputs inputs);

  /** The best method there is: the exact one, or the plain one where no exact one exists. */
  default Method best() {
    return methods().stream().filter(Method::exact).findFirst().orElse(methods().get(0));
  }
}
