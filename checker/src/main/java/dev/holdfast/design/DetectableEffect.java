package dev.holdfast.design;

import java.util.OptionalDouble;
import org.apache.commons.math3.analysis.UnivariateFunction;
import org.apache.commons.math3.analysis.solvers.BrentSolver;

/** The smallest effect that a sample detects with a wanted power. */
public final class DetectableEffect {
  private DetectableEffect() {}

  /**
   * Searches from no effect outward.
   *
   * @param effect the assumptions; its value, if any, only gives the direction and the scale
   * @param method method of its cell
   * @param sizes numbers analysed by group
   * @param level level of the test
   * @param target power wanted, in (0, 1)
   * @return the effect in its own measure, empty if none in its range has the power
   */
  public static OptionalDouble find(
      Effect effect, Method method, double[] sizes, Level level, double target) {
    Metric metric = effect.metric();
    UnivariateFunction excess =
        value -> effect.at(value).power(method, sizes, level, Ledger.closed()) - target;
    boolean open = Double.isInfinite(metric.far());
    double away = metric.far() > metric.none() ? 1 : -1;
    double low = metric.none();
    double high = low;
    double step = 1.0 / 1024;
    for (int tries = 0; tries < 100; tries++) {
      high =
          open
              ? metric.none() + away * step
              : metric.far() - (metric.far() - metric.none()) / (1 + step);
      if (excess.value(high) >= 0) {
        double value =
            new BrentSolver(1e-13, 1e-300)
                .solve(500, excess, Math.min(low, high), Math.max(low, high));
        return OptionalDouble.of(value);
      }
      low = high;
      step *= 2;
    }
    return OptionalDouble.empty();
  }
}
