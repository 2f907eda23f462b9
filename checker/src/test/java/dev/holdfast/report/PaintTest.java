package dev.holdfast.report;

import static org.junit.jupiter.api.Assertions.assertEquals;

import dev.holdfast.check.Weight;
import java.util.HashMap;
import java.util.Map;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class PaintTest {
  @ParameterizedTest
  @CsvSource(
      nullValues = "-",
      value = {
        // wish, NO_COLOR, CLICOLOR_FORCE, CLICOLOR, TERM, terminal, coloured
        "auto,   -,  -, -, xterm, true,  true",
        "auto,   -,  -, -, xterm, false, false",
        "auto,   -,  -, -, -,     true,  true",
        "auto,   1,  -, -, xterm, true,  false",
        "auto,   '', -, -, xterm, true,  true",
        "auto,   1,  1, -, xterm, true,  false",
        "auto,   -,  1, -, xterm, false, true",
        "auto,   -,  0, -, xterm, false, false",
        "auto,   -,  '', -, xterm, false, false",
        "auto,   -,  1, 0, dumb,  false, true",
        "auto,   -,  -, 0, xterm, true,  false",
        "auto,   -,  -, 1, xterm, true,  true",
        "auto,   -,  -, -, dumb,  true,  false",
        "always, 1,  -, 0, dumb,  false, true",
        "never,  -,  1, 1, xterm, true,  false",
      })
  void whetherToColourFollowsTheUsualConventions(
      String wish,
      String noColor,
      String force,
      String clicolor,
      String term,
      boolean terminal,
      boolean coloured) {
    Map<String, String> environment = new HashMap<>();
    environment.put("NO_COLOR", noColor);
    environment.put("CLICOLOR_FORCE", force);
    environment.put("CLICOLOR", clicolor);
    environment.put("TERM", term);
    environment.values().removeIf(value -> value == null);
    assertEquals(coloured, Paint.wanted(wish, environment, terminal));
  }

  private static Paint coloured(String depth) {
    return Paint.of("always", Map.of("COLORTERM", depth), false);
  }

  @Test
  void aColourSurroundsTheWordAndNeverReplacesIt() {
    for (Weight weight : Weight.values()) {
      for (String depth : new String[] {"", "truecolor"}) {
        String text = coloured(depth).weight(weight);
        assertEquals(weight.word(), text.replaceAll("\u001B\\[[0-9;]*m", ""));
      }
      assertEquals(weight.word(), Paint.none().weight(weight));
    }
  }

  @Test
  void theColoursAreThoseOfOkabeAndItoWhereTheTerminalHasThem() {
    // Okabe and Ito (2008), Color universal design: vermilion, orange, sky blue.
    for (String depth : new String[] {"truecolor", "24bit"}) {
      Paint paint = coloured(depth);
      assertEquals("\u001B[38;2;213;94;0mblocks\u001B[0m", paint.weight(Weight.BLOCKS));
      assertEquals("\u001B[38;2;230;159;0mwarns\u001B[0m", paint.weight(Weight.WARNS));
      assertEquals("\u001B[38;2;86;180;233mnotes\u001B[0m", paint.weight(Weight.NOTES));
    }
  }

  @Test
  void elsewhereTheNearestOfTheCommonColoursStandForThem() {
    assertEquals("\u001B[38;5;166mblocks\u001B[0m", coloured("").weight(Weight.BLOCKS));
    assertEquals("\u001B[38;5;178mwarns\u001B[0m", coloured("").weight(Weight.WARNS));
    assertEquals("\u001B[38;5;74mnotes\u001B[0m", coloured("").weight(Weight.NOTES));
  }
}
