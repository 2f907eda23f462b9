package dev.holdfast.numeric;

import java.util.function.DoubleUnaryOperator;
import org.apache.commons.rng.UniformRandomProvider;
import org.apache.commons.statistics.distribution.ContinuousDistribution;

/**
 * A distribution that computes the smaller of its two tails and gets the other from it, so that the
 * two always add to one and the smaller keeps all its digits.
 */
abstract class TwoTailed implements ContinuousDistribution {
  /** A tail found to be above this is not the smaller one. */
  private static final double UPPER_HALF = 0.6;

  private static final double HALF_STEP = 0x1p-54;

  /** P(X ≤ x) for x inside the support; need only be right up to UPPER_HALF. */
  abstract double lowerTail(double x);

  /** P(X > x) for x inside the support; need only be right up to UPPER_HALF. */
  abstract double upperTail(double x);

  /** Whether the lower tail is probably the smaller one. */
  abstract boolean isBelowCentre(double x);

  /** Increasing; maps the line onto the support, so that quantiles are smooth on the line. */
  abstract double fromLine(double v);

  /** The inverse of {@link #fromLine}. */
  abstract double toLine(double x);

  /** A point near the middle of the distribution. */
  abstract double centre();

  @Override
  public final double cumulativeProbability(double x) {
    return tail(x, false);
  }

  @Override
  public final double survivalProbability(double x) {
    return tail(x, true);
  }

  private double tail(double x, boolean wantsUpper) {
    Domain.number("x", x);
    if (x <= getSupportLowerBound()) {
      return wantsUpper ? 1 : 0;
    }
    if (x >= getSupportUpperBound()) {
      return wantsUpper ? 0 : 1;
    }
    boolean isUpper = !isBelowCentre(x);
    double value = isUpper ? upperTail(x) : lowerTail(x);
    if (!(value <= UPPER_HALF)) {
      isUpper = !isUpper;
      value = isUpper ? upperTail(x) : lowerTail(x);
    }
    double clipped = Math.max(0, Math.min(1, value));
    return isUpper == wantsUpper ? clipped : 1 - clipped;
  }

  @Override
  public final double inverseCumulativeProbability(double p) {
    Domain.probability("p", p);
    return p > 0.5 ? quantile(1 - p, true) : quantile(p, false);
  }

  @Override
  public final double inverseSurvivalProbability(double p) {
    Domain.probability("p", p);
    return p > 0.5 ? quantile(1 - p, false) : quantile(p, true);
  }

  /** The point whose tail is p, p not above one half. */
  private double quantile(double p, boolean upper) {
    if (p == 0) {
      return upper ? getSupportUpperBound() : getSupportLowerBound();
    }
    double logP = StrictMath.log(p);
    DoubleUnaryOperator distance =
        v -> {
          double x = fromLine(v);
          double tail = upper ? survivalProbability(x) : cumulativeProbability(x);
          double gap = StrictMath.log(tail) - logP;
          return Math.max(-1e4, upper ? -gap : gap);
        };
    double start = toLine(centre());
    double v = Search.increasing(distance, start, 0.5);
    return polished(fromLine(v), p, upper);
  }

  /** One step of Newton, which undoes the rounding of the line. */
  private double polished(double x, double p, boolean upper) {
    if (!(x > getSupportLowerBound() && x < getSupportUpperBound())) {
      return x;
    }
    double tail = upper ? survivalProbability(x) : cumulativeProbability(x);
    double density = density(x);
    double move = (upper ? tail - p : p - tail) / density;
    double moved = x + move;
    boolean isSmall = Math.abs(move) < 1e-6 * Math.abs(x);
    return isSmall && moved > getSupportLowerBound() && moved < getSupportUpperBound() ? moved : x;
  }

  @Override
  public final ContinuousDistribution.Sampler createSampler(UniformRandomProvider rng) {
    // The inversion point is the middle of a cell, so it is never 0 or 1.
    return () -> inverseCumulativeProbability((rng.nextLong() >>> 11) * 0x1p-53 + HALF_STEP);
  }
}
