package dev.holdfast.design.binary;

import dev.holdfast.design.Effect;
import dev.holdfast.design.InputException;
import dev.holdfast.design.Inputs;
import dev.holdfast.design.Ledger;
import dev.holdfast.design.Level;
import dev.holdfast.design.Method;
import dev.holdfast.design.Metric;
import java.util.LinkedHashMap;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;

/**
 * The shares of pairs that change in one direction and in the other: their sum, held fixed, and how
 * far they lie apart, whichever is the larger.
 *
 * @param measure {@code difference} or {@code odds-ratio}
 * @param value the effect in that measure: from 0, or as odds ratio from 1
 * @param discordant share of pairs that change, in (0, 1]
 */
record DiscordantEffect(String measure, OptionalDouble value, double discordant) implements Effect {
  private static final double MOST_ENUMERATED = 100_000;

  /** The effect that a plan states. */
  static DiscordantEffect of(Inputs inputs) {
    OptionalDouble difference = inputs.number("difference");
    OptionalDouble odds = inputs.number("odds-ratio");
    if (odds.isPresent() && !(odds.getAsDouble() >= 1)) {
      throw InputException.unfit(
          "odds-ratio",
          "odds-ratio is the larger discordant share over the smaller, so it must be at least 1");
    }
    OptionalDouble stated = inputs.share("discordant-share");
    double[] both = inputs.byName("discordant").orElse(null);
    if (both != null) {
      if (both.length != 2
          || !(both[0] >= 0 && both[1] >= 0 && both[0] + both[1] > 0 && both[0] + both[1] <= 1)) {
        throw InputException.unfit(
            "discordant", "discordant must give two shares that add up to at most 1");
      }
      return differing(both[0] + both[1], both[0] - both[1]);
    }
    if (stated.isEmpty() && difference.isPresent() && odds.isPresent()) {
      double ratio = odds.getAsDouble();
      double apart = Math.abs(difference.getAsDouble());
      double discordant = apart * (ratio + 1) / (ratio - 1);
      if (!(apart > 0 && discordant <= 1)) {
        throw InputException.unfit(
            "odds-ratio", "no discordant shares have this odds-ratio and this difference");
      }
      return differing(discordant, apart);
    }
    double share =
        stated.orElseThrow(
            () ->
                InputException.missing(
                    "the discordant shares (discordant, or discordant-share)",
                    "discordant",
                    "discordant-share"));
    if (difference.isPresent()) {
      if (Math.abs(difference.getAsDouble()) > share) {
        throw InputException.unfit("difference", "difference must not exceed discordant-share");
      }
      return differing(share, difference.getAsDouble());
    }
    if (odds.isPresent()) {
      return new DiscordantEffect("odds-ratio", odds, share);
    }
    return new DiscordantEffect("difference", OptionalDouble.empty(), share);
  }

  private static DiscordantEffect differing(double discordant, double difference) {
    return new DiscordantEffect("difference", OptionalDouble.of(Math.abs(difference)), discordant);
  }

  private double difference() {
    double effect = value.orElseThrow(() -> new IllegalStateException("no difference is assumed"));
    return measure.equals("difference") ? effect : discordant * (effect - 1) / (effect + 1);
  }

  @Override
  public Metric metric() {
    return measure.equals("difference")
        ? new Metric(measure, 0, discordant)
        : new Metric(measure, 1, Double.POSITIVE_INFINITY);
  }

  @Override
  public Effect at(double moved) {
    return new DiscordantEffect(measure, OptionalDouble.of(moved), discordant);
  }

  @Override
  public Optional<Effect> in(String metric) {
    if (!metric.equals("difference") && !metric.equals("odds-ratio")) {
      return Optional.empty();
    }
    Double same = measures().get(metric);
    return Optional.of(
        new DiscordantEffect(
            metric, same == null ? OptionalDouble.empty() : OptionalDouble.of(same), discordant));
  }

  @Override
  public Map<String, Double> measures() {
    Map<String, Double> measures = new LinkedHashMap<>();
    measures.put("discordant-share", discordant);
    if (value.isPresent()) {
      double difference = difference();
      measures.put("difference", difference);
      if (difference < discordant) {
        measures.put("odds-ratio", (discordant + difference) / (discordant - difference));
      }
    }
    return measures;
  }

  @Override
  public Optional<String> beyondReach(Method method, double[] sizes) {
    return !method.realSizes() && sizes[0] > MOST_ENUMERATED
        ? Optional.of("outcomes are not enumerated beyond a hundred thousand pairs")
        : Optional.empty();
  }

  @Override
  public void derive(Ledger ledger) {
    if (value.isEmpty()) {
      return;
    }
    if (measure.equals("odds-ratio")) {
      ledger.step(
          "difference of the discordant shares",
          "difference = psi*(OR - 1)/(OR + 1)",
          difference(),
          "psi",
          discordant,
          "OR",
          value.getAsDouble());
    } else {
      double first = (discordant + difference()) / 2;
      double second = (discordant - difference()) / 2;
      ledger.step("discordant share", "psi = a + b", discordant, "a", first, "b", second);
      ledger.step(
          "difference of the discordant shares",
          "difference = a - b",
          difference(),
          "a",
          first,
          "b",
          second);
    }
  }

  @Override
  public double power(Method method, double[] sizes, Level level, Ledger ledger) {
    return PairedSharesMcNemar.power(method, discordant, difference(), sizes[0], level, ledger);
  }
}
