package dev.holdfast.plan;

import java.nio.ByteBuffer;
import java.nio.CharBuffer;
import java.nio.charset.CharsetDecoder;
import java.nio.charset.CoderResult;
import java.nio.charset.CodingErrorAction;
import java.nio.charset.StandardCharsets;
import java.util.Arrays;

/**
 * The text of a file by lines and code points, as the YAML parser counts them: LF, CR LF and a lone
 * CR end a line, a byte order mark at the start is no column.
 */
final class SourceText {
  private final String text;
  private final int[] codePoints;
  private final int[] lineStarts;

  private SourceText(String text) {
    this.text = text;
    codePoints = text.codePoints().toArray();
    int[] found = new int[codePoints.length + 1];
    int count = 1;
    for (int i = 0; i < codePoints.length; i++) {
      boolean crBeforeLf =
          codePoints[i] == '\r' && i + 1 < codePoints.length && codePoints[i + 1] == '\n';
      if (codePoints[i] == '\n' || codePoints[i] == '\r' && !crBeforeLf) {
        found[count++] = i + 1;
      }
    }
    lineStarts = Arrays.copyOf(found, count);
  }

  /** Decodes a file; refuses what is not UTF-8 and what YAML allows nowhere. */
  static SourceText of(byte[] bytes) throws Malformed {
    ByteBuffer in = ByteBuffer.wrap(bytes);
    CharBuffer out = CharBuffer.allocate(bytes.length);
    CharsetDecoder decoder =
        StandardCharsets.UTF_8
            .newDecoder()
            .onMalformedInput(CodingErrorAction.REPORT)
            .onUnmappableCharacter(CodingErrorAction.REPORT);
    CoderResult result = decoder.decode(in, out, true);
    String decoded = out.flip().toString();
    SourceText text = new SourceText(decoded.startsWith("\uFEFF") ? decoded.substring(1) : decoded);
    if (result.isError()) {
      throw new Malformed(
          startsAsUtf16(bytes)
              ? "The file is written in UTF-16."
              : "Byte " + (in.position() + 1) + " of the file is not UTF-8.",
          "Save the file as UTF-8.",
          text.place(text.codePoints.length));
    }
    text.refuseControlCharacters();
    return text;
  }

  private static boolean startsAsUtf16(byte[] bytes) {
    return bytes.length >= 2
        && (bytes[0] == (byte) 0xFE && bytes[1] == (byte) 0xFF
            || bytes[0] == (byte) 0xFF && bytes[1] == (byte) 0xFE);
  }

  private void refuseControlCharacters() throws Malformed {
    for (int i = 0; i < codePoints.length; i++) {
      int c = codePoints[i];
      boolean allowedControl = c == '\t' || c == '\n' || c == '\r' || c == 0x85;
      if (Character.isISOControl(c) && !allowedControl || c == 0xFFFE || c == 0xFFFF) {
        throw new Malformed(
            "The character " + Quoted.codePoint(c) + " may not stand in a plan.",
            "Remove it.",
            place(i));
      }
    }
  }

  String text() {
    return text;
  }

  /** The character at a place, or -1 at the end of the text. */
  int at(Place place) {
    if (place.line() > lineStarts.length) {
      return -1;
    }
    int index = lineStarts[place.line() - 1] + place.column() - 1;
    return index < codePoints.length ? codePoints[index] : -1;
  }

  private Place place(int index) {
    int found = Arrays.binarySearch(lineStarts, index);
    int line = found >= 0 ? found : -found - 2;
    return new Place(line + 1, index - lineStarts[line] + 1, "");
  }
}
