package dev.holdfast.report;

import dev.holdfast.plan.Characters;

/**
 * Makes text from a repository harmless for where it is shown. Titles, keys, units and paths are
 * written by strangers.
 */
public final class Safe {
  private Safe() {}

  /**
   * Text for a terminal or the log of a runner, on one line: control characters and characters that
   * turn the direction of writing are shown as escapes, and what a runner would take for a command
   * is broken.
   */
  public static String line(String text) {
    StringBuilder safe = new StringBuilder(text.length());
    text.codePoints().forEach(point -> append(safe, point));
    String shown = safe.toString();
    // Runners read "::name" at the start of a line and "##[name" anywhere as commands.
    return shown.replace("##[", "#\u200B#[").replaceFirst("^(\\s*):(?=:)", "$1:\u200B");
  }

  /**
   * A JSON document whose characters all show, for a terminal or the log of a runner: what does not
   * show can only stand within its strings, and is written there as an escape.
   */
  static String json(String document) {
    StringBuilder safe = new StringBuilder(document.length());
    document
        .codePoints()
        .forEach(
            point -> {
              if (point == '\n' || Characters.isVisible(point)) {
                safe.appendCodePoint(point);
              } else {
                for (char unit : Character.toChars(point)) {
                  escape(safe, unit);
                }
              }
            });
    return safe.toString().replace("##[", "#\\u0023[");
  }

  private static void append(StringBuilder safe, int point) {
    if (Characters.isVisible(point)) {
      safe.appendCodePoint(point);
    } else {
      escape(safe, point);
    }
  }

  private static void escape(StringBuilder safe, int number) {
    String digits = Integer.toHexString(number);
    safe.append("\\u").append("0".repeat(Math.max(0, 4 - digits.length()))).append(digits);
  }
}
