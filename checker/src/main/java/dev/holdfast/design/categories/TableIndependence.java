package dev.holdfast.design.categories;

import dev.holdfast.design.Arms;
import dev.holdfast.design.Arrangement;
import dev.holdfast.design.BaseCell;
import dev.holdfast.design.CellKey;
import dev.holdfast.design.Effect;
import dev.holdfast.design.InputSpec;
import dev.holdfast.design.Inputs;
import dev.holdfast.design.Scale;
import dev.holdfast.design.Unit;
import java.util.List;
import java.util.OptionalDouble;
import java.util.Set;

/** Independence of two categorical variables by the chi-square test. */
public final class TableIndependence extends BaseCell {
  /** The cell. */
  public TableIndependence() {
    super(
        new CellKey(Arrangement.ASSOCIATION, "chi-square-independence"),
        Set.of(Scale.BINARY, Scale.ORDERED, Scale.CATEGORIES),
        "association of two categorical variables, chi-square test",
        "Are two categorical variables independent?",
        Arms.one(1, Unit.PARTICIPANTS),
        List.of(
            new InputSpec("cells", InputSpec.Form.TABLE, "joint shares, adding up to one"),
            InputSpec.number("w", "root of the chi-square distance from independence"),
            InputSpec.number("rows", "number of rows, with w"),
            InputSpec.number("columns", "number of columns, with w")),
        List.of(TableEffect.NONCENTRAL_CHI_SQUARE));
  }

  @Override
  public Effect assume(Inputs inputs) {
    double[][] cells = inputs.table("cells").orElse(null);
    if (cells == null) {
      double rows = Shares.count(inputs, "rows", "the number of rows", "cells");
      double columns = Shares.count(inputs, "columns", "the number of columns", "cells");
      return new TableEffect(TableEffect.Shape.JOINT, inputs.positive("w"), rows, columns, false);
    }
    Shares.rectangular("cells", cells);
    int rows = cells.length;
    int columns = cells[0].length;
    double[] all = new double[rows * columns];
    for (int i = 0; i < rows; i++) {
      System.arraycopy(cells[i], 0, all, i * columns, columns);
    }
    all = Shares.whole("cells", all);
    double[] byRow = new double[rows];
    double[] byColumn = new double[columns];
    for (int k = 0; k < all.length; k++) {
      byRow[k / columns] += all[k];
      byColumn[k % columns] += all[k];
    }
    Shares.occupied("cells", byRow, "a row of cells");
    Shares.occupied("cells", byColumn, "a column of cells");
    double[] expected = new double[all.length];
    for (int k = 0; k < all.length; k++) {
      expected[k] = byRow[k / columns] * byColumn[k % columns];
    }
    double w = Math.sqrt(Shares.distance(all, expected));
    return new TableEffect(TableEffect.Shape.JOINT, OptionalDouble.of(w), rows, columns, true);
  }
}
