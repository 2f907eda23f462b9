package dev.holdfast.numeric;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.constraints.DoubleRange;
import org.junit.jupiter.api.Test;

class RootsTest {

  @Property
  void findsTheCubeRoot(@ForAll @DoubleRange(min = 0.01, max = 1e6) double cube) {
    double root = Roots.bracketed(x -> x * x * x - cube, 0, 1 + cube, 0);
    assertEquals(StrictMath.cbrt(cube), root, 4 * Math.ulp(root));
  }

  @Test
  void findsAStepToTheLastPlace() {
    double root = Roots.bracketed(x -> x < 0.3 ? -1 : 1, -10, 1e9, 0);
    assertEquals(0.3, root, 2 * Math.ulp(0.3));
  }

  @Test
  void takesTheEndsInEitherOrder() {
    assertEquals(2, Roots.bracketed(x -> x - 2, 5, -3, 0), 1e-15);
  }

  @Test
  void stopsAtTheAccuracyAskedFor() {
    int[] calls = {0};
    Roots.bracketed(
        x -> {
          calls[0]++;
          return StrictMath.exp(x) - 2;
        },
        0,
        10,
        1e-3);
    assertTrue(calls[0] < 15, () -> calls[0] + " calls");
  }

  @Test
  void refusesEndsOfOneSign() {
    IllegalArgumentException refused =
        assertThrows(
            IllegalArgumentException.class, () -> Roots.bracketed(x -> x * x + 1, -1, 1, 0));
    assertTrue(refused.getMessage().contains("signs must differ"), refused.getMessage());
  }
}
