package dev.holdfast.numeric;

import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import java.util.function.Function;
import java.util.function.ToDoubleFunction;
import org.junit.jupiter.api.Test;

/**
 * The sample correlation and the exact tests against values computed to thirty digits by two
 * routes, the smaller tail by its relative error; the table of errors by region is left in {@code
 * target/accuracy}.
 */
class ExactAccuracyTest {
  private static final double WANTED = 1e-12;

  private record Tails(double lower, double upper) {}

  private static void tails(String file, Function<Reference.Row, Tails> function)
      throws IOException {
    Map<String, List<Double>> errors = new TreeMap<>();
    for (Reference.Row row : Reference.rows(file)) {
      Tails computed = function.apply(row);
      double lower = row.number("cdf");
      double upper = row.number("sf");
      double smaller = lower < upper ? computed.lower() / lower : computed.upper() / upper;
      double larger = lower < upper ? computed.upper() - upper : computed.lower() - lower;
      errors
          .computeIfAbsent(row.text("region"), each -> new ArrayList<>())
          .add(Math.max(Math.abs(smaller - 1), Math.abs(larger)));
    }
    judge(file, errors);
  }

  private static void powers(
      String file, String column, ToDoubleFunction<Reference.Row> function, String rules)
      throws IOException {
    Map<String, List<Double>> errors = new TreeMap<>();
    for (Reference.Row row : Reference.rows(file)) {
      if (!rules.isEmpty() && !rules.contains(row.text("rule"))) {
        continue;
      }
      double computed = function.applyAsDouble(row);
      double power = row.number(column);
      errors
          .computeIfAbsent(row.text("region"), each -> new ArrayList<>())
          .add(power == 0 ? Math.abs(computed) : Math.abs(computed / power - 1));
    }
    judge(file, errors);
  }

  private static void judge(String file, Map<String, List<Double>> errors) throws IOException {
    StringBuilder table = new StringBuilder();
    double worst = 0;
    for (Map.Entry<String, List<Double>> region : errors.entrySet()) {
      List<Double> sorted = region.getValue().stream().sorted().toList();
      double largest = sorted.get(sorted.size() - 1);
      worst = Math.max(worst, largest);
      table.append(
          String.format(
              java.util.Locale.ROOT,
              "| %s | %s | %d | %.1e | %.1e |%n",
              file,
              region.getKey(),
              sorted.size(),
              sorted.get(sorted.size() / 2),
              largest));
    }
    Path folder = Path.of("target", "accuracy");
    Files.createDirectories(folder);
    Files.writeString(folder.resolve(file.replace(".csv", ".md")), table.toString());
    assertTrue(worst <= WANTED, table.toString());
  }

  @Test
  void sampleCorrelation() throws IOException {
    tails(
        "corr.csv",
        row -> {
          SampleCorrelationDistribution law =
              SampleCorrelationDistribution.of(row.number("n"), row.number("rho"));
          double r = row.number("r");
          return new Tails(law.cumulativeProbability(r), law.survivalProbability(r));
        });
  }

  @Test
  void exactBinomialTest() throws IOException {
    powers(
        "exact_binomial.csv",
        "power",
        row ->
            ExactTests.binomial(
                (long) row.number("n"),
                row.number("p0"),
                row.number("p1"),
                row.number("alpha"),
                row.text("rule").equals("2"),
                true),
        "12");
  }

  @Test
  void fishersExactTest() throws IOException {
    powers(
        "exact_fisher.csv",
        "power",
        row ->
            ExactTests.fisher(
                (long) row.number("n1"),
                (long) row.number("n2"),
                row.number("p1"),
                row.number("p2"),
                row.number("alpha"),
                row.text("rule").equals("3")),
        "13");
  }

  @Test
  void exactMcNemarTest() throws IOException {
    powers(
        "exact_mcnemar.csv",
        "power",
        row ->
            ExactTests.mcNemar(
                (long) row.number("n"),
                row.number("p10"),
                row.number("p01"),
                row.number("alpha"),
                row.text("rule").equals("2")),
        "12");
  }
}
