package dev.holdfast.check;

import dev.holdfast.plan.Analysis;
import dev.holdfast.plan.Case;
import dev.holdfast.plan.Figure;
import dev.holdfast.plan.Input;
import dev.holdfast.plan.Plan;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;

/** The figures that a case rests on, by what they are for. */
final class Figures {
  private Figures() {}

  /**
   * All figures that the computation of a case reads, its claims left out.
   *
   * @return by dotted path below the analysis, such as {@code effect.sd}, in the order of the file
   */
  static Map<String, Figure> of(Plan plan, Analysis analysis, Case each) {
    Map<String, Figure> figures = new LinkedHashMap<>();
    each.settings().alpha().ifPresent(figure -> figures.put("alpha", figure));
    each.settings().targetPower().ifPresent(figure -> figures.put("target-power", figure));
    LevelFinder.familyOf(plan, analysis.name())
        .ifPresent(
            family -> {
              family.alpha().ifPresent(figure -> figures.put("family.alpha", figure));
              Figure level = family.levels().get(analysis.name());
              if (level != null) {
                figures.put("family.level", level);
              }
            });
    each.effect().forEach((key, input) -> collect("effect." + key, input, figures));
    each.sample().forEach((group, figure) -> figures.put("sample." + group, figure));
    each.allocation().forEach((group, figure) -> figures.put("allocation." + group, figure));
    each.events().ifPresent(figure -> figures.put("events", figure));
    Losses.of(plan, analysis).ifPresent(figure -> figures.put("loss", figure));
    return figures;
  }

  private static void collect(String path, Input input, Map<String, Figure> into) {
    if (input instanceof Input.One one) {
      into.put(path, one.figure());
    } else if (input instanceof Input.Named named) {
      named.figures().forEach((name, figure) -> into.put(path + "." + name, figure));
    } else if (input instanceof Input.Row row) {
      row(path, row.figures(), into);
    } else if (input instanceof Input.Table table) {
      for (int i = 0; i < table.rows().size(); i++) {
        row(path + "." + i, table.rows().get(i), into);
      }
    }
  }

  private static void row(String path, List<Figure> figures, Map<String, Figure> into) {
    for (int i = 0; i < figures.size(); i++) {
      into.put(path + "." + i, figures.get(i));
    }
  }
}
