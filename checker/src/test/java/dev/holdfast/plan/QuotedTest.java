package dev.holdfast.plan;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import org.junit.jupiter.api.Test;

class QuotedTest {
  @Test
  void whatCannotBeSeenIsShownByItsNumber() {
    assertEquals("'aU+000AbU+202EcU+2028'", Quoted.text("a\nb\u202Ec\u2028"));
    assertEquals("'é \uD83D\uDE00'", Quoted.text("é \uD83D\uDE00"));
  }

  @Test
  void aLongTextIsCut() {
    assertEquals("x".repeat(60) + "…", Quoted.plain("x".repeat(61)));
    assertEquals("x".repeat(60), Quoted.plain("x".repeat(60)));
  }

  @Property
  void aQuotedTextIsOneShortLine(@ForAll String text) {
    String quoted = Quoted.text(text);
    assertEquals(1, quoted.lines().count());
    assertTrue(quoted.length() < 600);
    assertTrue(quoted.codePoints().noneMatch(Character::isISOControl));
  }
}
