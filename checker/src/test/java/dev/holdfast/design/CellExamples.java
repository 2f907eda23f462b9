package dev.holdfast.design;

import dev.holdfast.design.catalogue.Catalogue;
import java.util.List;
import java.util.Map;

/** One assumed effect and one sample for every cell, that the contract of cells is tried on. */
final class CellExamples {
  private static final Map<String, Example> EXAMPLES =
      Map.ofEntries(
          of("single-group/student-t", given().number("difference", 3).number("sd", 8), 60),
          of("single-group/normal", given().number("difference", 3).number("sd", 8), 60),
          of("matched-pairs/student-t", given().number("d", 0.4), 55),
          of("matched-pairs/normal", given().number("d", 0.4), 55),
          of(
              "parallel-groups/student-t",
              given().number("difference", 4).number("sd", 8).groups("a", "b").weights(60.0, 90.0),
              60,
              90),
          of(
              "parallel-groups/welch-t",
              given()
                  .number("difference", 4)
                  .named("sds", "a", 6, "b", 9)
                  .groups("a", "b")
                  .weights(60.0, 90.0),
              60,
              90),
          of(
              "parallel-groups/normal",
              given().number("difference", 4).number("sd", 8).groups("a", "b").weights(60.0, 60.0),
              60,
              60),
          of(
              "parallel-groups/anova-f",
              given().number("f", 0.25).groups("a", "b", "c").weights(50.0, 50.0, 50.0),
              50,
              50,
              50),
          of(
              "single-group/exact-binomial",
              given().number("null-share", 0.3).number("share", 0.45),
              80),
          of(
              "single-group/proportion-z",
              given().number("null-share", 0.3).number("share", 0.18),
              90),
          of(
              "parallel-groups/pearson-chi-square",
              shares(0.30, 0.45).weights(140.0, 180.0),
              140,
              180),
          of("parallel-groups/proportion-z", shares(0.45, 0.30).weights(150.0, 150.0), 150, 150),
          of("parallel-groups/fisher-exact", shares(0.20, 0.45).weights(70.0, 50.0), 70, 50),
          of("parallel-groups/arcsine", shares(0.45, 0.30).weights(150.0, 150.0), 150, 150),
          of(
              "matched-pairs/mcnemar",
              given().named("discordant", "gained", 0.22, "lost", 0.1),
              160),
          of(
              "single-group/chi-square-goodness-of-fit",
              given().named("shares", "low", 0.2, "middle", 0.45, "high", 0.35),
              110),
          of(
              "parallel-groups/chi-square-homogeneity",
              given()
                  .table("cells", new double[] {0.2, 0.3, 0.5}, new double[] {0.35, 0.35, 0.3})
                  .groups("a", "b")
                  .weights(90.0, 90.0),
              90,
              90),
          of(
              "association/chi-square-independence",
              given().table("cells", new double[] {0.3, 0.2}, new double[] {0.2, 0.3}),
              180),
          of(
              "parallel-groups/log-rank",
              given().number("hazard-ratio", 0.65).groups("a", "b").weights(2.0, 1.0),
              170),
          of("association/pearson-r", given().number("r", 0.3), 80),
          of(
              "association/linear-regression",
              given().number("f-squared", 0.12).number("predictors", 4),
              110));

  private CellExamples() {}

  /**
   * What a cell is tried on.
   *
   * @param effect an effect that the sample detects with a power of about 0.7 to 0.9
   * @param sizes the sample
   */
  record Example(Inputs effect, double[] sizes) {}

  /** The example of a cell. */
  static Example of(Cell cell) {
    Example example = EXAMPLES.get(cell.key().toString());
    if (example == null) {
      throw new IllegalStateException("no example for " + cell.key());
    }
    return example;
  }

  /** Every cell. */
  static List<Cell> cells() {
    return Catalogue.standard().cells();
  }

  private static Given given() {
    return new Given();
  }

  private static Given shares(double first, double second) {
    return given().named("shares", "a", first, "b", second).groups("a", "b");
  }

  private static Map.Entry<String, Example> of(String cell, Given given, double... sizes) {
    return Map.entry(cell, new Example(given.inputs(), sizes));
  }
}
