package dev.holdfast.check.rule;

import dev.holdfast.check.Finding;
import dev.holdfast.check.FindingKind;
import dev.holdfast.check.Numbers;
import dev.holdfast.check.Rule;
import dev.holdfast.check.Situation;
import dev.holdfast.check.StudyView;
import dev.holdfast.family.ErrorControl;
import dev.holdfast.plan.Family;
import dev.holdfast.plan.Figure;
import dev.holdfast.plan.Word;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;

/**
 * {@code alpha-overspent}: the levels at which a family's analyses are tested exceed what its
 * control leaves them of the family's alpha.
 *
 * <p>Where alpha is shared, the sum of the levels must not exceed it, or, for Šidák, the chance of
 * any false rejection among independent tests. In a fixed sequence, and where all must succeed, no
 * single level may exceed it.
 */
final class AlphaOverspent implements Rule {
  /** Forgives levels written with few digits, such as 0.0167 for a third of 0.05. */
  private static final double WRITTEN = 1.005;

  @Override
  public List<Finding> look(StudyView view) {
    List<Finding> found = new ArrayList<>();
    for (Family family : view.plan().families().values()) {
      ErrorControl control = ErrorControl.of(family.control().text()).orElseThrow();
      OptionalDouble alpha = alpha(family, view);
      List<Double> levels = levels(family, view);
      if (alpha.isEmpty() || levels.isEmpty() || !control.corrects()) {
        continue;
      }
      double spent = spent(control, levels);
      if (control.guaranteedLevel(alpha.getAsDouble(), family.of().size()).isPresent()
          && spent > alpha.getAsDouble() * WRITTEN) {
        found.add(
            Finding.of(
                FindingKind.ALPHA_OVERSPENT,
                "families." + family.name(),
                family.place(),
                "The analyses of the family '"
                    + family.name()
                    + "' spend "
                    + Numbers.brief(spent)
                    + " in all; its alpha under "
                    + control.word()
                    + " is "
                    + Numbers.brief(alpha.getAsDouble())
                    + ".",
                remedy(control, alpha.getAsDouble(), family.of().size())));
      }
    }
    return found;
  }

  private static String remedy(ErrorControl control, double alpha, int tests) {
    return "test each at "
        + Numbers.brief(control.guaranteedLevel(alpha, tests).getAsDouble())
        + ", or leave alpha out of the analyses so that the family sets it";
  }

  private static double spent(ErrorControl control, List<Double> levels) {
    if (!control.sharesAlpha()) {
      return levels.stream().mapToDouble(Double::doubleValue).max().orElseThrow();
    }
    if (control == ErrorControl.SIDAK) {
      double none = 1;
      for (double level : levels) {
        none *= 1 - level;
      }
      return 1 - none;
    }
    return levels.stream().mapToDouble(Double::doubleValue).sum();
  }

  private static OptionalDouble alpha(Family family, StudyView view) {
    Optional<Figure> own = family.alpha();
    if (own.isPresent()) {
      return OptionalDouble.of(own.get().value());
    }
    return view.situations().stream()
        .flatMap(each -> each.situation().settings().alpha().stream())
        .filter(figure -> figure.place().pointer().startsWith("/defaults/"))
        .mapToDouble(Figure::value)
        .findFirst();
  }

  private static List<Double> levels(Family family, StudyView view) {
    List<Double> levels = new ArrayList<>();
    for (Word name : family.of()) {
      view.situations().stream()
          .filter(each -> each.analysis().name().equals(name.text()))
          .map(Situation::level)
          .flatMap(Optional::stream)
          .mapToDouble(level -> level.alpha())
          .max()
          .ifPresent(levels::add);
    }
    return levels;
  }
}
