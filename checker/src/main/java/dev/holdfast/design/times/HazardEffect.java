package dev.holdfast.design.times;

import dev.holdfast.design.Effect;
import dev.holdfast.design.InputException;
import dev.holdfast.design.Inputs;
import dev.holdfast.design.Ledger;
import dev.holdfast.design.Level;
import dev.holdfast.design.Method;
import dev.holdfast.design.Metric;
import java.util.LinkedHashMap;
import java.util.Map;
import java.util.OptionalDouble;

/**
 * An assumed hazard ratio, constant over time.
 *
 * @param value hazard of the first group over that of the second, above 0
 * @param origin what it was worked out from
 * @param pair the two figures of that, by group; 0 where the ratio itself is stated
 * @param first share of participants in the first group, in (0, 1)
 * @param events chance that a participant has the event
 * @param eventsByGroup whether that chance was put together from those of the groups
 */
record HazardEffect(
    OptionalDouble value,
    Origin origin,
    Pair pair,
    double first,
    OptionalDouble events,
    boolean eventsByGroup)
    implements Effect {
  /** What a hazard ratio is worked out from. */
  enum Origin {
    STATED,
    SURVIVAL,
    MEDIANS
  }

  /** Two figures, in the order of the groups. */
  record Pair(double first, double second) {}

  /** The effect that a plan states. */
  static HazardEffect of(Inputs inputs) {
    if (inputs.groups().size() > 2) {
      throw InputException.unfit(
          "hazard-ratio",
          "the log-rank test compares two groups and the sample names " + inputs.groups().size());
    }
    OptionalDouble ratio = inputs.positive("hazard-ratio");
    Pair survival = pair(inputs, "survival", 1);
    Pair medians = pair(inputs, "medians", Double.POSITIVE_INFINITY);
    Pair shares = pair(inputs, "event-shares", 1);
    double[] groups = inputs.shares(2);
    Origin origin = Origin.STATED;
    Pair from = new Pair(0, 0);
    if (survival != null) {
      // Unrounded: the ratio printed beside the shares is often rounded to two decimals.
      origin = Origin.SURVIVAL;
      from = survival;
      ratio =
          OptionalDouble.of(StrictMath.log(survival.first()) / StrictMath.log(survival.second()));
    } else if (medians != null) {
      origin = Origin.MEDIANS;
      from = medians;
      ratio = OptionalDouble.of(medians.second() / medians.first());
    }
    OptionalDouble events = inputs.share("event-share");
    if (shares != null) {
      events = OptionalDouble.of(groups[0] * shares.first() + groups[1] * shares.second());
    } else if (events.isEmpty() && survival != null) {
      events =
          OptionalDouble.of(
              groups[0] * (1 - survival.first()) + groups[1] * (1 - survival.second()));
    }
    return new HazardEffect(ratio, origin, from, groups[0], events, shares != null);
  }

  private static Pair pair(Inputs inputs, String key, double below) {
    double[] given = inputs.byGroup(key).orElse(null);
    if (given == null) {
      return null;
    }
    if (given.length != 2) {
      throw InputException.unfit(key, key + " must name two groups");
    }
    for (double each : given) {
      if (!(each > 0 && each < below)) {
        throw InputException.unfit(
            key,
            below == 1
                ? "each of " + key + " must lie between 0 and 1"
                : "each of " + key + " must be above 0");
      }
    }
    return new Pair(given[0], given[1]);
  }

  @Override
  public Metric metric() {
    boolean above = value.isPresent() && value.getAsDouble() > 1;
    return new Metric("hazard-ratio", 1, above ? Double.POSITIVE_INFINITY : 0);
  }

  @Override
  public Effect at(double ratio) {
    return new HazardEffect(
        OptionalDouble.of(ratio), Origin.STATED, new Pair(0, 0), first, events, eventsByGroup);
  }

  @Override
  public OptionalDouble eventShare() {
    return events;
  }

  @Override
  public Map<String, Double> measures() {
    Map<String, Double> measures = new LinkedHashMap<>();
    value.ifPresent(ratio -> measures.put("hazard-ratio", ratio));
    if (eventsByGroup) {
      events.ifPresent(share -> measures.put("event-share", share));
    }
    return measures;
  }

  @Override
  public void derive(Ledger ledger) {
    if (origin == Origin.SURVIVAL) {
      ledger.step(
          "hazard ratio from the shares without the event",
          "HR = ln(S1)/ln(S2)",
          value.getAsDouble(),
          "S1",
          pair.first(),
          "S2",
          pair.second());
    } else if (origin == Origin.MEDIANS) {
      ledger.step(
          "hazard ratio from the medians of exponential times",
          "HR = m2/m1",
          value.getAsDouble(),
          "m2",
          pair.second(),
          "m1",
          pair.first());
    }
  }

  @Override
  public double power(Method method, double[] sizes, Level level, Ledger ledger) {
    double ratio = value.orElseThrow(() -> new IllegalStateException("no hazard ratio is assumed"));
    return ParallelTimesLogRank.power(method, ratio, first, sizes[0], level, ledger);
  }
}
