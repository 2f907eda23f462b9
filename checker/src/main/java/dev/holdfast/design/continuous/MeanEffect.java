package dev.holdfast.design.continuous;

import dev.holdfast.design.Effect;
import dev.holdfast.design.Ledger;
import dev.holdfast.design.Level;
import dev.holdfast.design.Method;
import dev.holdfast.design.Metric;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;

/**
 * An assumed difference of means under one of the tests of this package.
 *
 * @param means the difference and its spread
 * @param test how the test makes a power of it
 */
record MeanEffect(MeanDifference means, Test test) implements Effect {
  /** The power of a test of a difference of means. */
  interface Test {
    double power(MeanDifference means, Method method, double[] sizes, Level level, Ledger ledger);
  }

  @Override
  public Metric metric() {
    return new Metric(means.raw() ? "difference" : "d", 0, Double.POSITIVE_INFINITY);
  }

  @Override
  public OptionalDouble value() {
    return means.difference();
  }

  @Override
  public Effect at(double value) {
    return new MeanEffect(means.with(value), test);
  }

  @Override
  public Optional<Effect> in(String metric) {
    if (metric.equals(metric().name())) {
      return Optional.of(this);
    }
    return metric.equals("d")
        ? Optional.of(new MeanEffect(means.standardised(), test))
        : Optional.empty();
  }

  @Override
  public Map<String, Double> measures() {
    return means.measures();
  }

  @Override
  public void derive(Ledger ledger) {
    means.derive(ledger);
  }

  @Override
  public double power(Method method, double[] sizes, Level level, Ledger ledger) {
    return test.power(means, method, sizes, level, ledger);
  }
}
