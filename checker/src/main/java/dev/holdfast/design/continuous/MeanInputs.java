package dev.holdfast.design.continuous;

import dev.holdfast.design.InputException;
import dev.holdfast.design.Inputs;
import dev.holdfast.design.Ledger;
import java.util.LinkedHashMap;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;

/**
 * Makes a difference of means of what a plan states: raw with its SD or SDs, standardised, or both.
 * Where more is stated than is needed, raw figures go before standardised ones, and what follows
 * from them is a measure to compare the rest with.
 */
final class MeanInputs {
  private static final double UNKNOWN = Double.NaN;
  private static final String STANDARD = "difference over the SD of the differences";

  private final Inputs inputs;
  private final Map<String, Double> measures = new LinkedHashMap<>();
  private final Ledger ledger = Ledger.open();

  private MeanInputs(Inputs inputs) {
    this.inputs = inputs;
  }

  /** Two groups: difference or means, sd or sds, d. */
  static MeanDifference ofGroups(Inputs inputs) {
    return new MeanInputs(inputs).groups();
  }

  /** One group: difference, or mean and null-mean; sd; d. */
  static MeanDifference ofOneGroup(Inputs inputs) {
    return new MeanInputs(inputs).oneGroup();
  }

  /**
   * Pairs: difference; sd-of-difference, or sd or sds with the correlation; d, or d-between with
   * what leads from one SD to the other.
   */
  static MeanDifference ofPairs(Inputs inputs) {
    return new MeanInputs(inputs).pairs();
  }

  private MeanDifference groups() {
    double difference = size("difference");
    double[] means = inputs.byGroup("means").orElse(null);
    if (means != null) {
      if (means.length != 2) {
        throw InputException.unfit("means", "means must name two groups");
      }
      difference = Math.abs(means[0] - means[1]);
      ledger.step(
          "difference of the means",
          "difference = abs(m1 - m2)",
          difference,
          "m1",
          means[0],
          "m2",
          means[1]);
    }
    double[] sds = twoSds(inputs.byGroup("sds"));
    double first = sds == null ? inputs.positive("sd").orElse(UNKNOWN) : sds[0];
    double second = sds == null ? first : sds[1];
    double d = size("d");
    if (Double.isNaN(first)) {
      first = implied(difference, d);
      second = first;
    }
    if (!Double.isNaN(first)) {
      double common = MeanDifference.common(first, second);
      measures.put("sd", common);
      if (first != second) {
        ledger.step(
            "SD that d divides by",
            "SD = sqrt((s1^2 + s2^2)/2)",
            common,
            "s1",
            first,
            "s2",
            second);
      }
    }
    return made(difference, first, second, d, "the SD (sd, or sds by group)", "sd", "sds");
  }

  private MeanDifference oneGroup() {
    double difference = size("difference");
    OptionalDouble mean = inputs.number("mean");
    OptionalDouble none = inputs.number("null-mean");
    if (mean.isPresent() && none.isPresent()) {
      difference = Math.abs(mean.getAsDouble() - none.getAsDouble());
      ledger.step(
          "difference from the fixed value",
          "difference = abs(m - m0)",
          difference,
          "m",
          mean.getAsDouble(),
          "m0",
          none.getAsDouble());
    } else if (mean.isPresent() && Double.isNaN(difference) && inputs.number("d").isEmpty()) {
      throw InputException.missing("the mean under the null hypothesis (null-mean)", "null-mean");
    }
    double d = size("d");
    double sd = inputs.positive("sd").orElse(UNKNOWN);
    if (Double.isNaN(sd)) {
      sd = implied(difference, d);
    }
    return made(difference, sd, sd, d, "the SD (sd)", "sd");
  }

  private MeanDifference pairs() {
    double difference = size("difference");
    double r = inputs.number("correlation").orElse(UNKNOWN);
    if (Math.abs(r) >= 1) {
      throw InputException.unfit("correlation", "correlation must lie between -1 and 1");
    }
    double[] sds = twoSds(inputs.byName("sds"));
    double first = sds == null ? inputs.positive("sd").orElse(UNKNOWN) : sds[0];
    double second = sds == null ? first : sds[1];
    double single = MeanDifference.common(first, second);
    double spread = inputs.positive("sd-of-difference").orElse(UNKNOWN);
    if (!Double.isNaN(first) && !Double.isNaN(r)) {
      spread = Math.sqrt(first * first + second * second - 2 * r * first * second);
      measures.put("sd-of-difference", spread);
      ledger.step(
          "SD of the differences",
          "SD = sqrt(s1^2 + s2^2 - 2*r*s1*s2)",
          spread,
          "s1",
          first,
          "s2",
          second,
          "r",
          r);
    }
    double between = size("d-between");
    double d = size("d");
    // How much larger d is than d-between.
    double ratio = Double.isNaN(single / spread) ? 1 / Math.sqrt(2 * (1 - r)) : single / spread;
    if (Double.isNaN(d) && !Double.isNaN(between) && Double.isNaN(difference / spread)) {
      if (Double.isNaN(ratio)) {
        throw InputException.missing("the correlation within pairs (correlation)", "correlation");
      }
      d = between * ratio;
      if (Double.isNaN(single / spread)) {
        ledger.step(STANDARD, "d = b/sqrt(2*(1 - r))", d, "b", between, "r", r);
      } else {
        ledger.step(STANDARD, "d = b*s/SD", d, "b", between, "s", single, "SD", spread);
      }
    }
    if (Double.isNaN(spread)) {
      spread = implied(difference, d);
    }
    double standard = Double.isNaN(difference / spread) ? d : difference / spread;
    if (!Double.isNaN(standard / ratio)) {
      measures.put("d-between", standard / ratio);
    }
    return made(
        difference,
        spread,
        spread,
        d,
        "the SD of the differences (sd-of-difference, or sd with correlation)",
        "sd-of-difference",
        "sd",
        "correlation");
  }

  /** An SD that follows from a difference stated raw and standardised. */
  private double implied(double difference, double d) {
    if (!(difference > 0 && d > 0)) {
      return UNKNOWN;
    }
    double sd = difference / d;
    ledger.step("SD", "SD = difference/d", sd, "difference", difference, "d", d);
    return sd;
  }

  /** The whole of the difference, its spread and d, of which any may be unknown. */
  private MeanDifference made(
      double difference, double first, double second, double d, String needed, String... keys) {
    if (Double.isNaN(first)) {
      if (!Double.isNaN(difference) && Double.isNaN(d)) {
        throw InputException.missing(needed, keys);
      }
      if (!Double.isNaN(d)) {
        measures.put("d", d);
      }
      return new MeanDifference(known(d), 1, 1, false, measures, ledger.steps());
    }
    double common = MeanDifference.common(first, second);
    double size = Double.isNaN(difference) ? d * common : difference;
    if (!Double.isNaN(size)) {
      measures.put("difference", size);
      measures.put("d", size / common);
      if (!Double.isNaN(difference)) {
        ledger.step(
            "standardised difference",
            "d = difference/SD",
            size / common,
            "difference",
            size,
            "SD",
            common);
      }
    }
    return new MeanDifference(known(size), first, second, true, measures, ledger.steps());
  }

  private static double[] twoSds(Optional<double[]> given) {
    double[] sds = given.orElse(null);
    if (sds != null && (sds.length != 2 || !(sds[0] > 0 && sds[1] > 0))) {
      throw InputException.unfit("sds", "sds must give two SDs above 0");
    }
    return sds;
  }

  private double size(String key) {
    return Math.abs(inputs.number(key).orElse(UNKNOWN));
  }

  private static OptionalDouble known(double value) {
    return Double.isNaN(value) ? OptionalDouble.empty() : OptionalDouble.of(value);
  }
}
