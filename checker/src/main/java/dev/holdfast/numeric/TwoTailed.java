package dev.holdfast.numeric;

import org.apache.commons.rng.UniformRandomProvider;
import org.apache.commons.statistics.distribution.ContinuousDistribution;

/**
 * A distribution that computes the smaller of its two tails and gets the other from it, so that the
 * two always add to one and the smaller keeps all its digits.
 */
abstract class TwoTailed implements ContinuousDistribution {
  /** A tail found to be above this is not the smaller one. */
  private static final double UPPER_HALF = 0.6;

  /** With the logarithm of the tail this near, one step on the tail itself is exact. */
  private static final double LAST_STEP = 3e-8;

  private static final double MAX_MOVE = 8;
  private static final int MAX_STEPS = 300;
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

  /** The derivative of {@link #fromLine} at the point that it maps to x. */
  abstract double lineScale(double x);

  /** Roughly the point at which the distribution function is that of the normal at z. */
  abstract double guess(double z);

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

  /**
   * The point whose tail is p, p not above one half: Newton's method on the logarithm of the tail,
   * along the line, held inside the bracket found so far.
   */
  private double quantile(double p, boolean upper) {
    if (p == 0) {
      return upper ? getSupportUpperBound() : getSupportLowerBound();
    }
    double logP = StrictMath.log(p);
    double z = Normal.survivalQuantile(p);
    double v = toLine(guess(upper ? z : -z));
    double low = Double.NEGATIVE_INFINITY;
    double high = Double.POSITIVE_INFINITY;
    double stride = 1;
    for (int i = 0; i < MAX_STEPS; i++) {
      double x = fromLine(v);
      double tail = tail(x, upper);
      double gap = StrictMath.log(tail) - logP;
      double density = density(x);
      if (Math.abs(gap) < LAST_STEP) {
        return moved(x, (upper ? tail - p : p - tail) / density);
      }
      double ahead = upper ? gap : -gap;
      if (ahead > 0) {
        low = v;
      } else {
        high = v;
      }
      double next = v + ahead * tail / (density * lineScale(x));
      boolean isInside = next > low && next < high && Math.abs(next - v) < MAX_MOVE;
      if (!isInside) {
        next = between(low, high, v, ahead > 0 ? stride : -stride);
        stride *= 2;
      }
      if (next == v || next == low || next == high) {
        break;
      }
      v = next;
    }
    return fromLine(v);
  }

  private static double between(double low, double high, double v, double stride) {
    return Double.isInfinite(low) || Double.isInfinite(high) ? v + stride : 0.5 * (low + high);
  }

  private double moved(double x, double move) {
    double moved = x + move;
    boolean isSound = Math.abs(move) <= 1e-3 * Math.abs(x) || Math.abs(move) < 1e-6;
    return isSound && moved > getSupportLowerBound() && moved < getSupportUpperBound() ? moved : x;
  }

  @Override
  public final ContinuousDistribution.Sampler createSampler(UniformRandomProvider rng) {
    // The inversion point is the middle of a cell, so it is never 0 or 1.
    return () -> inverseCumulativeProbability((rng.nextLong() >>> 11) * 0x1p-53 + HALF_STEP);
  }
}
