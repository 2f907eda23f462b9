package dev.holdfast.design.binary;

import dev.holdfast.design.Convention;
import dev.holdfast.design.Method;
import java.util.Map;

/** Methods for tests of two shares. */
final class TwoShareMethods {
  private static final double MOST_BY_FISHER = 5_000;
  private static final double MOST_BY_SCORE = 50_000;

  static final Method POOLED =
      normal(
          "pooled",
          "the normal formula with the pooled variance under the null hypothesis",
          "fleiss-levin-paik-2003",
          "pooled",
          "no");
  static final Method POOLED_CORRECTED =
      normal(
          "pooled-corrected",
          "the normal formula with the pooled variance and the continuity correction",
          "fleiss-tytun-ury-1980",
          "pooled",
          "yes");
  static final Method UNPOOLED =
      normal(
          "unpooled",
          "the normal formula with the variances of both groups",
          "chow-2008",
          "unpooled",
          "no");
  static final Method UNPOOLED_CORRECTED =
      normal(
          "unpooled-corrected",
          "the normal formula with the variances of both groups and the continuity correction",
          "fleiss-tytun-ury-1980",
          "unpooled",
          "yes");
  static final Method CONTROL =
      normal(
          "control-variance",
          "the normal formula with the variance at the base share in both groups",
          "chow-2008",
          "control",
          "no");
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
          "enumeration of the test's outcomes",
          "suissa-shuster-1985",
          Map.of(Convention.REFERENCE, "exact"),
          true,
          false);
  static final Method FISHER =
      new Method(
          "fisher-enumerated",
          "enumeration of Fisher's exact test",
          "fisher-1935",
          Map.of(Convention.REFERENCE, "exact"),
          false,
          false);
  static final Method FISHER_EXACT =
      new Method(
          "fisher-enumerated",
          "enumeration of Fisher's exact test",
          "fisher-1935",
          Map.of(Convention.REFERENCE, "exact"),
          true,
          false);

  private TwoShareMethods() {}

  /** Size of a group beyond which a method's enumeration takes too long for a check. */
  static double mostEnumerated(Method method) {
    return method.key().equals(FISHER.key()) ? MOST_BY_FISHER : MOST_BY_SCORE;
  }

  private static Method normal(
      String key, String title, String reference, String variance, String continuity) {
    return new Method(
        key,
        title,
        reference,
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
}
