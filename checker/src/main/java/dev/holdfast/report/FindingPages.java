package dev.holdfast.report;

import dev.holdfast.check.FindingKind;
import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;

/** The documentation of the findings: a list, and a page each. */
public final class FindingPages {
  private FindingPages() {}

  /** Every finding with its weight and what it says. */
  public static String list() {
    StringBuilder text = new StringBuilder();
    for (FindingKind kind : FindingKind.values()) {
      text.append(pad(kind.word(), 24))
          .append(pad(kind.weight().word(), 8))
          .append(kind.summary())
          .append('\n');
    }
    return text.append("\nOne finding: holdfast findings NAME\n").toString();
  }

  /** The page of one finding. */
  public static String page(FindingKind kind) {
    String name = "/dev/holdfast/check/findings/" + kind.word() + ".md";
    try (InputStream in = FindingPages.class.getResourceAsStream(name)) {
      if (in == null) {
        throw new IllegalStateException("no page for the finding " + kind.word());
      }
      return new String(in.readAllBytes(), StandardCharsets.UTF_8);
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
  }

  private static String pad(String text, int width) {
    return text.length() >= width ? text + " " : text + " ".repeat(width - text.length());
  }
}
