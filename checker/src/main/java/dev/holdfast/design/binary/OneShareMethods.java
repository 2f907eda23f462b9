package dev.holdfast.design.binary;

import dev.holdfast.design.Convention;
import dev.holdfast.design.InputSpec;
import dev.holdfast.design.Method;
import java.util.List;
import java.util.Map;

/** Methods for tests of one share. */
final class OneShareMethods {
  static final Method BINOMIAL =
      new Method(
          "binomial-enumerated",
          "the exact binomial distribution",
          "clopper-pearson-1934",
          Map.of(Convention.REFERENCE, "exact"),
          true,
          false);
  static final Method NULL_VARIANCE =
      normal(
          "null-variance",
          "the normal formula with the variance under the null hypothesis",
          "null",
          "no");
  static final Method NULL_VARIANCE_CORRECTED =
      normal(
          "null-variance-corrected",
          "the normal formula with the variance under the null hypothesis and the continuity correction",
          "null",
          "yes");
  static final Method OWN_VARIANCE =
      normal(
          "own-variance",
          "the normal formula with the variance at the share assumed",
          "unpooled",
          "no");
  static final Method OWN_VARIANCE_CORRECTED =
      normal(
          "own-variance-corrected",
          "the normal formula with the variance at the share assumed and the continuity correction",
          "unpooled",
          "yes");
  static final Method ARCSINE =
      new Method(
          "arcsine",
          "the arcsine transformation",
          "cohen-1988",
          Map.of(Convention.REFERENCE, "normal", Convention.CONTINUITY, "no"),
          false,
          true);
  static final Method ENUMERATED =
      new Method(
          "enumerated",
          "enumeration of the normal test's outcomes",
          "chernick-liu-2002",
          Map.of(Convention.REFERENCE, "exact"),
          true,
          false);

  static final List<InputSpec> INPUTS =
      List.of(
          InputSpec.number("share", "share assumed"),
          InputSpec.number("null-share", "share under the null hypothesis"),
          InputSpec.number("difference", "share assumed less the null share"));

  private OneShareMethods() {}

  private static Method normal(String key, String title, String variance, String continuity) {
    return new Method(
        key,
        title,
        "fleiss-levin-paik-2003",
        Map.of(
            Convention.REFERENCE,
            "normal",
            Convention.VARIANCE,
            variance,
            Convention.CONTINUITY,
            continuity),
        false,
        true);
  }

  /** Whether a method takes its standard error from the share assumed, under either hypothesis. */
  static boolean ownVariance(Method method) {
    return "unpooled".equals(method.conventions().get(Convention.VARIANCE));
  }
}
