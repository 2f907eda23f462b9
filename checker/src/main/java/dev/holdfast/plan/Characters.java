package dev.holdfast.plan;

/** Which characters show. */
public final class Characters {
  private Characters() {}

  /**
   * Whether a character shows, and leaves the direction of the text alone. The ranges stand here
   * because those of the runtime follow its own version of Unicode.
   */
  public static boolean isVisible(int c) {
    boolean invisible =
        c < 0x20
            || c >= 0x7F && c < 0xA0
            || c == 0xAD
            || c == 0x61C
            || c == 0x180E
            || c >= 0x200B && c <= 0x200F
            || c >= 0x2028 && c <= 0x202E
            || c >= 0x2060 && c <= 0x206F
            || c >= 0xD800 && c <= 0xF8FF
            || c == 0xFEFF
            || c >= 0xFFF0 && c <= 0xFFFB
            || c >= 0xE0000
            || (c & 0xFFFE) == 0xFFFE;
    return !invisible;
  }
}
