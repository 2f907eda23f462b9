package dev.holdfast.design.association;

import dev.holdfast.design.Effect;
import dev.holdfast.design.Ledger;
import dev.holdfast.design.Level;
import dev.holdfast.design.Method;
import dev.holdfast.design.Metric;
import dev.holdfast.design.ZPower;
import dev.holdfast.numeric.SampleCorrelationDistribution;
import java.util.OptionalDouble;
import org.apache.commons.statistics.distribution.NormalDistribution;
import org.apache.commons.statistics.distribution.TDistribution;

/**
 * An assumed correlation.
 *
 * @param value the correlation
 * @param none the correlation under the null hypothesis
 */
record CorrelationEffect(OptionalDouble value, double none) implements Effect {
  @Override
  public Metric metric() {
    boolean below = value.isPresent() && value.getAsDouble() < none;
    return new Metric("r", none, below ? -1 : 1);
  }

  @Override
  public Effect at(double r) {
    return new CorrelationEffect(OptionalDouble.of(r), none);
  }

  @Override
  public double power(Method method, double[] sizes, Level level, Ledger ledger) {
    double r = value.orElseThrow(() -> new IllegalStateException("no correlation is assumed"));
    // The test is the same with both signs turned.
    boolean turned = r < none;
    double rho = turned ? -r : r;
    double rho0 = turned ? -none : none;
    return method.equals(PearsonCorrelation.EXACT)
        ? exact(sizes[0], rho, rho0, level, ledger)
        : fisher(method, sizes[0], rho, rho0, level, ledger);
  }

  private static double fisher(
      Method method, double n, double rho, double rho0, Level level, Ledger ledger) {
    double shift = artanh(rho) - artanh(rho0);
    if (method.equals(PearsonCorrelation.FISHER)) {
      double delta = shift * Math.sqrt(n - 3);
      ledger.step(
          "noncentrality",
          "delta = (artanh(r) - artanh(r0))*sqrt(n - 3)",
          delta,
          "r",
          rho,
          "r0",
          rho0,
          "n",
          n);
      return ZPower.power(delta, level, ledger);
    }
    double delta = (shift + (rho - rho0) / (2 * (n - 1))) * Math.sqrt(n - 3);
    ledger.step(
        "noncentrality",
        "delta = (artanh(r) - artanh(r0) + (r - r0)/(2*(n - 1)))*sqrt(n - 3)",
        delta,
        "r",
        rho,
        "r0",
        rho0,
        "n",
        n);
    // Student's t knows the correlation of zero only.
    if (method.equals(PearsonCorrelation.FISHER_BIAS) || rho0 != 0) {
      return ZPower.power(delta, level, ledger);
    }
    double critical = critical(n, level, ledger);
    double passed = artanh(critical) * Math.sqrt(n - 3);
    double power = NormalDistribution.of(0, 1).survivalProbability(passed - delta);
    ledger.step(
        "power",
        "power = Phi(delta - artanh(rc)*sqrt(n - 3))",
        power,
        "delta",
        delta,
        "rc",
        critical,
        "n",
        n);
    return power;
  }

  /** The correlation from which on Student's t is significant. */
  private static double critical(double n, Level level, Ledger ledger) {
    double t = TDistribution.of(n - 2).inverseSurvivalProbability(level.perSide());
    double critical = t / Math.sqrt(n - 2 + t * t);
    ledger.step(
        "critical value of t",
        level.twoSided() ? "tc = t(1 - alpha/2; n - 2)" : "tc = t(1 - alpha; n - 2)",
        t,
        "alpha",
        level.alpha(),
        "n",
        n);
    ledger.step("critical correlation", "rc = tc/sqrt(n - 2 + tc^2)", critical, "tc", t, "n", n);
    return critical;
  }

  private static double exact(double n, double rho, double rho0, Level level, Ledger ledger) {
    double upper;
    double lower;
    if (rho0 == 0) {
      upper = critical(n, level, ledger);
      lower = -upper;
    } else {
      SampleCorrelationDistribution under = SampleCorrelationDistribution.of(n, rho0);
      upper = under.inverseSurvivalProbability(level.perSide());
      lower = level.twoSided() ? under.inverseCumulativeProbability(level.perSide()) : -1;
      ledger.step(
          "critical correlation",
          level.twoSided() ? "rc = R(1 - alpha/2; n, r0)" : "rc = R(1 - alpha; n, r0)",
          upper,
          "alpha",
          level.alpha(),
          "n",
          n,
          "r0",
          rho0);
    }
    SampleCorrelationDistribution statistic = SampleCorrelationDistribution.of(n, rho);
    double power = statistic.survivalProbability(upper);
    if (level.twoSided()) {
      double below = statistic.cumulativeProbability(lower);
      power = Math.min(1, power + below);
      ledger.step(
          "lower critical correlation",
          rho0 == 0 ? "rl = -rc" : "rl = R(alpha/2; n, r0)",
          lower,
          rho0 == 0
              ? new Object[] {"rc", upper}
              : new Object[] {"alpha", level.alpha(), "n", n, "r0", rho0});
    }
    ledger.step(
        "power",
        level.twoSided()
            ? "power = P(R > rc) + P(R < rl), R sample correlation(n, r)"
            : "power = P(R > rc), R sample correlation(n, r)",
        power,
        "rc",
        upper,
        "n",
        n,
        "r",
        rho);
    return power;
  }

  private static double artanh(double r) {
    double size = Math.abs(r);
    return 0.5 * Math.copySign(StrictMath.log1p(2 * size / (1 - size)), r);
  }
}
