package dev.holdfast.report;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;
import static org.junit.jupiter.params.provider.Arguments.arguments;

import java.util.List;
import java.util.regex.Pattern;
import net.jqwik.api.Arbitraries;
import net.jqwik.api.Arbitrary;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.Provide;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.MethodSource;

class SafeTest {
  private static final Pattern HARMLESS =
      Pattern.compile(
          "[^\\p{Cc}\\u2028\\u2029\\u202A-\\u202E\\u2066-\\u2069\\u200E\\u200F\\uFEFF]*");

  static List<Arguments> texts() {
    return List.of(
        arguments("plain title, (0.90) & 50 %", "plain title, (0.90) & 50 %"),
        arguments("Søvn i Tromsø — 睡眠 🐑", "Søvn i Tromsø — 睡眠 🐑"),
        arguments("a\u001B[31mred", "a\\u001b[31mred"),
        arguments("two\nlines", "two\\u000alines"),
        arguments("tab\tback\b\r", "tab\\u0009back\\u0008\\u000d"),
        arguments("c1\u009B2J", "c1\\u009b2J"),
        arguments("abc\u202Edef", "abc\\u202edef"),
        arguments("zero\u200Bwidth", "zero\\u200bwidth"),
        arguments("tag\uDB40\uDC41", "tag\\ue0041"),
        arguments("half\uD83D", "half\\ud83d"),
        arguments("a::b", "a::b"));
  }

  @ParameterizedTest
  @MethodSource("texts")
  void whatDoesNotShowIsShownAsItsNumber(String text, String shown) {
    assertEquals(shown, Safe.line(text));
  }

  @ParameterizedTest
  @CsvSource({
    "::error file=a::b",
    "'  ::set-output name=x::y'",
    "::::",
    "##[error]x",
    "'a title ##[command]x'",
    "####[group]"
  })
  void whatARunnerWouldTakeForACommandIsBroken(String text) {
    String safe = Safe.line(text);
    assertFalse(isCommand(safe), safe);
    assertEquals(text, safe.replace("\u200B", ""), "nothing but the break is added");
  }

  @Property
  void noTextComesThroughThatMovesThePenOrCommandsARunner(@ForAll("hostile") String text) {
    String safe = Safe.line(text);
    assertTrue(HARMLESS.matcher(safe).matches(), safe);
    assertFalse(isCommand(safe), safe);
  }

  @Provide
  Arbitrary<String> hostile() {
    return Arbitraries.oneOf(
        Arbitraries.strings().all().ofMaxLength(30),
        Arbitraries.of(
                ":", "::", "#", "##[", " ", "\t", "\u001B", "\u202E", "\u2028", "x", "\uD83D")
            .list()
            .ofMaxSize(12)
            .map(parts -> String.join("", parts)));
  }

  /** As the runner reads a line: white space is cut off before it. */
  private static boolean isCommand(String line) {
    return line.strip().startsWith("::") || line.contains("##[");
  }
}
