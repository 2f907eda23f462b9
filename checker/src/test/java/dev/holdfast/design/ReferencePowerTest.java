package dev.holdfast.design;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import dev.holdfast.design.catalogue.Catalogue;
import dev.holdfast.numeric.Reference;
import java.util.List;
import org.junit.jupiter.api.Test;

/**
 * Cells for shares and tables against powers computed to thirty digits by two routes, in the files
 * under {@code reference}: the exact tests by whole numbers, the chi-square tests by series.
 */
class ReferencePowerTest {
  private final Catalogue catalogue = Catalogue.standard();

  @Test
  void theExactBinomialTestHasItsEnumeratedPower() {
    int compared = 0;
    for (Reference.Row row : Reference.rows("exact_binomial.csv")) {
      boolean two = row.text("rule").equals("2");
      boolean up = row.number("p1") > row.number("p0");
      // Rule 3 cuts the two sides otherwise than this cell; rule 1 rejects for large counts only.
      if (row.text("rule").equals("3") || !two && !up) {
        continue;
      }
      Inputs inputs =
          new Given()
              .number("null-share", row.number("p0"))
              .number("share", row.number("p1"))
              .inputs();
      compare(
          "single-group",
          "exact-binomial",
          "binomial-enumerated",
          inputs,
          row,
          two,
          row.number("n"));
      compared++;
    }
    assertTrue(compared >= 90, "rows compared: " + compared);
  }

  @Test
  void fishersTestHasItsEnumeratedPower() {
    int compared = 0;
    for (Reference.Row row : Reference.rows("exact_fisher.csv")) {
      boolean two = row.text("rule").equals("3");
      if (!two && !(row.number("p1") > row.number("p2"))) {
        continue;
      }
      Inputs inputs =
          new Given().named("shares", "a", row.number("p1"), "b", row.number("p2")).inputs();
      compare(
          "parallel-groups",
          "fisher-exact",
          "fisher-enumerated",
          inputs,
          row,
          two,
          row.number("n1"),
          row.number("n2"));
      compared++;
    }
    assertTrue(compared >= 100, "rows compared: " + compared);
  }

  @Test
  void mcNemarsExactTestHasItsEnumeratedPower() {
    int compared = 0;
    for (Reference.Row row : Reference.rows("exact_mcnemar.csv")) {
      boolean two = row.text("rule").equals("2");
      if (!two && !(row.number("p10") > row.number("p01"))) {
        continue;
      }
      Inputs inputs =
          new Given().named("discordant", "a", row.number("p10"), "b", row.number("p01")).inputs();
      compare(
          "matched-pairs", "mcnemar", "conditional-enumerated", inputs, row, two, row.number("n"));
      compared++;
    }
    assertTrue(compared >= 100, "rows compared: " + compared);
  }

  @Test
  void theChiSquareTestOfFitHasItsNoncentralPower() {
    List<Reference.Row> rows = Reference.rows("power_chi2.csv");
    for (Reference.Row row : rows) {
      Inputs inputs =
          new Given()
              .number("w", row.number("w"))
              .number("categories", row.number("df") + 1)
              .inputs();
      compare(
          "single-group",
          "chi-square-goodness-of-fit",
          "noncentral-chi-square",
          inputs,
          row,
          true,
          row.number("n"));
    }
    assertTrue(rows.size() >= 100, "rows compared: " + rows.size());
  }

  private void compare(
      String arrangement,
      String test,
      String method,
      Inputs inputs,
      Reference.Row row,
      boolean two,
      double... sizes) {
    Cell cell = catalogue.find(arrangement, test).orElseThrow();
    Method by =
        cell.methods().stream().filter(each -> each.key().equals(method)).findFirst().orElseThrow();
    Level level = Level.of(row.number("alpha"), two ? Sides.TWO : Sides.ONE);
    double power = cell.assume(inputs).power(by, sizes, level, Ledger.closed());
    double expected = row.number("power");
    assertEquals(expected, power, 1e-11 * expected + 1e-300, () -> row.columns().toString());
  }
}
