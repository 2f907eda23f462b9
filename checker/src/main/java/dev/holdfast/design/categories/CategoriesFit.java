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
import java.util.Arrays;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.OptionalDouble;
import java.util.Set;

/** Shares of several categories in one group against fixed ones by the chi-square test of fit. */
public final class CategoriesFit extends BaseCell {
  /** The cell. */
  public CategoriesFit() {
    super(
        new CellKey(Arrangement.SINGLE_GROUP, "chi-square-goodness-of-fit"),
        Set.of(Scale.BINARY, Scale.ORDERED, Scale.CATEGORIES),
        "one group, chi-square test of fit",
        "Do the shares of several categories differ from fixed ones?",
        Arms.one(1, Unit.PARTICIPANTS),
        List.of(
            InputSpec.byGroup("shares", "share of each category"),
            InputSpec.byGroup(
                "null-shares", "shares under the null hypothesis, equal unless stated"),
            InputSpec.number("w", "root of the chi-square distance from the null shares"),
            InputSpec.number("categories", "number of categories, with w")),
        List.of(TableEffect.NONCENTRAL_CHI_SQUARE));
  }

  @Override
  public Effect assume(Inputs inputs) {
    Map<String, Double> named = inputs.named().get("shares");
    if (named == null) {
      double categories = Shares.count(inputs, "categories", "the number of categories", "shares");
      return new TableEffect(TableEffect.Shape.FIT, inputs.positive("w"), 1, categories, false);
    }
    double[] assumed = Shares.whole("shares", values(named));
    double[] none = new double[assumed.length];
    Arrays.fill(none, 1.0 / assumed.length);
    Map<String, Double> expected = inputs.named().get("null-shares");
    if (expected != null) {
      if (!expected.keySet().equals(named.keySet())) {
        throw InputException.unfit(
            "null-shares", "null-shares must name the categories that shares names");
      }
      Map<String, Double> ordered = new LinkedHashMap<>();
      named.keySet().forEach(name -> ordered.put(name, expected.get(name)));
      none = Shares.whole("null-shares", values(ordered));
      Shares.occupied("null-shares", none, "a category");
    }
    double w = Math.sqrt(Shares.distance(assumed, none));
    return new TableEffect(TableEffect.Shape.FIT, OptionalDouble.of(w), 1, assumed.length, true);
  }

  private static double[] values(Map<String, Double> named) {
    return named.values().stream().mapToDouble(Double::doubleValue).toArray();
  }
}
