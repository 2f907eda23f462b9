package dev.holdfast.design.categories;

import dev.holdfast.design.ChiSquarePower;
import dev.holdfast.design.Convention;
import dev.holdfast.design.Effect;
import dev.holdfast.design.Ledger;
import dev.holdfast.design.Level;
import dev.holdfast.design.Method;
import dev.holdfast.design.Metric;
import java.util.LinkedHashMap;
import java.util.Map;
import java.util.OptionalDouble;

/**
 * An assumed table, as w: the root of the chi-square distance between the assumed shares and those
 * of the null hypothesis (Cohen 1988).
 *
 * @param shape what the table compares
 * @param value w
 * @param rows number of rows; NaN where it is the number of groups in the sample
 * @param columns number of categories in a row
 * @param worked whether w was worked out from shares
 */
record TableEffect(Shape shape, OptionalDouble value, double rows, double columns, boolean worked)
    implements Effect {
  /** What a table compares. */
  enum Shape {
    /** One row with fixed shares. */
    FIT,
    /** The rows with each other. */
    GROUPS,
    /** The rows and columns, of which neither is fixed. */
    JOINT
  }

  static final Method NONCENTRAL_CHI_SQUARE =
      new Method(
          "noncentral-chi-square",
          "the noncentral chi-square distribution",
          "guenther-1977",
          Map.of(Convention.REFERENCE, "normal"),
          false,
          true);

  @Override
  public Metric metric() {
    return new Metric("w", 0, Double.POSITIVE_INFINITY);
  }

  @Override
  public Effect at(double w) {
    return new TableEffect(shape, OptionalDouble.of(w), rows, columns, false);
  }

  @Override
  public Map<String, Double> measures() {
    Map<String, Double> measures = new LinkedHashMap<>();
    if (shape == Shape.JOINT) {
      measures.put("rows", rows);
      measures.put("columns", columns);
    } else {
      measures.put("categories", columns);
    }
    value.ifPresent(w -> measures.put("w", w));
    return measures;
  }

  @Override
  public double power(Method method, double[] sizes, Level level, Ledger ledger) {
    double w = value.orElseThrow(() -> new IllegalStateException("no effect is assumed"));
    double total = 0;
    for (double size : sizes) {
      total += size;
    }
    double df = degreesOfFreedom(Double.isNaN(rows) ? sizes.length : rows, ledger);
    double lambda = total * w * w;
    ledger.step("noncentrality", "lambda = N*w^2", lambda, "N", total, "w", w);
    return ChiSquarePower.power(df, lambda, level, ledger);
  }

  private double degreesOfFreedom(double height, Ledger ledger) {
    double df = shape == Shape.FIT ? columns - 1 : (height - 1) * (columns - 1);
    String formula =
        switch (shape) {
          case FIT -> "df = categories - 1";
          case GROUPS -> "df = (groups - 1)*(categories - 1)";
          case JOINT -> "df = (rows - 1)*(columns - 1)";
        };
    if (shape == Shape.JOINT) {
      ledger.step("degrees of freedom", formula, df, "rows", height, "columns", columns);
    } else {
      ledger.step("degrees of freedom", formula, df, "groups", height, "categories", columns);
    }
    return df;
  }

  @Override
  public void derive(Ledger ledger) {
    if (worked) {
      ledger.step(
          "distance from the null hypothesis",
          switch (shape) {
            case FIT -> "w = root of the sum of (p - p0)^2/p0 over the categories";
            case GROUPS ->
                "w = root of the sum of (p - mean)^2/mean over groups and categories, weighted by size";
            case JOINT -> "w = root of the sum of (p - row*column)^2/(row*column) over the cells";
          },
          value.getAsDouble());
    }
  }
}
