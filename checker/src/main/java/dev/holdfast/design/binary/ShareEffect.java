package dev.holdfast.design.binary;

import dev.holdfast.design.Effect;
import dev.holdfast.design.InputException;
import dev.holdfast.design.Ledger;
import dev.holdfast.design.Level;
import dev.holdfast.design.Method;
import dev.holdfast.design.Metric;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.Set;

/** An assumed pair of shares. */
record ShareEffect(SharePair pair) implements Effect {
  private static final Set<String> MEASURES = Set.of("difference", "ratio", "odds-ratio", "h");

  /** The effect; shares are needed unless the test can do with h. */
  static ShareEffect of(SharePair pair, boolean arcsine) {
    if (!pair.sharesKnown() && !arcsine) {
      throw InputException.missing(
          "the shares (shares by group, or base-share with an effect)", "shares", "base-share");
    }
    return new ShareEffect(pair);
  }

  @Override
  public Metric metric() {
    return new Metric(pair.measure(), pair.none(), pair.far());
  }

  @Override
  public OptionalDouble value() {
    return pair.value();
  }

  @Override
  public Effect at(double value) {
    return new ShareEffect(pair.with(value));
  }

  @Override
  public Optional<Effect> in(String metric) {
    if (metric.equals(pair.measure())) {
      return Optional.of(this);
    }
    if (!pair.sharesKnown() || !MEASURES.contains(metric)) {
      return Optional.empty();
    }
    Double value = pair.measures().get(metric);
    return Optional.of(
        new ShareEffect(
            new SharePair(
                metric,
                value == null ? OptionalDouble.empty() : OptionalDouble.of(value),
                pair.base(),
                pair.falls())));
  }

  @Override
  public Map<String, Double> measures() {
    return pair.measures();
  }

  @Override
  public void derive(Ledger ledger) {
    if (pair.value().isEmpty() || !pair.sharesKnown()) {
      return;
    }
    double effect = pair.value().getAsDouble();
    switch (pair.measure()) {
      case "ratio" -> first(ledger, "p1 = p2*ratio", "ratio", effect);
      case "odds-ratio" -> first(ledger, "p1 = p2*OR/(1 - p2 + p2*OR)", "OR", effect);
      case "h" ->
          first(
              ledger,
              pair.falls()
                  ? "p1 = sin(asin(sqrt(p2)) - h/2)^2"
                  : "p1 = sin(asin(sqrt(p2)) + h/2)^2",
              "h",
              effect);
      default -> {
        // The difference is what the plan states, or follows in the next step.
      }
    }
    ledger.step(
        "difference of the two shares",
        "difference = p1 - p2",
        pair.first() - pair.base(),
        "p1",
        pair.first(),
        "p2",
        pair.base());
  }

  private void first(Ledger ledger, String formula, String symbol, double effect) {
    ledger.step(
        "share of the first group", formula, pair.first(), "p2", pair.base(), symbol, effect);
  }

  @Override
  public Optional<String> beyondReach(Method method, double[] sizes) {
    if (method.equals(TwoShareMethods.CONTROL) && (pair.base() == 0 || pair.base() == 1)) {
      return Optional.of("a base share of 0 or 1 has no variance to take the error from");
    }
    if (method.realSizes()) {
      return Optional.empty();
    }
    double most = TwoShareMethods.mostEnumerated(method);
    for (double size : sizes) {
      if (size > most) {
        return Optional.of("outcomes are not enumerated beyond " + Math.round(most) + " a group");
      }
    }
    return Optional.empty();
  }

  @Override
  public double power(Method method, double[] sizes, Level level, Ledger ledger) {
    return TwoSharePower.power(pair, method, sizes, level, ledger);
  }
}
