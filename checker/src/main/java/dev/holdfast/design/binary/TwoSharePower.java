package dev.holdfast.design.binary;

import dev.holdfast.design.Convention;
import dev.holdfast.design.Ledger;
import dev.holdfast.design.Level;
import dev.holdfast.design.Method;
import dev.holdfast.design.ZPower;
import dev.holdfast.numeric.ExactTests;

/** Power of the tests of two shares by their methods. */
final class TwoSharePower {
  private TwoSharePower() {}

  /** Power of a test of two shares by one of the methods of {@link TwoShareMethods}. */
  static double power(SharePair pair, Method method, double[] sizes, Level level, Ledger ledger) {
    double n1 = sizes[0];
    double n2 = sizes[1];
    if (method.key().equals(TwoShareMethods.ARCSINE.key())) {
      if (pair.sharesKnown()) {
        ledger.step(
            "difference of the arcsine-transformed shares",
            "h = |2*asin(sqrt(p1)) - 2*asin(sqrt(p2))|",
            pair.h(),
            "p1",
            pair.first(),
            "p2",
            pair.base());
      }
      double delta = pair.h() * Math.sqrt(n1 * n2 / (n1 + n2));
      ledger.step(
          "noncentrality",
          "delta = h*sqrt(n1*n2/(n1 + n2))",
          delta,
          "h",
          pair.h(),
          "n1",
          n1,
          "n2",
          n2);
      return ZPower.power(delta, level, ledger);
    }
    double p1 = pair.first();
    double p2 = pair.base();
    if (method.key().equals(TwoShareMethods.ENUMERATED.key())) {
      return enumerated(p1, p2, n1, n2, level, ledger);
    }
    if (method.key().equals(TwoShareMethods.FISHER.key())) {
      boolean larger = p1 >= p2;
      double power =
          larger
              ? ExactTests.fisher(
                  Math.round(n1), Math.round(n2), p1, p2, level.alpha(), level.twoSided())
              : ExactTests.fisher(
                  Math.round(n2), Math.round(n1), p2, p1, level.alpha(), level.twoSided());
      ledger.step(
          "power",
          "power = sum of the chances of all pairs of counts that Fisher's test rejects",
          power,
          "n1",
          n1,
          "p1",
          p1,
          "n2",
          n2,
          "p2",
          p2);
      return power;
    }
    return normal(method, p1, p2, n1, n2, level, ledger);
  }

  private static double normal(
      Method method, double p1, double p2, double n1, double n2, Level level, Ledger ledger) {
    double difference = Math.abs(p1 - p2);
    boolean corrected = "yes".equals(method.conventions().get(Convention.CONTINUITY));
    double left = corrected ? Continuity.left(difference, n1, n2, ledger) : 1;
    double pooled = (n1 * p1 + n2 * p2) / (n1 + n2);
    double own = p1 * (1 - p1) / n1 + p2 * (1 - p2) / n2;
    String variance = method.conventions().get(Convention.VARIANCE);
    double null0 =
        switch (variance) {
          case "pooled" -> pooled * (1 - pooled) * (1 / n1 + 1 / n2);
          case "control" -> p2 * (1 - p2) * (1 / n1 + 1 / n2);
          default -> own;
        };
    double under = variance.equals("control") ? null0 : own;
    double delta = difference * Math.sqrt(left / null0);
    ledger.step(
        "standard error under the null hypothesis",
        switch (variance) {
          case "pooled" -> "SE0 = sqrt(p*(1 - p)*(1/n1 + 1/n2)), p = (n1*p1 + n2*p2)/(n1 + n2)";
          case "control" -> "SE0 = sqrt(p2*(1 - p2)*(1/n1 + 1/n2))";
          default -> "SE0 = sqrt(p1*(1 - p1)/n1 + p2*(1 - p2)/n2)";
        },
        Math.sqrt(null0),
        "p",
        pooled,
        "p1",
        p1,
        "n1",
        n1,
        "p2",
        p2,
        "n2",
        n2);
    ledger.step(
        "noncentrality",
        corrected ? "delta = difference*sqrt(c)/SE0" : "delta = difference/SE0",
        delta,
        "difference",
        difference,
        "SE0",
        Math.sqrt(null0),
        "c",
        left);
    return ZPower.power(delta, Math.sqrt(under / null0), level, ledger);
  }

  /** The pooled z test, two-sided the chi-square test, by all its outcomes. */
  private static double enumerated(
      double p1, double p2, double n1, double n2, Level level, Ledger ledger) {
    // The test as it will be run: its critical value is never rounded.
    double critical = ZPower.critical(Level.of(level.alpha(), level.sides()));
    boolean swapped = p1 < p2;
    double power =
        ExactTests.twoShares(
            Math.round(swapped ? n2 : n1),
            Math.round(swapped ? n1 : n2),
            swapped ? p2 : p1,
            swapped ? p1 : p2,
            TwoSharePower::score,
            critical,
            level.twoSided());
    ledger.step(
        "critical value of z",
        "zc = z(1 - alpha" + (level.twoSided() ? "/2)" : ")"),
        critical,
        "alpha",
        level.alpha());
    ledger.step(
        "power",
        "power = sum of the chances of all pairs of counts whose z passes zc",
        power,
        "zc",
        critical);
    return power;
  }

  /** The pooled z of two counts; 0 where no count, or every one, is a success. */
  private static double score(double x1, double n1, double x2, double n2) {
    double pooled = (x1 + x2) / (n1 + n2);
    double variance = pooled * (1 - pooled) * (1 / n1 + 1 / n2);
    return variance == 0 ? 0 : (x1 / n1 - x2 / n2) / Math.sqrt(variance);
  }
}
