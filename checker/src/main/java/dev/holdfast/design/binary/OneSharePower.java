package dev.holdfast.design.binary;

import dev.holdfast.design.Convention;
import dev.holdfast.design.Ledger;
import dev.holdfast.design.Level;
import dev.holdfast.design.Method;
import dev.holdfast.design.ZPower;
import dev.holdfast.numeric.Binomial;
import dev.holdfast.numeric.ExactTests;

/** Power of the tests of one share by their methods. */
final class OneSharePower {
  private OneSharePower() {}

  /**
   * Power of a test of p0 where the share is p1, by one of the methods of {@link OneShareMethods}.
   *
   * @param falls whether the effect is assumed, and a one-sided test looks, below p0
   */
  static double power(
      Method method, double p0, double p1, boolean falls, double n, Level level, Ledger ledger) {
    return switch (method.key()) {
      case "binomial-enumerated" -> binomial(p0, p1, falls, Math.round(n), level, ledger);
      case "enumerated" -> enumerated(p0, p1, falls, Math.round(n), level, ledger);
      case "arcsine" -> {
        double h = Math.abs(SharePair.arcsine(p1) - SharePair.arcsine(p0));
        double delta = h * Math.sqrt(n);
        ledger.step(
            "difference of the arcsine-transformed shares",
            "h = |2*asin(sqrt(p1)) - 2*asin(sqrt(p0))|",
            h,
            "p1",
            p1,
            "p0",
            p0);
        ledger.step("noncentrality", "delta = h*sqrt(n)", delta, "h", h, "n", n);
        yield ZPower.power(delta, level, ledger);
      }
      default -> normal(method, p0, p1, n, level, ledger);
    };
  }

  private static double normal(
      Method method, double p0, double p1, double n, Level level, Ledger ledger) {
    double difference = Math.abs(p1 - p0);
    boolean corrected = "yes".equals(method.conventions().get(Convention.CONTINUITY));
    double left = corrected ? Continuity.left(difference, n, ledger) : 1;
    double own = p1 * (1 - p1);
    double under = OneShareMethods.ownVariance(method) ? own : p0 * (1 - p0);
    double delta = difference * Math.sqrt(left * n / under);
    ledger.step(
        "noncentrality",
        (corrected ? "delta = difference*sqrt(c*n/v)" : "delta = difference*sqrt(n/v)")
            + (OneShareMethods.ownVariance(method) ? ", v = p1*(1 - p1)" : ", v = p0*(1 - p0)"),
        delta,
        "difference",
        difference,
        "c",
        left,
        "n",
        n,
        "v",
        under);
    return ZPower.power(delta, Math.sqrt(own / under), level, ledger);
  }

  private static double binomial(
      double p0, double p1, boolean falls, long n, Level level, Ledger ledger) {
    double attained = ExactTests.binomial(n, p0, p0, level.alpha(), level.twoSided(), !falls);
    double power = ExactTests.binomial(n, p0, p1, level.alpha(), level.twoSided(), !falls);
    ledger.step("level attained", "attained = P(reject), share p0", attained, "n", n, "p0", p0);
    ledger.step("power", "power = P(reject), share p1", power, "n", n, "p1", p1);
    return power;
  }

  /** The normal test with the null variance, by all its outcomes. */
  private static double enumerated(
      double p0, double p1, boolean falls, long n, Level level, Ledger ledger) {
    // The test as it will be run: its critical value is never rounded.
    double critical = ZPower.critical(Level.of(level.alpha(), level.sides()));
    double reach = critical * Math.sqrt(p0 * (1 - p0) / n);
    double attained = rejected(p0, p0, reach, n, level.twoSided(), falls);
    double power = rejected(p0, p1, reach, n, level.twoSided(), falls);
    ledger.step("level attained", "attained = P(reject), share p0", attained, "n", n, "p0", p0);
    ledger.step(
        "power",
        level.twoSided()
            ? "power = P(|X/n - p0| >= reach), X binomial(n, p1)"
            : falls
                ? "power = P(X/n - p0 <= -reach), X binomial(n, p1)"
                : "power = P(X/n - p0 >= reach), X binomial(n, p1)",
        power,
        "n",
        n,
        "p0",
        p0,
        "reach",
        reach,
        "p1",
        p1);
    return power;
  }

  private static double rejected(
      double p0, double p, double reach, long n, boolean twoSided, boolean falls) {
    double chance = 0;
    if (twoSided || !falls) {
      chance += Binomial.atLeast(Math.ceil(n * (p0 + reach) - 1e-9), n, p);
    }
    if (twoSided || falls) {
      chance += Binomial.atMost(Math.floor(n * (p0 - reach) + 1e-9), n, p);
    }
    return Math.min(1, chance);
  }
}
