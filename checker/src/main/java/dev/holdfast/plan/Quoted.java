package dev.holdfast.plan;

import java.util.Locale;

/** Text of a plan file as it may stand within a message: short, on one line, nothing invisible. */
final class Quoted {
  private static final int LONGEST = 60;

  private Quoted() {}

  /** The text between quotation marks. */
  static String text(String text) {
    return "'" + plain(text) + "'";
  }

  /** The text without quotation marks. */
  static String plain(String text) {
    StringBuilder out = new StringBuilder();
    int[] codePoints = text.codePoints().limit(LONGEST + 1L).toArray();
    for (int i = 0; i < Math.min(codePoints.length, LONGEST); i++) {
      int c = codePoints[i];
      if (Characters.isVisible(c)) {
        out.appendCodePoint(c);
      } else {
        out.append(codePoint(c));
      }
    }
    return codePoints.length > LONGEST ? out + "…" : out.toString();
  }

  /** The number of a character, such as {@code U+0007}. */
  static String codePoint(int c) {
    return String.format(Locale.ROOT, "U+%04X", c);
  }
}
