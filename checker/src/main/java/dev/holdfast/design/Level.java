package dev.holdfast.design;

import java.util.OptionalInt;

/**
 * The level of a test.
 *
 * @param alpha chance of a false rejection, in (0, 1), both sides together
 * @param sides one or two
 * @param zDecimals decimals to which normal quantiles were rounded, as in a calculation with 1.96
 *     and 0.84; empty for unrounded ones; only methods with a normal reference heed it
 */
public record Level(double alpha, Sides sides, OptionalInt zDecimals) {
  /** Checks the range of alpha. */
  public Level {
    if (!(alpha > 0 && alpha < 1)) {
      throw new IllegalArgumentException("alpha: " + alpha + " is not between 0 and 1");
    }
  }

  /** A level with unrounded quantiles. */
  public static Level of(double alpha, Sides sides) {
    return new Level(alpha, sides, OptionalInt.empty());
  }

  /** The level on the side of the assumed effect: alpha, or half of it for two sides. */
  public double perSide() {
    return sides == Sides.TWO ? alpha / 2 : alpha;
  }

  /** Whether the other side rejects too. */
  public boolean twoSided() {
    return sides == Sides.TWO;
  }
}
