package dev.holdfast.check.rule;

import dev.holdfast.check.Situation;
import dev.holdfast.check.StudyView;
import dev.holdfast.plan.Figure;
import dev.holdfast.plan.Input;
import java.util.ArrayList;
import java.util.List;
import java.util.Set;

/** The figures of a plan that are assumptions, and so need a source. */
final class Assumed {
  /** Inputs that describe the test rather than assume anything. */
  private static final Set<String> DESCRIPTIVE =
      Set.of(
          "predictors",
          "tested-predictors",
          "categories",
          "rows",
          "columns",
          "null-mean",
          "null-share",
          "null-shares",
          "null-r",
          "direction");

  private Assumed() {}

  /**
   * An assumed figure.
   *
   * @param subject dotted path of the analysis
   * @param key key of its effect section
   * @param figure the figure
   */
  record Assumption(String subject, String key, Figure figure) {}

  /** The assumed figures of every effect section, in the order of the file. */
  static List<Assumption> of(StudyView view) {
    List<Assumption> all = new ArrayList<>();
    for (Situation situation : view.situations()) {
      situation
          .situation()
          .effect()
          .forEach(
              (key, input) -> {
                if (!DESCRIPTIVE.contains(key)) {
                  for (Figure figure : figures(input)) {
                    all.add(new Assumption(situation.subject(), key, figure));
                  }
                }
              });
    }
    return all;
  }

  private static List<Figure> figures(Input input) {
    if (input instanceof Input.One one) {
      return List.of(one.figure());
    } else if (input instanceof Input.Named named) {
      return List.copyOf(named.figures().values());
    } else if (input instanceof Input.Row row) {
      return row.figures();
    } else if (input instanceof Input.Table table) {
      return table.rows().stream().flatMap(List::stream).toList();
    }
    return List.of();
  }
}
