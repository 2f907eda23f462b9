package dev.holdfast.design;

import java.util.Map;

/**
 * A published way to compute the power of a cell.
 *
 * @param key kebab-case name, unique in its cell; a plan's {@code method} may name it
 * @param title what it is, as it reads after "by"
 * @param reference key of the bibliography
 * @param conventions what a plan would state to ask for it; a plan that states otherwise rules it
 *     out
 * @param exact whether it gives the power of the test as it will be run, without approximation
 * @param realSizes whether it can be evaluated at sizes that are not whole, and rises with each of
 *     them; if not, sizes are whole and the power may saw up and down
 */
public record Method(
    String key,
    String title,
    String reference,
    Map<Convention, String> conventions,
    boolean exact,
    boolean realSizes) {

  /** Whether a plan that states these conventions can have used this method. */
  public boolean agreesWith(Map<Convention, String> stated) {
    for (Map.Entry<Convention, String> entry : stated.entrySet()) {
      String own = conventions.get(entry.getKey());
      if (own == null || !own.equals(entry.getValue())) {
        return false;
      }
    }
    return true;
  }
}
