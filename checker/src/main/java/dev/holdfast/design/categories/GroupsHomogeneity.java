package dev.holdfast.design.categories;

import dev.holdfast.design.Arms;
import dev.holdfast.design.Arrangement;
import dev.holdfast.design.BaseCell;
import dev.holdfast.design.CellKey;
import dev.holdfast.design.Effect;
import dev.holdfast.design.InputException;
import dev.holdfast.design.InputSpec;
import dev.holdfast.design.Inputs;
import dev.holdfast.design.Scale;
import dev.holdfast.design.Unit;
import java.util.List;
import java.util.OptionalDouble;
import java.util.Set;

/**
 * Shares of several categories in several parallel groups by the chi-square test of homogeneity.
 */
public final class GroupsHomogeneity extends BaseCell {
  /** The cell. */
  public GroupsHomogeneity() {
    super(
        new CellKey(Arrangement.PARALLEL_GROUPS, "chi-square-homogeneity"),
        Set.of(Scale.BINARY, Scale.ORDERED, Scale.CATEGORIES),
        "parallel groups, chi-square test of homogeneity",
        "Are the shares of several categories the same in every group?",
        new Arms(2, Integer.MAX_VALUE, 1, Unit.PARTICIPANTS),
        List.of(
            new InputSpec(
                "cells", InputSpec.Form.TABLE, "shares of the categories, one row a group"),
            InputSpec.number("w", "root of the chi-square distance from equal shares"),
            InputSpec.number("categories", "number of categories, with w")),
        List.of(TableEffect.NONCENTRAL_CHI_SQUARE));
  }

  @Override
  public Effect assume(Inputs inputs) {
    double[][] rows = inputs.table("cells").orElse(null);
    if (rows == null) {
      double categories = Shares.count(inputs, "categories", "the number of categories", "cells");
      return new TableEffect(
          TableEffect.Shape.GROUPS, inputs.positive("w"), Double.NaN, categories, false);
    }
    Shares.rectangular("cells", rows);
    if (!inputs.groups().isEmpty() && inputs.groups().size() != rows.length) {
      throw InputException.unfit(
          "cells",
          "cells has "
              + rows.length
              + " rows and the sample "
              + inputs.groups().size()
              + " groups");
    }
    double[] groups = inputs.shares(rows.length);
    double[] mean = new double[rows[0].length];
    for (int i = 0; i < rows.length; i++) {
      rows[i] = Shares.whole("cells", rows[i]);
      for (int j = 0; j < mean.length; j++) {
        mean[j] += groups[i] * rows[i][j];
      }
    }
    Shares.occupied("cells", mean, "a category of cells");
    double square = 0;
    for (int i = 0; i < rows.length; i++) {
      square += groups[i] * Shares.distance(rows[i], mean);
    }
    return new TableEffect(
        TableEffect.Shape.GROUPS,
        OptionalDouble.of(Math.sqrt(square)),
        rows.length,
        mean.length,
        true);
  }
}
