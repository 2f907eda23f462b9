package dev.holdfast.design.continuous;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import dev.holdfast.design.Cell;
import dev.holdfast.design.Given;
import dev.holdfast.design.Inputs;
import dev.holdfast.design.Ledger;
import dev.holdfast.design.Level;
import dev.holdfast.design.Sides;
import dev.holdfast.numeric.Reference;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import org.junit.jupiter.api.Test;

/** Tests of means against powers computed to thirty digits by two routes. */
class MeansReferenceTest {
  @Test
  void studentsTestOfOneGroupHasItsPower() {
    int compared = 0;
    for (Reference.Row row : Reference.rows("power_t1.csv")) {
      if (comparable(row)) {
        Inputs inputs = new Given().number("d", row.number("d")).inputs();
        compare(new OneMeanStudent(), inputs, row, row.number("n"));
        compare(new PairedMeansStudent(), inputs, row, row.number("n"));
        compared++;
      }
    }
    assertTrue(compared >= 100, "rows compared: " + compared);
  }

  @Test
  void studentsTestOfTwoGroupsHasItsPower() {
    int compared = 0;
    for (Reference.Row row : Reference.rows("power_t2.csv")) {
      if (comparable(row)) {
        Inputs inputs = new Given().number("d", row.number("d")).inputs();
        compare(new ParallelMeansStudent(), inputs, row, row.number("n1"), row.number("n2"));
        compared++;
      }
    }
    assertTrue(compared >= 100, "rows compared: " + compared);
  }

  @Test
  void analysisOfVarianceHasItsPower() {
    List<Reference.Row> rows = Reference.rows("power_anova.csv");
    for (Reference.Row row : rows) {
      double[] means = numbers(row.text("means"));
      double[] sizes = numbers(row.text("ns"));
      Object[] named = new Object[2 * means.length];
      List<String> groups = new ArrayList<>();
      for (int i = 0; i < means.length; i++) {
        groups.add("group" + i);
        named[2 * i] = "group" + i;
        named[2 * i + 1] = means[i];
      }
      Inputs inputs =
          new Given()
              .named("means", named)
              .number("sd", row.number("sigma"))
              .groups(groups.toArray(String[]::new))
              .weights(Arrays.stream(sizes).boxed().toArray(Double[]::new))
              .inputs();
      power(new GroupMeansAnova(), inputs, Level.of(row.number("alpha"), Sides.TWO), row, sizes);
    }
    assertTrue(rows.size() >= 100, "rows compared: " + rows.size());
  }

  /** One-sided rows reject for large values only; the cells reject on the side of the effect. */
  private static boolean comparable(Reference.Row row) {
    return row.text("tails").equals("2") || row.number("d") >= 0;
  }

  private static void compare(Cell cell, Inputs inputs, Reference.Row row, double... sizes) {
    Sides sides = row.text("tails").equals("2") ? Sides.TWO : Sides.ONE;
    power(cell, inputs, Level.of(row.number("alpha"), sides), row, sizes);
  }

  private static void power(
      Cell cell, Inputs inputs, Level level, Reference.Row row, double... sizes) {
    double power = cell.assume(inputs).power(cell.methods().get(0), sizes, level, Ledger.closed());
    double expected = row.number("power");
    assertEquals(expected, power, 1e-11 * expected, () -> row.columns().toString());
  }

  private static double[] numbers(String text) {
    return Arrays.stream(text.split(" ")).mapToDouble(Double::parseDouble).toArray();
  }
}
