package dev.holdfast.design;

import java.io.IOException;
import java.io.InputStream;
import java.io.InputStreamReader;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.Properties;
import java.util.Set;
import java.util.TreeSet;

/** The literature that the methods rest on, by key. */
public final class Bibliography {
  private final Properties entries = new Properties();

  private Bibliography() {}

  /** The bibliography of the program. */
  public static Bibliography standard() {
    Bibliography bibliography = new Bibliography();
    try (InputStream in = Bibliography.class.getResourceAsStream("bibliography.properties");
        InputStreamReader reader = new InputStreamReader(in, StandardCharsets.UTF_8)) {
      bibliography.entries.load(reader);
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
    return bibliography;
  }

  /**
   * An entry.
   *
   * @throws IllegalArgumentException if there is none of that key
   */
  public String entry(String key) {
    String entry = entries.getProperty(key);
    if (entry == null) {
      throw new IllegalArgumentException("the bibliography has no entry " + key);
    }
    return entry;
  }

  /** All keys, sorted. */
  public Set<String> keys() {
    return new TreeSet<>(entries.stringPropertyNames());
  }
}
