package dev.holdfast.design.times;

import dev.holdfast.design.Arms;
import dev.holdfast.design.Arrangement;
import dev.holdfast.design.BaseCell;
import dev.holdfast.design.CellKey;
import dev.holdfast.design.Convention;
import dev.holdfast.design.Effect;
import dev.holdfast.design.InputSpec;
import dev.holdfast.design.Inputs;
import dev.holdfast.design.Ledger;
import dev.holdfast.design.Level;
import dev.holdfast.design.Method;
import dev.holdfast.design.Scale;
import dev.holdfast.design.Unit;
import dev.holdfast.design.ZPower;
import java.util.List;
import java.util.Map;
import java.util.Set;

/**
 * Times to an event in two parallel groups by the log-rank test. Its power rests on the number of
 * events; sizes here count events.
 */
public final class ParallelTimesLogRank extends BaseCell {
  private static final Method SCHOENFELD =
      new Method(
          "schoenfeld",
          "Schoenfeld's formula",
          "schoenfeld-1981",
          Map.of(Convention.EVENTS_BY, "schoenfeld"),
          false,
          true);
  private static final Method FREEDMAN =
      new Method(
          "freedman",
          "Freedman's formula",
          "freedman-1982",
          Map.of(Convention.EVENTS_BY, "freedman"),
          false,
          true);

  /** The cell. */
  public ParallelTimesLogRank() {
    super(
        new CellKey(Arrangement.PARALLEL_GROUPS, "log-rank"),
        Set.of(Scale.TIME_TO_EVENT),
        "two parallel groups, log-rank test",
        "Do the times to an event differ between two groups?",
        Arms.one(2, Unit.EVENTS),
        List.of(
            InputSpec.number("hazard-ratio", "hazard of the first group over that of the second"),
            InputSpec.byGroup("survival", "share without the event at the same time"),
            InputSpec.byGroup("medians", "median time to the event"),
            InputSpec.number("event-share", "chance that a participant has the event"),
            InputSpec.byGroup("event-shares", "the same by group")),
        List.of(SCHOENFELD, FREEDMAN));
  }

  @Override
  public Effect assume(Inputs inputs) {
    return HazardEffect.of(inputs);
  }

  /**
   * Power of a method of this cell.
   *
   * @param ratio hazard of the first group over that of the second
   * @param first share of participants in the first group
   * @param events number of events, both groups together
   */
  static double power(
      Method method, double ratio, double first, double events, Level level, Ledger ledger) {
    double delta;
    if (method.key().equals(FREEDMAN.key())) {
      double allocation = first / (1 - first);
      delta = Math.sqrt(events * allocation) * Math.abs(1 - ratio) / (1 + allocation * ratio);
      ledger.step(
          "noncentrality",
          "delta = sqrt(D*r)*|1 - HR|/(1 + r*HR), r the ratio of the groups",
          delta,
          "D",
          events,
          "r",
          allocation,
          "HR",
          ratio);
    } else {
      delta = Math.abs(StrictMath.log(ratio)) * Math.sqrt(events * first * (1 - first));
      ledger.step(
          "noncentrality",
          "delta = |ln(HR)|*sqrt(D*a*(1 - a)), a the share of the first group",
          delta,
          "HR",
          ratio,
          "D",
          events,
          "a",
          first);
    }
    return ZPower.power(delta, level, ledger);
  }
}
