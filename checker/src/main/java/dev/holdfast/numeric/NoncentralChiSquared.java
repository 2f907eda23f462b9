package dev.holdfast.numeric;

import org.apache.commons.statistics.distribution.ChiSquaredDistribution;
import org.apache.commons.statistics.distribution.PoissonDistribution;

/**
 * Tails of the noncentral chi-square distribution.
 *
 * <p>Both tails are the Poisson mixture of central ones (Johnson, Kotz, Balakrishnan 1995,
 * Continuous Univariate Distributions, volume 2, chapter 29), summed outwards from the heaviest
 * weight. Every term is positive, so neither tail loses digits by subtraction. Cost grows with the
 * square root of the noncentrality.
 */
public final class NoncentralChiSquared {
  private static final double MAX_NONCENTRALITY = 1e5;
  private static final double NEGLIGIBLE = 1e-18;

  private final double degreesOfFreedom;
  private final PoissonDistribution weights;
  private final int heaviest;

  private NoncentralChiSquared(double degreesOfFreedom, double noncentrality) {
    this.degreesOfFreedom = degreesOfFreedom;
    this.weights = noncentrality == 0 ? null : PoissonDistribution.of(noncentrality / 2);
    this.heaviest = (int) (noncentrality / 2);
  }

  /**
   * Returns the distribution with the given parameters.
   *
   * @param degreesOfFreedom in (0, 1e6]
   * @param noncentrality the sum of squared means, in [0, 1e5]
   * @throws IllegalArgumentException if a parameter is outside its range
   */
  public static NoncentralChiSquared of(double degreesOfFreedom, double noncentrality) {
    if (!(degreesOfFreedom > 0 && degreesOfFreedom <= 1e6)) {
      throw new IllegalArgumentException(
          "degreesOfFreedom is " + degreesOfFreedom + "; it must lie in (0, 1e6]");
    }
    if (!(noncentrality >= 0 && noncentrality <= MAX_NONCENTRALITY)) {
      throw new IllegalArgumentException(
          "noncentrality is " + noncentrality + "; it must lie in [0, 1e5]");
    }
    return new NoncentralChiSquared(degreesOfFreedom, noncentrality);
  }

  /** Returns the chance of a value at or below {@code x}. */
  public double cumulativeProbability(double x) {
    return mixture(x, false);
  }

  /** Returns the chance of a value above {@code x}: the power of a chi-square test at {@code x}. */
  public double survivalProbability(double x) {
    return mixture(x, true);
  }

  private double mixture(double x, boolean upper) {
    if (Double.isNaN(x)) {
      throw new IllegalArgumentException("x is NaN; it must be a number");
    }
    if (weights == null) {
      return tail(0, x, upper);
    }
    double sum = 0;
    // A tail may be carried by terms far from the heaviest weight, so a term ends the sum only
    // when it is negligible beside what has been added, and past the point where it could grow.
    for (int j = heaviest; ; j++) {
      double weight = weights.probability(j);
      if (weight == 0) {
        break;
      }
      double term = weight * tail(j, x, upper);
      sum += term;
      boolean pastPeak = !upper || degreesOfFreedom + 2.0 * j > x;
      if (pastPeak && term <= NEGLIGIBLE * sum) {
        break;
      }
    }
    for (int j = heaviest - 1; j >= 0; j--) {
      double weight = weights.probability(j);
      if (weight == 0) {
        break;
      }
      double term = weight * tail(j, x, upper);
      sum += term;
      boolean pastPeak = upper || degreesOfFreedom + 2.0 * j < x;
      if (pastPeak && term <= NEGLIGIBLE * sum) {
        break;
      }
    }
    return Math.min(1, sum);
  }

  private double tail(int j, double x, boolean upper) {
    ChiSquaredDistribution central = ChiSquaredDistribution.of(degreesOfFreedom + 2.0 * j);
    return upper ? central.survivalProbability(x) : central.cumulativeProbability(x);
  }
}
