package dev.holdfast.numeric;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.constraints.IntRange;
import org.junit.jupiter.api.Test;

class QuadratureTest {

  @Property
  void gaussLegendreIsExactForPolynomials(@ForAll @IntRange(min = 1, max = 64) int order) {
    int degree = 2 * order - 1;
    double integral = GaussLegendre.of(order).integrate(x -> StrictMath.pow(x, degree), 0, 1);
    assertEquals(1.0 / (degree + 1), integral, 5e-14 / (degree + 1));
  }

  // Abramowitz and Stegun (1964), table 25.4, n = 5.
  // From memory, not looked up.
  @Test
  void gaussLegendreHasThePrintedNodes() {
    GaussLegendre rule = GaussLegendre.of(5);
    assertEquals(0.906179845938664, rule.node(4), 1e-15);
    assertEquals(0.538469310105683, rule.node(3), 1e-15);
    assertEquals(0, rule.node(2));
    assertEquals(0.236926885056189, rule.weight(4), 1e-15);
    assertEquals(0.568888888888889, rule.weight(2), 1e-15);
  }

  @Test
  void anOrderOfZeroIsRefused() {
    assertThrows(IllegalArgumentException.class, () -> GaussLegendre.of(0));
  }

  @Test
  void tanhSinhIntegratesAnInfiniteEnd() {
    Estimate half = TanhSinh.integrate((x, fromEnd) -> 1 / Math.sqrt(x), 0, 1, 1e-13);
    assertEquals(2, half.value(), 1e-12);
    assertTrue(half.error() < 1e-10, half::toString);
  }

  @Test
  void tanhSinhSeesTheDistanceToTheRightEnd() {
    // Near 1 the distance is known far more exactly than 1 - x.
    Estimate value =
        TanhSinh.integrate(
            (x, fromEnd) -> 1 / Math.sqrt(fromEnd < 0 ? -fromEnd : 1 - x), 0, 1, 1e-13);
    assertEquals(2, value.value(), 1e-12);
  }

  @Test
  void tanhSinhOwnsUpToAnIntegrandThatIsTooRough() {
    Estimate rough = TanhSinh.integrate(x -> x < 0.3 ? 0 : 1, 0, 1, 1e-13);
    assertTrue(Math.abs(rough.value() - 0.7) < 100 * rough.error(), rough::toString);
  }

  @Test
  void aUnimodalFunctionMayUnderflow() {
    double log =
        UnimodalQuadrature.log(
            x -> -5000 - 0.5 * x * x, Double.NEGATIVE_INFINITY, Double.POSITIVE_INFINITY, 3, 1);
    assertEquals(-5000 + 0.5 * StrictMath.log(2 * Math.PI), log, 1e-11);
  }

  @Test
  void aUnimodalFunctionMayPeakFarFromTheStart() {
    double log =
        UnimodalQuadrature.log(
            x -> -0.5 * (x - 1e5) * (x - 1e5),
            Double.NEGATIVE_INFINITY,
            Double.POSITIVE_INFINITY,
            0,
            1);
    assertEquals(0.5 * StrictMath.log(2 * Math.PI), log, 1e-12);
  }
}
