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
import org.apache.commons.statistics.distribution.ChiSquaredDistribution;
import org.apache.commons.statistics.distribution.FDistribution;
import org.apache.commons.statistics.distribution.TDistribution;
import org.junit.jupiter.api.Test;

/**
 * Every function against values computed to thirty digits by two routes, the smaller tail by its
 * relative error; the table of errors by region is left in {@code target/accuracy}.
 */
class ReferenceValuesTest {
  private static final double WANTED = 1e-12;

  private record Tails(double lower, double upper) {}

  private static void tails(String file, Function<Reference.Row, Tails> function)
      throws IOException {
    tails(file, "cdf", "sf", function);
  }

  private static void tails(
      String file, String lowerColumn, String upperColumn, Function<Reference.Row, Tails> function)
      throws IOException {
    Map<String, List<Double>> errors = new TreeMap<>();
    for (Reference.Row row : Reference.rows(file)) {
      Tails computed = function.apply(row);
      double lower = row.number(lowerColumn);
      double upper = row.number(upperColumn);
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
  void noncentralT() throws IOException {
    tails(
        "nct.csv",
        row -> {
          NoncentralTDistribution law =
              NoncentralTDistribution.of(row.number("df"), row.number("ncp"));
          double t = row.number("t");
          return new Tails(law.cumulativeProbability(t), law.survivalProbability(t));
        });
  }

  @Test
  void noncentralF() throws IOException {
    tails(
        "ncf.csv",
        row -> {
          NoncentralFDistribution law =
              NoncentralFDistribution.of(
                  row.number("df1"), row.number("df2"), row.number("lambda"));
          double f = row.number("f");
          return new Tails(law.cumulativeProbability(f), law.survivalProbability(f));
        });
  }

  @Test
  void noncentralChiSquare() throws IOException {
    tails(
        "ncx2.csv",
        row -> {
          NoncentralChiSquaredDistribution law =
              NoncentralChiSquaredDistribution.of(row.number("df"), row.number("lambda"));
          double x = row.number("x");
          return new Tails(law.cumulativeProbability(x), law.survivalProbability(x));
        });
  }

  @Test
  void noncentralBeta() throws IOException {
    tails(
        "ncbeta.csv",
        row -> {
          NoncentralBetaDistribution law =
              NoncentralBetaDistribution.of(row.number("a"), row.number("b"), row.number("lambda"));
          double x = row.number("x");
          return new Tails(law.cumulativeProbability(x), law.survivalProbability(x));
        });
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

  @Test
  void owensT() throws IOException {
    powers("owens_t.csv", "T", row -> OwensT.of(row.number("h"), row.number("a")), "");
  }

  @Test
  void owensQ() throws IOException {
    powers(
        "owens_q.csv",
        "Q",
        row ->
            OwensQ.lower(row.number("df"), row.number("t"), row.number("delta"), row.number("R")),
        "");
  }

  @Test
  void twoOneSidedTests() throws IOException {
    tails(
        "tost.csv",
        "beta",
        "power",
        row -> {
          double df = row.number("df");
          double t = row.number("t");
          double first = row.number("ncp1");
          double second = row.number("ncp2");
          return new Tails(
              TwoOneSidedTests.typeTwoError(df, t, first, second),
              TwoOneSidedTests.power(df, t, first, second));
        });
  }

  @Test
  void noncentralityOfATTest() throws IOException {
    powers(
        "inv_nct.csv",
        "ncp",
        row -> {
          double df = row.number("df");
          boolean two = row.number("tails") == 2;
          double alpha = row.number("alpha");
          double critical =
              TDistribution.of(df).inverseSurvivalProbability(two ? alpha / 2 : alpha);
          return two
              ? NoncentralTDistribution.twoSidedNoncentralityFor(df, critical, row.number("power"))
              : NoncentralTDistribution.noncentralityFor(df, critical, row.number("power"));
        },
        "");
  }

  @Test
  void noncentralityOfAnFTest() throws IOException {
    powers(
        "inv_ncf.csv",
        "lambda",
        row -> {
          double df1 = row.number("df1");
          double df2 = row.number("df2");
          double critical =
              FDistribution.of(df1, df2).inverseSurvivalProbability(row.number("alpha"));
          return NoncentralFDistribution.noncentralityFor(df1, df2, critical, row.number("power"));
        },
        "");
  }

  @Test
  void noncentralityOfAChiSquareTest() throws IOException {
    powers(
        "inv_ncx2.csv",
        "lambda",
        row -> {
          double df = row.number("df");
          double critical =
              ChiSquaredDistribution.of(df).inverseSurvivalProbability(row.number("alpha"));
          return NoncentralChiSquaredDistribution.noncentralityFor(
              df, critical, row.number("power"));
        },
        "");
  }
}
