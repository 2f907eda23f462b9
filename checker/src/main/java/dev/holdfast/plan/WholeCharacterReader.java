package dev.holdfast.plan;

import java.io.Reader;

/**
 * Hands out a text in pieces that never end within a character of two code units. The YAML scanner
 * fails on a piece that does, where it fills its buffer exactly.
 */
final class WholeCharacterReader extends Reader {
  private final String text;
  private int next;

  WholeCharacterReader(String text) {
    this.text = text;
  }

  @Override
  public int read(char[] buffer, int offset, int length) {
    if (next >= text.length()) {
      return -1;
    }
    int end = Math.min(text.length(), next + length);
    if (end < text.length() && end - next > 1 && Character.isHighSurrogate(text.charAt(end - 1))) {
      end--;
    }
    text.getChars(next, end, buffer, offset);
    int count = end - next;
    next = end;
    return count;
  }

  @Override
  public void close() {
    // Nothing is held.
  }
}
