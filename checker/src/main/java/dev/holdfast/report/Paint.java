package dev.holdfast.report;

import dev.holdfast.check.Weight;
import java.util.Map;

/**
 * Colours for a terminal, from the palette of Okabe and Ito (2008), or none. A colour never stands
 * alone: the word it colours says the same.
 */
public final class Paint {
  private static final String RESET = "\u001B[0m";
  private static final String BOLD = "\u001B[1m";

  /** A colour of the palette, and the nearest of the 256 that every terminal knows. */
  private enum Colour {
    VERMILION("38;2;213;94;0", "38;5;166"),
    ORANGE("38;2;230;159;0", "38;5;178"),
    SKY_BLUE("38;2;86;180;233", "38;5;74"),
    BLUISH_GREEN("38;2;0;158;115", "38;5;36");

    private final String full;
    private final String indexed;

    Colour(String full, String indexed) {
      this.full = full;
      this.indexed = indexed;
    }
  }

  private final boolean coloured;
  private final boolean full;

  private Paint(boolean coloured, boolean full) {
    this.coloured = coloured;
    this.full = full;
  }

  /** No colours. */
  public static Paint none() {
    return new Paint(false, false);
  }

  /**
   * Colours where they are wanted, exact where {@code COLORTERM} says that the terminal can.
   *
   * @param wish {@code always}, {@code never} or {@code auto}, as the user said
   * @param environment the environment
   * @param terminal whether the output is a terminal
   */
  public static Paint of(String wish, Map<String, String> environment, boolean terminal) {
    String depth = environment.getOrDefault("COLORTERM", "");
    return new Paint(
        wanted(wish, environment, terminal), depth.equals("truecolor") || depth.equals("24bit"));
  }

  /**
   * Whether to colour, by the usual conventions: {@code NO_COLOR} not empty forbids; {@code
   * CLICOLOR_FORCE} other than 0 forces; {@code CLICOLOR=0} or {@code TERM=dumb} forbids; otherwise
   * a terminal decides.
   *
   * @param wish {@code always}, {@code never} or {@code auto}, as the user said
   * @param environment the environment
   * @param terminal whether the output is a terminal
   */
  static boolean wanted(String wish, Map<String, String> environment, boolean terminal) {
    if (!wish.equals("auto")) {
      return wish.equals("always");
    }
    if (!environment.getOrDefault("NO_COLOR", "").isEmpty()) {
      return false;
    }
    String force = environment.getOrDefault("CLICOLOR_FORCE", "");
    if (!force.isEmpty() && !force.equals("0")) {
      return true;
    }
    if ("0".equals(environment.get("CLICOLOR")) || "dumb".equals(environment.get("TERM"))) {
      return false;
    }
    return terminal;
  }

  String weight(Weight weight) {
    return switch (weight) {
      case BLOCKS -> in(Colour.VERMILION, weight.word());
      case WARNS -> in(Colour.ORANGE, weight.word());
      case NOTES -> in(Colour.SKY_BLUE, weight.word());
    };
  }

  String good(String text) {
    return in(Colour.BLUISH_GREEN, text);
  }

  String bad(String text) {
    return in(Colour.VERMILION, text);
  }

  String strong(String text) {
    return coloured ? BOLD + text + RESET : text;
  }

  private String in(Colour colour, String text) {
    return coloured ? "\u001B[" + (full ? colour.full : colour.indexed) + "m" + text + RESET : text;
  }
}
