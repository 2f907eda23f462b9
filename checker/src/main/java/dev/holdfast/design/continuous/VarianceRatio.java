package dev.holdfast.design.continuous;

import dev.holdfast.design.Level;
import dev.holdfast.numeric.NoncentralTDistribution;
import java.util.function.DoubleBinaryOperator;

/**
 * Power of a test of two means whose standard error depends on the ratio of the two sample
 * variances.
 *
 * <p>Let b be the share of the first sample in the sum of both sums of squares, each over its own
 * variance: a beta variable, independent of the sum. Given b such a statistic is a noncentral t,
 * with the degrees of freedom of both samples together, times a constant; its power is averaged
 * over b (Moser, Stevens, Watts 1989).
 */
final class VarianceRatio {
  private static final double NEGLIGIBLE = 1e-17;
  private static final double AGREEMENT = 1e-9;
  private static final int HALVINGS = 8;

  private VarianceRatio() {}

  /**
   * The power, by the trapezoidal rule in the logit of b, whose density there is smooth and falls
   * off exponentially on both sides; the weights are normed by their own sum. The step is halved
   * until two results agree, which leaves an error of about the square of their difference.
   *
   * @param m1 degrees of freedom of the first sample, at least 1
   * @param m2 degrees of freedom of the second
   * @param delta the true difference over its true standard error
   * @param level level of the test
   * @param bound what the noncentral t must pass, given b and 1 - b
   */
  static double power(double m1, double m2, double delta, Level level, DoubleBinaryOperator bound) {
    NoncentralTDistribution statistic = NoncentralTDistribution.of(m1 + m2, delta);
    DoubleBinaryOperator given =
        (b, rest) -> {
          double passed = bound.applyAsDouble(b, rest);
          double above = statistic.survivalProbability(passed);
          return level.twoSided() ? above + statistic.cumulativeProbability(-passed) : above;
        };
    double centre = StrictMath.log(m1 / m2);
    double h = Math.sqrt(2 / m1 + 2 / m2) / 2;
    Sums sums = Sums.of(m1, m2, centre, h, given);
    for (int halving = 0; halving < HALVINGS; halving++) {
      Sums finer = sums.plus(Sums.of(m1, m2, centre + h / 2, h, given));
      h /= 2;
      double apart = Math.abs(finer.mean() - sums.mean());
      sums = finer;
      if (apart <= AGREEMENT * sums.mean()) {
        break;
      }
    }
    return Math.min(1, sums.mean());
  }

  /**
   * Sums over equidistant logits.
   *
   * @param powers of the weighted powers
   * @param weights of the weights
   */
  private record Sums(double powers, double weights) {
    static Sums of(double m1, double m2, double start, double h, DoubleBinaryOperator given) {
      double powers = 0;
      double weights = 0;
      for (int side = -1; side <= 1; side += 2) {
        for (int k = side < 0 ? 1 : 0; ; k++) {
          double logit = start + side * k * h;
          double b = 1 / (1 + StrictMath.exp(-logit));
          double rest = 1 / (1 + StrictMath.exp(logit));
          double weight = weight(m1, b, m2, rest);
          if (weight < NEGLIGIBLE) {
            break;
          }
          powers += weight * given.applyAsDouble(b, rest);
          weights += weight;
        }
      }
      return new Sums(powers, weights);
    }

    Sums plus(Sums other) {
      return new Sums(powers + other.powers, weights + other.weights);
    }

    double mean() {
      return powers / weights;
    }
  }

  /** Density of the logit of b, one at its peak. */
  private static double weight(double m1, double b, double m2, double rest) {
    double m = m1 + m2;
    return StrictMath.exp(
        m1 / 2 * StrictMath.log(b * m / m1) + m2 / 2 * StrictMath.log(rest * m / m2));
  }
}
