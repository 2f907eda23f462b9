package dev.holdfast.design.binary;

import dev.holdfast.design.InputException;
import dev.holdfast.design.InputSpec;
import dev.holdfast.design.Inputs;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.OptionalDouble;

/**
 * Two shares as a plan states them: both, or the second and a difference, ratio, odds ratio or h;
 * or only the arcsine difference h.
 *
 * @param measure the measure in which the effect is stated
 * @param value the effect in that measure; h without its sign
 * @param base share of the second group; NaN where only h is given
 * @param falls whether the first share is the smaller
 */
record SharePair(String measure, OptionalDouble value, double base, boolean falls) {
  static final List<InputSpec> INPUTS =
      List.of(
          InputSpec.byGroup("shares", "share of each group"),
          InputSpec.number("base-share", "share of the last group, that an effect is relative to"),
          InputSpec.number("difference", "difference of the two shares"),
          InputSpec.number("ratio", "share of the first group over the base share"),
          InputSpec.number("odds-ratio", "odds of the first group over those of the base share"),
          InputSpec.number("h", "difference of the arcsine-transformed shares"),
          new InputSpec(
              "direction",
              InputSpec.Form.WORD,
              "whether the first share is the larger (increase) or the smaller (decrease)"));

  /** The pair that a plan states. */
  static SharePair of(Inputs inputs) {
    double[] shares = inputs.byGroup("shares").orElse(null);
    if (shares != null) {
      return both(inputs, shares);
    }
    OptionalDouble base = inputs.share("base-share");
    OptionalDouble h = inputs.number("h");
    if (base.isEmpty() && h.isPresent()) {
      return new SharePair("h", size(h), Double.NaN, h.getAsDouble() < 0);
    }
    double p =
        base.orElseThrow(
            () ->
                InputException.missing(
                    "the shares (shares by group, or base-share with an effect)",
                    "shares",
                    "base-share"));
    boolean decrease = inputs.word("direction").filter("decrease"::equals).isPresent();
    OptionalDouble difference = inputs.number("difference");
    OptionalDouble ratio = inputs.positive("ratio");
    OptionalDouble odds = inputs.positive("odds-ratio");
    if (difference.isPresent()) {
      // A plan may write the size of the difference and its direction apart.
      double signed = decrease ? -Math.abs(difference.getAsDouble()) : difference.getAsDouble();
      return checked(
          inputs,
          new SharePair("difference", OptionalDouble.of(signed), p, signed < 0),
          "difference");
    }
    if (ratio.isPresent()) {
      return checked(inputs, new SharePair("ratio", ratio, p, ratio.getAsDouble() < 1), "ratio");
    }
    if (odds.isPresent()) {
      return checked(
          inputs, new SharePair("odds-ratio", odds, p, odds.getAsDouble() < 1), "odds-ratio");
    }
    if (h.isPresent()) {
      boolean falls = decrease || h.getAsDouble() < 0;
      SharePair pair = new SharePair("h", size(h), p, falls);
      if (size(h).getAsDouble() > pair.far()) {
        throw InputException.unfit("h", "h puts the share of the first group outside 0 to 1");
      }
      return checked(inputs, pair, "h");
    }
    return new SharePair("difference", OptionalDouble.empty(), p, decrease);
  }

  private static SharePair both(Inputs inputs, double[] shares) {
    if (shares.length != 2) {
      throw InputException.unfit("shares", "shares must name two groups");
    }
    for (double share : shares) {
      if (!(share >= 0 && share <= 1)) {
        throw InputException.unfit("shares", "each of the shares must lie between 0 and 1");
      }
    }
    if (shares[0] + shares[1] == 0 || shares[0] + shares[1] == 2) {
      throw InputException.unfit("shares", "the shares must not be 0, or 1, in both groups");
    }
    double difference = shares[0] - shares[1];
    return checked(
        inputs,
        new SharePair("difference", OptionalDouble.of(difference), shares[1], difference < 0),
        "shares");
  }

  private static SharePair checked(Inputs inputs, SharePair pair, String key) {
    double first = pair.first();
    if (!(first >= 0 && first <= 1)) {
      throw InputException.unfit(key, key + " puts the share of the first group outside 0 to 1");
    }
    String direction = inputs.word("direction").orElse("");
    if (first > pair.base && direction.equals("decrease")
        || first < pair.base && direction.equals("increase")) {
      throw InputException.unfit(
          "direction", "direction says " + direction + ", and " + key + " goes the other way");
    }
    return pair;
  }

  private static OptionalDouble size(OptionalDouble value) {
    return OptionalDouble.of(Math.abs(value.getAsDouble()));
  }

  /** Share of the first group. */
  double first() {
    double effect = value.orElseThrow(() -> new IllegalStateException("no effect is assumed"));
    return switch (measure) {
      case "difference" -> base + effect;
      case "ratio" -> base * effect;
      case "h" -> {
        double root = StrictMath.sin((arcsine(base) + (falls ? -effect : effect)) / 2);
        yield root * root;
      }
      default -> base * effect / (1 - base + base * effect);
    };
  }

  /** The size of the arcsine difference. */
  double h() {
    return measure.equals("h")
        ? value.orElseThrow(() -> new IllegalStateException("no effect is assumed"))
        : Math.abs(arcsine(first()) - arcsine(base));
  }

  boolean sharesKnown() {
    return !Double.isNaN(base);
  }

  SharePair with(double moved) {
    return new SharePair(measure, OptionalDouble.of(moved), base, falls);
  }

  /** The value of no effect in the measure. */
  double none() {
    return measure.equals("ratio") || measure.equals("odds-ratio") ? 1 : 0;
  }

  /** The end of the measure's range on the side of the effect. */
  double far() {
    return switch (measure) {
      case "difference" -> falls ? -base : 1 - base;
      case "ratio" -> falls ? 0 : 1 / base;
      case "odds-ratio" -> falls ? 0 : Double.POSITIVE_INFINITY;
      default -> {
        if (!sharesKnown()) {
          yield StrictMath.PI;
        }
        yield falls ? arcsine(base) : StrictMath.PI - arcsine(base);
      }
    };
  }

  /** The effect in every measure that is finite, with the share that it is relative to. */
  Map<String, Double> measures() {
    Map<String, Double> all = new LinkedHashMap<>();
    if (sharesKnown()) {
      all.put("base-share", base);
    }
    if (value.isEmpty()) {
      return all;
    }
    all.put("h", h());
    if (sharesKnown()) {
      double p = first();
      all.put("difference", p - base);
      all.put("ratio", p / base);
      all.put("odds-ratio", p / (1 - p) / (base / (1 - base)));
    }
    all.values().removeIf(each -> !Double.isFinite(each));
    return all;
  }

  /** Twice the arcsine of the root of a share. */
  static double arcsine(double share) {
    return 2 * StrictMath.asin(Math.sqrt(share));
  }
}
