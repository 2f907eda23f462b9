package dev.holdfast.design.association;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import dev.holdfast.design.Cell;
import dev.holdfast.design.Given;
import dev.holdfast.design.Inputs;
import dev.holdfast.design.Ledger;
import dev.holdfast.design.Level;
import dev.holdfast.design.Sides;
import dev.holdfast.numeric.Reference;
import java.util.List;
import org.junit.jupiter.api.Test;

/** Correlation and regression against powers computed to thirty digits by two routes. */
class AssociationReferenceTest {
  @Test
  void theExactTestOfACorrelationHasItsPower() {
    int compared = 0;
    for (Reference.Row row : Reference.rows("power_corr.csv")) {
      boolean two = row.text("tails").equals("2");
      // One-sided rows reject for large r only; the cell rejects on the side of the effect.
      if (!two && row.number("rho") < 0) {
        continue;
      }
      Inputs inputs = new Given().number("r", row.number("rho")).inputs();
      compare(new PearsonCorrelation(), inputs, row, two ? Sides.TWO : Sides.ONE);
      compared++;
    }
    assertTrue(compared >= 100, "rows compared: " + compared);
  }

  @Test
  void regressionWithFixedPredictorsHasItsPower() {
    List<Reference.Row> rows = Reference.rows("power_reg.csv");
    for (Reference.Row row : rows) {
      Inputs inputs =
          new Given()
              .number("f-squared", row.number("f2"))
              .number("predictors", row.number("p"))
              .number("tested-predictors", row.number("u"))
              .inputs();
      compare(new LinearRegression(), inputs, row, Sides.TWO);
    }
    assertTrue(rows.size() >= 100, "rows compared: " + rows.size());
  }

  private static void compare(Cell cell, Inputs inputs, Reference.Row row, Sides sides) {
    Level level = Level.of(row.number("alpha"), sides);
    double[] sizes = {row.number("n")};
    double power = cell.assume(inputs).power(cell.methods().get(0), sizes, level, Ledger.closed());
    double expected = row.number("power");
    assertEquals(expected, power, 1e-11 * expected, () -> row.columns().toString());
  }
}
