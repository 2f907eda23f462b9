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
 * An assumed share of one group.
 *
 * @param measure {@code share}, or {@code difference} from the null share
 * @param value the effect in that measure
 * @param none share under the null hypothesis
 * @param falls whether the effect lies below the null share
 */
record OneShareEffect(String measure, OptionalDouble value, double none, boolean falls)
    implements Effect {
  private static final double MOST_ENUMERATED = 1e6;

  /** The effect that a plan states. */
  static OneShareEffect of(Inputs inputs) {
    double none =
        inputs
            .share("null-share")
            .orElseThrow(
                () ->
                    InputException.missing(
                        "the share under the null hypothesis (null-share)", "null-share"));
    OptionalDouble share = inputs.number("share");
    OptionalDouble difference = inputs.number("difference");
    String key = share.isPresent() ? "share" : "difference";
    if (share.isEmpty() && difference.isPresent()) {
      share = OptionalDouble.of(none + difference.getAsDouble());
    }
    if (share.isPresent() && !(share.getAsDouble() >= 0 && share.getAsDouble() <= 1)) {
      throw InputException.unfit(key, "the share assumed must lie between 0 and 1");
    }
    boolean falls = share.isPresent() && share.getAsDouble() < none;
    return new OneShareEffect("share", share, none, falls);
  }

  private double share() {
    double effect = value.orElseThrow(() -> new IllegalStateException("no share is assumed"));
    return measure.equals("share") ? effect : none + effect;
  }

  @Override
  public Metric metric() {
    return measure.equals("share")
        ? new Metric(measure, none, falls ? 0 : 1)
        : new Metric(measure, 0, falls ? -none : 1 - none);
  }

  @Override
  public Effect at(double moved) {
    return new OneShareEffect(measure, OptionalDouble.of(moved), none, falls);
  }

  @Override
  public Optional<Effect> in(String metric) {
    if (!metric.equals("share") && !metric.equals("difference")) {
      return Optional.empty();
    }
    OptionalDouble same = value.isEmpty() ? value : OptionalDouble.of(measures().get(metric));
    return Optional.of(new OneShareEffect(metric, same, none, falls));
  }

  @Override
  public Map<String, Double> measures() {
    Map<String, Double> measures = new LinkedHashMap<>();
    if (value.isPresent()) {
      measures.put("share", share());
      measures.put("difference", share() - none);
    }
    return measures;
  }

  @Override
  public Optional<String> beyondReach(Method method, double[] sizes) {
    if (!method.realSizes() && sizes[0] > MOST_ENUMERATED) {
      return Optional.of("outcomes are not enumerated beyond a million");
    }
    if (OneShareMethods.ownVariance(method)
        && value.isPresent()
        && (share() == 0 || share() == 1)) {
      return Optional.of("at a share of 0 or 1 there is no variance to take the error from");
    }
    return Optional.empty();
  }

  @Override
  public void derive(Ledger ledger) {
    if (value.isPresent()) {
      ledger.step(
          "difference from the null share",
          "difference = p1 - p0",
          share() - none,
          "p1",
          share(),
          "p0",
          none);
    }
  }

  @Override
  public double power(Method method, double[] sizes, Level level, Ledger ledger) {
    return OneSharePower.power(method, none, share(), falls, sizes[0], level, ledger);
  }
}
