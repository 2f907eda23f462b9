package dev.holdfast.numeric;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.math.BigDecimal;
import java.math.MathContext;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.constraints.DoubleRange;

class DoubleDoubleTest {
  private static final MathContext DIGITS = new MathContext(60);

  @Property
  void sumsAndProductsOfDoublesAreExact(
      @ForAll @DoubleRange(min = -1e9, max = 1e9) double a,
      @ForAll @DoubleRange(min = -1e3, max = 1e3) double b) {
    assertEquals(0, exact(a).add(exact(b)).compareTo(exact(DoubleDouble.sum(a, b))));
    assertEquals(
        0,
        exact(a / 3).multiply(exact(b / 7)).compareTo(exact(DoubleDouble.product(a / 3, b / 7))));
  }

  @Property
  void arithmeticKeepsThirtyDigits(
      @ForAll @DoubleRange(min = 0.01, max = 1e6) double a,
      @ForAll @DoubleRange(min = 0.01, max = 1e6) double b) {
    DoubleDouble x = DoubleDouble.quotient(a, 3);
    DoubleDouble y = DoubleDouble.quotient(b, 7);
    checkClose(exact(x).add(exact(y)), x.plus(y));
    checkClose(exact(x).multiply(exact(y)), x.times(y));
    checkClose(exact(x).divide(exact(y), DIGITS), x.dividedBy(y));
    checkClose(exact(x).multiply(exact(b)), x.times(b));
  }

  private static void checkClose(BigDecimal wanted, DoubleDouble found) {
    double error = exact(found).subtract(wanted).divide(wanted, DIGITS).abs().doubleValue();
    assertTrue(error < 1e-30, () -> "relative error " + error);
  }

  private static BigDecimal exact(double value) {
    return new BigDecimal(value);
  }

  private static BigDecimal exact(DoubleDouble value) {
    return exact(value.hi()).add(exact(value.lo()));
  }
}
