package dev.holdfast.plan;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.List;
import java.util.Optional;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.constraints.AlphaChars;
import net.jqwik.api.constraints.StringLength;
import org.junit.jupiter.api.Test;

class NearestTest {
  private static final List<String> KEYS =
      List.of("sd", "sds", "sample", "sides", "test", "arrangement", "target-power");

  @Test
  void aSlipFindsTheWord() {
    assertEquals(Optional.of("arrangement"), Nearest.to("arrangment", KEYS));
    assertEquals(Optional.of("sides"), Nearest.to("sdies", KEYS));
    assertEquals(Optional.of("sds"), Nearest.to("sdss", KEYS));
  }

  @Test
  void caseAndTheKindOfHyphenDoNotCount() {
    assertEquals(Optional.of("target-power"), Nearest.to("Target_Power", KEYS));
    assertEquals(0, Nearest.distance("target power", "TARGET-POWER"));
  }

  @Test
  void aStrangeWordFindsNone() {
    assertEquals(Optional.empty(), Nearest.to("temperature", KEYS));
    assertEquals(Optional.empty(), Nearest.to("n", KEYS));
  }

  @Test
  void ofEquallyNearWordsTheFirstByAlphabetIsTaken() {
    assertEquals(Optional.of("sda"), Nearest.to("sd", List.of("sdb", "sda")));
  }

  @Test
  void theListIsCappedAndStartsWithTheNearest() {
    assertEquals(List.of("sides", "sds"), Nearest.first(2, "sidse", KEYS));
  }

  @Property
  void theDistanceIsSymmetricAndZeroOnlyForTheSame(
      @ForAll @AlphaChars @StringLength(max = 8) String one,
      @ForAll @AlphaChars @StringLength(max = 8) String other) {
    assertEquals(Nearest.distance(one, other), Nearest.distance(other, one));
    assertEquals(one.equalsIgnoreCase(other), Nearest.distance(one, other) == 0);
  }
}
