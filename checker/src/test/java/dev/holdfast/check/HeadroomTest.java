package dev.holdfast.check;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import org.junit.jupiter.api.Test;

class HeadroomTest {
  private static List<Headroom> ofPower(String yaml) {
    return Plans.claim(Plans.checker(true).check(Plans.read(yaml)), "power").headroom();
  }

  private static Headroom of(List<Headroom> all, String quantity) {
    return all.stream().filter(room -> room.quantity().equals(quantity)).findFirst().orElseThrow();
  }

  private static Verdict at(String from, String to) {
    return Plans.claim(Plans.check(Plans.TWO_MEANS.replace(from, to)), "power").verdict();
  }

  @Test
  void aClaimStandsAtItsLimitAndFallsJustBeyondIt() {
    Headroom room = of(ofPower(Plans.TWO_MEANS), "score-sd");
    assertTrue(room.atMost());
    assertTrue(room.limit() > 10 && room.limit() < 10.2, room.toString());
    assertTrue(at("value: 10,", "value: " + room.limit() + ",").stands());
    assertFalse(at("value: 10,", "value: " + (room.limit() + 0.02) + ",").stands());
  }

  @Test
  void anEffectHasALeastValue() {
    Headroom room = of(ofPower(Plans.TWO_MEANS), "gain");
    assertTrue(!room.atMost() && room.limit() < 5, room.toString());
  }

  @Test
  void whatWouldMendAFallenClaimMendsIt() {
    String broken = Plans.TWO_MEANS.replace("value: 10,", "value: 11,");
    Headroom room = of(Plans.claim(Plans.check(broken), "power").headroom(), "score-sd");
    assertEquals(11, room.now());
    assertTrue(at("value: 10,", "value: " + room.limit() + ",").stands());
  }
}
