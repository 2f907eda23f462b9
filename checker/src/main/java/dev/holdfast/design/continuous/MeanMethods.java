package dev.holdfast.design.continuous;

import dev.holdfast.design.Convention;
import dev.holdfast.design.InputSpec;
import dev.holdfast.design.Ledger;
import dev.holdfast.design.Level;
import dev.holdfast.design.Method;
import dev.holdfast.design.TPower;
import dev.holdfast.design.ZPower;
import java.util.List;
import java.util.Map;

/** Methods and inputs that the tests of means share. */
final class MeanMethods {
  static final Method NONCENTRAL_T =
      new Method(
          "noncentral-t",
          "the noncentral t distribution",
          "owen-1965",
          Map.of(Convention.REFERENCE, "student-t"),
          true,
          true);
  static final Method COMMON_VARIANCE =
      new Method(
          "noncentral-t",
          "the noncentral t distribution",
          "owen-1965",
          Map.of(Convention.REFERENCE, "student-t"),
          false,
          true);
  static final Method VARIANCES_APART =
      new Method(
          "noncentral-t-variances",
          "the noncentral t distribution, averaged over the variance ratio where the SDs differ",
          "moser-stevens-watts-1989",
          Map.of(Convention.REFERENCE, "exact"),
          true,
          true);
  static final Method NORMAL =
      new Method(
          "normal",
          "the normal approximation",
          "lachin-1981",
          Map.of(Convention.REFERENCE, "normal"),
          false,
          true);
  static final Method NORMAL_EXACT =
      new Method(
          "normal",
          "the normal distribution",
          "lachin-1981",
          Map.of(Convention.REFERENCE, "normal"),
          true,
          true);

  /** Formula of a power that is averaged over the variance ratio. */
  static final String OVER_THE_RATIO =
      "power = mean over b, Beta((n1 - 1)/2, (n2 - 1)/2), of the power given b";

  static final List<InputSpec> ONE_GROUP =
      List.of(
          InputSpec.number("difference", "difference from the fixed value"),
          InputSpec.number("mean", "mean assumed, instead of the difference"),
          InputSpec.number("null-mean", "the fixed value, with the mean"),
          InputSpec.number("sd", "SD of the outcome"),
          InputSpec.number("d", "difference over SD"));
  static final List<InputSpec> PAIRS =
      List.of(
          InputSpec.number("difference", "mean difference within pairs"),
          InputSpec.number("sd-of-difference", "SD of the differences within pairs"),
          InputSpec.number("sd", "SD of a single measurement, with the correlation"),
          InputSpec.byGroup("sds", "SDs of the two measurements, with the correlation"),
          InputSpec.number("correlation", "correlation of the two measurements"),
          InputSpec.number("d", "difference over the SD of the differences"),
          InputSpec.number("d-between", "difference over the SD of a single measurement"));
  static final List<InputSpec> TWO_GROUPS =
      List.of(
          InputSpec.number("difference", "difference between the two means"),
          InputSpec.byGroup("means", "mean of each group, instead of the difference"),
          InputSpec.number("sd", "SD within the groups"),
          InputSpec.byGroup("sds", "SD of each group, where they differ"),
          InputSpec.number("d", "difference over SD"));

  private MeanMethods() {}

  /** One sample of differences: by noncentral t, or by the normal distribution. */
  static double oneSample(
      MeanDifference means, Method method, double[] sizes, Level level, Ledger ledger) {
    double n = sizes[0];
    double delta = means.d() * Math.sqrt(n);
    ledger.step("noncentrality", "delta = d*sqrt(n)", delta, "d", means.d(), "n", n);
    if (!method.equals(NONCENTRAL_T)) {
      return ZPower.power(delta, level, ledger);
    }
    ledger.step("degrees of freedom", "df = n - 1", n - 1, "n", n);
    return TPower.power(n - 1, delta, level, ledger);
  }

  /** Standard error of a difference of two means with an SD each, written down. */
  static double standardError(MeanDifference means, double n1, double n2, Ledger ledger) {
    double s1 = means.sdFirst();
    double s2 = means.sdSecond();
    double error = Math.sqrt(s1 * s1 / n1 + s2 * s2 / n2);
    ledger.step(
        "standard error",
        "SE = sqrt(s1^2/n1 + s2^2/n2)",
        error,
        "s1",
        s1,
        "n1",
        n1,
        "s2",
        s2,
        "n2",
        n2);
    return error;
  }
}
