package dev.holdfast.check;

import dev.holdfast.plan.Claim;
import dev.holdfast.plan.Figure;
import dev.holdfast.plan.Plan;
import java.math.RoundingMode;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.function.DoubleFunction;
import java.util.function.DoublePredicate;

/**
 * Finds how far each figure of a case can move before a claim falls, or has to move before it
 * stands, the other figures unmoved.
 */
final class Headrooms {
  private static final int DOUBLINGS = 13;
  private static final int HALVINGS = 18;

  private final Situations situations;
  private final Plan plan;

  Headrooms(Situations situations, Plan plan) {
    this.situations = situations;
    this.plan = plan;
  }

  List<Headroom> of(Situation situation, Claim claim) {
    Map<String, Figure> movable = new LinkedHashMap<>();
    Figures.of(plan, situation.analysis(), situation.situation())
        .forEach(
            (path, figure) -> {
              if (path.startsWith("effect.")) {
                movable.putIfAbsent(figure.quantity().orElse(path), figure);
              }
            });
    List<Headroom> found = new ArrayList<>();
    movable.forEach((name, figure) -> found.addAll(limits(situation, claim, name, figure)));
    return found;
  }

  private List<Headroom> limits(Situation situation, Claim claim, String name, Figure figure) {
    double now = figure.value();
    if (now == 0) {
      return List.of();
    }
    DoubleFunction<Standing> at =
        value ->
            standing(
                situations.again(plan, situation, Overrides.of(Overrides.key(figure), value)),
                claim);
    DoublePredicate stands = value -> at.apply(value) == Standing.STANDS;
    boolean standsNow = stands.test(now);
    List<Headroom> found = new ArrayList<>();
    for (boolean up : new boolean[] {true, false}) {
      double inner = now;
      double step = 1.0 / 512;
      for (int k = 0; k < DOUBLINGS; k++, step *= 2) {
        double outer = up ? now * (1 + step) : now / (1 + step);
        Standing there = at.apply(outer);
        if (there == Standing.NOT_COMPUTED) {
          break;
        }
        if ((there == Standing.STANDS) != standsNow) {
          found.add(headroom(name, now, stands, standsNow, inner, outer));
          break;
        }
        inner = outer;
      }
    }
    return standsNow || found.size() < 2 ? found : List.of(nearest(found));
  }

  /** Of two ways back, the shorter one: the other leads through no effect to the far side. */
  private static Headroom nearest(List<Headroom> found) {
    Headroom one = found.get(0);
    Headroom other = found.get(1);
    return Math.abs(one.limit() - one.now()) <= Math.abs(other.limit() - other.now()) ? one : other;
  }

  /** Narrows down where a claim turns, and keeps the side on which it stands. */
  private static Headroom headroom(
      String name,
      double now,
      DoublePredicate stands,
      boolean standsNow,
      double inner,
      double outer) {
    double same = inner;
    double other = outer;
    for (int k = 0; k < HALVINGS; k++) {
      double middle = (same + other) / 2;
      if (stands.test(middle) == standsNow) {
        same = middle;
      } else {
        other = middle;
      }
    }
    double safe = standsNow ? same : other;
    boolean atMost = standsNow == (other > same);
    RoundingMode mode = (safe > 0) == atMost ? RoundingMode.DOWN : RoundingMode.UP;
    double written = Double.parseDouble(Numbers.significant(safe, 4, mode));
    return new Headroom(
        name, now, standsNow && passes(written, now, atMost) ? now : written, atMost);
  }

  /** Whether rounding took a limit past the present value, where the claim stands. */
  private static boolean passes(double limit, double now, boolean atMost) {
    return atMost ? limit < now : limit > now;
  }

  private enum Standing {
    STANDS,
    FALLS,
    /** A value leaves the claim nothing to be computed from, a share above 1 for instance. */
    NOT_COMPUTED
  }

  private Standing standing(Situation situation, Claim claim) {
    boolean computable =
        switch (claim.kind()) {
          case "power" -> NotComputed.power(situation).isEmpty();
          case "detectable" -> NotComputed.detectable(situation).isEmpty();
          default -> NotComputed.number(situation).isEmpty();
        };
    if (!computable) {
      return Standing.NOT_COMPUTED;
    }
    boolean stands =
        switch (claim.kind()) {
          case "power" -> new PowerJudge(situations, plan).stands(situation, claim);
          case "total", "sample", "events" -> NumberJudge.stands(situation, claim);
          case "detectable" -> DetectableJudge.stands(situation, claim);
          default -> false;
        };
    return stands ? Standing.STANDS : Standing.FALLS;
  }
}
