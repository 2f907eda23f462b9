package dev.holdfast.design.continuous;

import dev.holdfast.design.Ledger;
import dev.holdfast.design.Step;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.OptionalDouble;

/**
 * A difference of means with its spread, as the tests of this package take it. Only its size
 * counts. {@link MeanInputs} makes it of a plan's inputs.
 *
 * @param difference raw difference, or the standardised one where no SD is known; at least 0
 * @param sdFirst SD in the first group, or of the one sample; 1 where the difference is
 *     standardised
 * @param sdSecond SD in the second group; that of the first where there is one
 * @param raw whether the difference is in the outcome's own unit
 * @param measures every measure given or derived, by key of the effect section
 * @param steps how the difference and its spread follow from the inputs
 */
record MeanDifference(
    OptionalDouble difference,
    double sdFirst,
    double sdSecond,
    boolean raw,
    Map<String, Double> measures,
    List<Step> steps) {

  /** The same with another difference. */
  MeanDifference with(double value) {
    double size = Math.abs(value);
    Map<String, Double> moved = new LinkedHashMap<>();
    if (raw) {
      moved.put("difference", size);
    }
    moved.put("d", size / commonSd());
    return new MeanDifference(OptionalDouble.of(size), sdFirst, sdSecond, raw, moved, List.of());
  }

  /** The same in standard deviations. */
  MeanDifference standardised() {
    double common = commonSd();
    OptionalDouble d =
        difference.isPresent()
            ? OptionalDouble.of(difference.getAsDouble() / common)
            : OptionalDouble.empty();
    return new MeanDifference(d, sdFirst / common, sdSecond / common, false, measures, steps);
  }

  /** Root of the mean of the two variances: the SD that d divides by. */
  double commonSd() {
    return common(sdFirst, sdSecond);
  }

  static double common(double first, double second) {
    return first == second ? first : Math.sqrt((first * first + second * second) / 2);
  }

  /** The difference in standard deviations. */
  double d() {
    return size() / commonSd();
  }

  /** The difference. */
  double size() {
    return difference.orElseThrow(() -> new IllegalStateException("no difference is assumed"));
  }

  void derive(Ledger ledger) {
    steps.forEach(ledger::take);
  }
}
