package dev.holdfast.plan;

import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.List;

/** The plans under {@code src/test/resources/plans}, and short ways to read a text. */
final class Plans {
  static final List<String> NAMES =
      List.of("bare", "choir-school", "orchard-thinning", "tide-gauge");

  private static final PlanReader READER = new PlanReader(new Schemas());

  private Plans() {}

  static String text(String name) {
    String file = "/plans/" + name + ".study-plan.yaml";
    try (InputStream in = Plans.class.getResourceAsStream(file)) {
      return new String(in.readAllBytes(), StandardCharsets.UTF_8);
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
  }

  static Plan plan(String name) {
    return read(text(name)).plan().orElseThrow();
  }

  static PlanReading read(String text) {
    return read(text.getBytes(StandardCharsets.UTF_8));
  }

  static PlanReading read(byte[] bytes) {
    return READER.read("study-plan.yaml", bytes);
  }

  /** A plan with one passage replaced, which must be there. */
  static String changed(String name, String from, String to) {
    String text = text(name);
    if (!text.contains(from)) {
      throw new IllegalArgumentException("no '" + from + "' in " + name);
    }
    return text.replaceFirst(
        java.util.regex.Pattern.quote(from), java.util.regex.Matcher.quoteReplacement(to));
  }

  /** Problems as lines of line:column, message and remedy. */
  static List<String> told(PlanReading reading) {
    return reading.problems().stream()
        .map(
            p ->
                p.place().line()
                    + ":"
                    + p.place().column()
                    + " "
                    + p.message()
                    + " | "
                    + p.remedy())
        .toList();
  }
}
