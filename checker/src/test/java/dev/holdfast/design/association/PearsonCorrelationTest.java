package dev.holdfast.design.association;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import dev.holdfast.design.Effect;
import dev.holdfast.design.Given;
import dev.holdfast.design.InputException;
import dev.holdfast.design.Ledger;
import dev.holdfast.design.Level;
import dev.holdfast.design.Method;
import dev.holdfast.design.Sides;
import java.util.List;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.constraints.DoubleRange;
import org.apache.commons.statistics.distribution.NormalDistribution;
import org.junit.jupiter.api.Test;

class PearsonCorrelationTest {
  private final PearsonCorrelation cell = new PearsonCorrelation();

  @Property(tries = 100)
  void bothSignsTurnedThePowerIsTheSame(
      @ForAll @DoubleRange(min = -0.9, max = 0.9) double r,
      @ForAll @DoubleRange(min = -0.9, max = 0.9) double none) {
    for (Method method : cell.methods()) {
      for (Sides sides : Sides.values()) {
        assertEquals(power(method, r, none, 30, sides), power(method, -r, -none, 30, sides), 1e-11);
      }
    }
  }

  @Test
  void fishersZHasItsClosedForm() {
    NormalDistribution normal = NormalDistribution.of(0, 1);
    // artanh(0.5) = ln(3)/2, artanh(0.2) = ln(1.5)/2
    double shift = (Math.log(3) - Math.log(1.5)) / 2;
    double critical = normal.inverseSurvivalProbability(0.025);
    assertEquals(
        normal.cumulativeProbability(shift * Math.sqrt(49) - critical),
        power(PearsonCorrelation.FISHER, 0.5, 0.2, 52, Sides.TWO),
        1e-14);
    assertEquals(
        normal.cumulativeProbability((shift + 0.3 / 102) * Math.sqrt(49) - critical),
        power(PearsonCorrelation.FISHER_BIAS, 0.5, 0.2, 52, Sides.TWO),
        1e-14);
  }

  @Test
  void theBiasBringsFishersZNearerToTheExactPower() {
    double exact = power(PearsonCorrelation.EXACT, 0.4, 0, 40, Sides.TWO);
    double without = Math.abs(power(PearsonCorrelation.FISHER, 0.4, 0, 40, Sides.TWO) - exact);
    double with = Math.abs(power(PearsonCorrelation.FISHER_T, 0.4, 0, 40, Sides.TWO) - exact);
    assertEquals(0, with, without / 3);
  }

  @Test
  void aCorrelationOfOneIsRefused() {
    for (String key : List.of("r", "null-r")) {
      InputException thrown =
          assertThrows(
              InputException.class, () -> cell.assume(new Given().number(key, 1).inputs()));
      assertEquals(List.of(key), thrown.inputs());
    }
  }

  private double power(Method method, double r, double none, double n, Sides sides) {
    Effect effect = cell.assume(new Given().number("r", r).number("null-r", none).inputs());
    return effect.power(method, new double[] {n}, Level.of(0.05, sides), Ledger.closed());
  }
}
