package dev.holdfast.numeric;

import static org.junit.jupiter.api.Assertions.assertEquals;

import dev.holdfast.numeric.ReferenceTable.Row;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.TreeMap;
import java.util.function.Function;
import java.util.function.ToDoubleFunction;
import java.util.stream.Stream;
import org.apache.commons.statistics.distribution.ContinuousDistribution;
import org.junit.jupiter.api.AfterAll;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/**
 * Every row of the reference files, to a relative error of 1e-12 on the smaller tail; the figures
 * reached go to {@code target/accuracy/noncentral.md}. The files hold 30 digits that two
 * independent routes agree on; their generators lie beside them.
 */
class NoncentralAccuracyTest {
  private static final double LIMIT = 1e-12;
  private static final List<String> REPORT = new ArrayList<>();

  record Check(String table, ToDoubleFunction<Row> error) {
    @Override
    public String toString() {
      return table;
    }
  }

  static Stream<Check> checks() {
    return Stream.of(
        tails("nct", "t", r -> t(r.number("df"), r.number("ncp"))),
        tails("ncf", "f", r -> f(r.number("df1"), r.number("df2"), r.number("lambda"))),
        tails("ncx2", "x", r -> chiSquared(r.number("df"), r.number("lambda"))),
        tails(
            "ncbeta",
            "x",
            r -> NoncentralBetaDistribution.of(r.number("a"), r.number("b"), r.number("lambda"))),
        new Check("owens_t", r -> r.error(OwensT.of(r.number("h"), r.number("a")), "T")),
        new Check(
            "owens_q",
            r ->
                r.error(
                    OwensQ.lower(r.number("df"), r.number("t"), r.number("delta"), r.number("R")),
                    "Q")),
        new Check(
            "tost",
            r -> {
              double df = r.number("df");
              double t = r.number("t");
              double first = r.number("ncp1");
              double second = r.number("ncp2");
              return r.errorOfSmaller(
                  "power",
                  row -> TwoOneSidedTests.power(df, t, first, second),
                  "beta",
                  row -> TwoOneSidedTests.typeTwoError(df, t, first, second));
            }),
        new Check("inv_nct", NoncentralAccuracyTest::inverseT),
        new Check(
            "inv_ncf",
            r -> {
              double df1 = r.number("df1");
              double df2 = r.number("df2");
              double critical = f(df1, df2, 0).inverseSurvivalProbability(r.number("alpha"));
              return r.error(
                  NoncentralFDistribution.noncentralityFor(df1, df2, critical, r.number("power")),
                  "lambda");
            }),
        new Check(
            "inv_ncx2",
            r -> {
              double df = r.number("df");
              double critical = chiSquared(df, 0).inverseSurvivalProbability(r.number("alpha"));
              return r.error(
                  NoncentralChiSquaredDistribution.noncentralityFor(
                      df, critical, r.number("power")),
                  "lambda");
            }),
        new Check(
            "power_t1",
            r -> powerOfT(r, r.number("n") - 1, r.number("d") * Math.sqrt(r.number("n")))),
        new Check(
            "power_t2",
            r -> {
              double n1 = r.number("n1");
              double n2 = r.number("n2");
              return powerOfT(r, n1 + n2 - 2, r.number("d") * Math.sqrt(n1 * n2 / (n1 + n2)));
            }),
        new Check(
            "power_anova",
            r -> {
              double[] sizes =
                  Arrays.stream(r.text("ns").split(" ")).mapToDouble(Double::parseDouble).toArray();
              double df2 = Arrays.stream(sizes).sum() - sizes.length;
              return power(
                  r, f(sizes.length - 1, df2, 0), f(sizes.length - 1, df2, r.number("lambda")));
            }),
        new Check(
            "power_chi2",
            r -> {
              double df = r.number("df");
              double lambda = r.number("n") * r.number("w") * r.number("w");
              return power(r, chiSquared(df, 0), chiSquared(df, lambda));
            }),
        new Check(
            "power_reg",
            r -> {
              double df1 = r.number("u");
              double df2 = r.number("n") - r.number("p") - 1;
              return power(r, f(df1, df2, 0), f(df1, df2, r.number("n") * r.number("f2")));
            }));
  }

  @ParameterizedTest
  @MethodSource("checks")
  void everyRowIsRightToTheLimit(Check check) {
    Map<String, List<Double>> errors = new TreeMap<>();
    List<String> wrong = new ArrayList<>();
    for (Row row : ReferenceTable.read(check.table()).rows()) {
      double error = check.error().applyAsDouble(row);
      errors.computeIfAbsent(row.text("region"), region -> new ArrayList<>()).add(error);
      if (!(error <= LIMIT)) {
        wrong.add(error + " at " + row.cells());
      }
    }
    errors.forEach(
        (region, list) -> {
          list.sort(null);
          REPORT.add(
              String.format(
                  Locale.ROOT,
                  "| %s | %s | %d | %.1e | %.1e |",
                  check.table(),
                  region,
                  list.size(),
                  list.get(list.size() / 2),
                  list.get(list.size() - 1)));
        });
    assertEquals(List.of(), wrong);
  }

  @AfterAll
  static void writeTheTable() throws IOException {
    Path folder = Files.createDirectories(Path.of("target", "accuracy"));
    List<String> lines =
        new ArrayList<>(
            List.of(
                "| table | region | rows | median relative error | greatest |",
                "|---|---|---|---|---|"));
    lines.addAll(REPORT);
    Files.write(folder.resolve("noncentral.md"), lines);
  }

  private static Check tails(
      String table, String argument, Function<Row, ContinuousDistribution> of) {
    return new Check(
        table,
        r ->
            r.errorOfSmaller(
                "cdf",
                row -> of.apply(row).cumulativeProbability(row.number(argument)),
                "sf",
                row -> of.apply(row).survivalProbability(row.number(argument))));
  }

  private static double inverseT(Row r) {
    double df = r.number("df");
    double tails = r.number("tails");
    double critical = t(df, 0).inverseSurvivalProbability(r.number("alpha") / tails);
    double power = r.number("power");
    return r.error(
        tails == 1
            ? NoncentralTDistribution.noncentralityFor(df, critical, power)
            : NoncentralTDistribution.twoSidedNoncentralityFor(df, critical, power),
        "ncp");
  }

  private static double powerOfT(Row r, double df, double ncp) {
    double tails = r.number("tails");
    double critical = t(df, 0).inverseSurvivalProbability(r.number("alpha") / tails);
    NoncentralTDistribution distribution = t(df, ncp);
    return tails == 1
        ? power(r, t(df, 0), distribution)
        : r.errorOfSmaller(
            "power",
            row -> distribution.probabilityOutside(critical),
            "beta",
            row -> distribution.probabilityInside(critical));
  }

  private static double power(
      Row r, ContinuousDistribution central, ContinuousDistribution alternative) {
    double critical = central.inverseSurvivalProbability(r.number("alpha"));
    return r.errorOfSmaller(
        "power",
        row -> alternative.survivalProbability(critical),
        "beta",
        row -> alternative.cumulativeProbability(critical));
  }

  private static NoncentralTDistribution t(double df, double ncp) {
    return NoncentralTDistribution.of(df, ncp);
  }

  private static NoncentralFDistribution f(double df1, double df2, double lambda) {
    return NoncentralFDistribution.of(df1, df2, lambda);
  }

  private static NoncentralChiSquaredDistribution chiSquared(double df, double lambda) {
    return NoncentralChiSquaredDistribution.of(df, lambda);
  }
}
