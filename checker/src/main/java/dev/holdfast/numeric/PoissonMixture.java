package dev.holdfast.numeric;

import java.util.function.DoubleUnaryOperator;

/**
 * Tails of Poisson mixtures of gamma and beta distributions: the sum over j ≥ 0 of the Poisson
 * weight at j + offset, times the tail of the component of shape a + j.
 *
 * <p>Neighbouring components differ by one positive term. Lower tails are summed from the top down
 * and upper tails from the bottom up, so components only ever grow by additions and errors die out;
 * the sum covers the places where its terms, weight times tail, are not negligible, and these may
 * lie far from the heaviest weight. Weight times component is carried as the product of a term
 * ratio and a tail-over-term ratio, neither of which can underflow, and is put to scale once, at
 * its peak. The cost grows with the square root of the noncentrality, up to a bound: long sums are
 * taken from samples.
 *
 * <p>Recurrences of this kind: Benton and Krishnamoorthy (2003), Computational Statistics and Data
 * Analysis 43, 249-267.
 */
final class PoissonMixture {
  /** Terms below exp(-LOG_RANGE) of the largest are left out. */
  private static final double LOG_RANGE = 42;

  /** A mean below this changes no digit of either tail. */
  private static final double NO_MEAN = 1e-60;

  /** From this index on the sum is replaced by its samples at a stride. */
  private static final double MANY = 3e6;

  /** No sum of terms this small is a positive double. */
  private static final double UNDERFLOW = -800;

  /** Where tail over term exceeds this, the tail is 1 to all digits. */
  private static final double CERTAIN = 1e100;

  /** Up to this index it is cheaper to follow the terms than to bound them. */
  private static final double FEW = 10;

  private static final double NEGLIGIBLE = 1e-18;

  private final DoubleDouble mean;
  private final double offset;
  private final DoubleDouble shape;
  private final double b;
  private final DoubleDouble x;
  private final DoubleDouble y;
  private final double constant;
  private final double slope;

  private PoissonMixture(
      DoubleDouble mean, double offset, double shape, double b, DoubleDouble x, DoubleDouble y) {
    this.mean = mean.hi() < NO_MEAN ? DoubleDouble.of(0) : mean;
    this.offset = offset;
    this.shape = DoubleDouble.of(shape);
    this.b = b;
    this.x = x;
    this.y = y;
    // The quotient of neighbouring component terms at shape s is (constant + slope s) / (s + 1).
    this.constant = isGamma() ? x.hi() : x.hi() * b;
    this.slope = isGamma() ? 0 : x.hi();
  }

  /** Components with distribution functions P(shape + j, x). */
  static PoissonMixture ofGammas(double mean, double shape, double x) {
    return new PoissonMixture(
        DoubleDouble.of(mean),
        0,
        shape,
        Double.POSITIVE_INFINITY,
        DoubleDouble.of(x),
        DoubleDouble.of(1));
  }

  /** Components with distribution functions I_x(shape + j, b), where x + y = 1. */
  static PoissonMixture ofBetas(
      DoubleDouble mean, double offset, double shape, double b, DoubleDouble x, DoubleDouble y) {
    return new PoissonMixture(mean, offset, shape, b, x, y);
  }

  private boolean isGamma() {
    return b == Double.POSITIVE_INFINITY;
  }

  /** The lower tail; exact to rounding where it is not much above one half. */
  double lower() {
    double peak = Math.min(mean.hi(), balance());
    if (peak > MANY) {
      return strided(peak, this::lowerRatio);
    }
    double anchor = Math.floor(Math.max(0, peak - offset));
    double j = top(anchor);
    double ratio = lowerRatio(j);
    double term = 1;
    double sum = 0;
    double scale = 1;
    while (true) {
      double part = term * ratio;
      sum += part;
      if (j == anchor) {
        scale = term;
      }
      if (j == 0 || j < anchor && !(part > NEGLIGIBLE * sum)) {
        break;
      }
      double s = shape.hi() + (j - 1);
      double step = (constant + slope * s) / (s + 1);
      ratio = 1 + ratio * step;
      term *= (j + offset) / (mean.hi() * step);
      j -= 1;
    }
    return sum / scale * StrictMath.exp(logTerm(anchor));
  }

  /** The index above which the lower tail has only negligible terms. */
  private double top(double anchor) {
    if (mean.hi() == 0) {
      return 0;
    }
    if (anchor > FEW) {
      // Bernstein's bound for a Poisson tail.
      return Math.ceil(
          anchor + LOG_RANGE / 3 + Math.sqrt(LOG_RANGE * (LOG_RANGE / 9 + 2 * anchor)));
    }
    double j = anchor;
    for (double fall = 1; fall > NEGLIGIBLE; j++) {
      double s = shape.hi() + j;
      double step = (constant + slope * s) / (s + 1);
      fall *= mean.hi() * Math.min(1, step) / (j + offset + 1);
    }
    return j;
  }

  /** The upper tail; exact to rounding where it is not much above one half. */
  double upper() {
    double peak = Math.max(mean.hi(), balance());
    if (peak > MANY) {
      return strided(peak, this::upperRatio);
    }
    double anchor = mean.hi() == 0 ? 0 : Math.floor(Math.max(0, peak - offset));
    double j = Math.max(0, Math.floor(anchor - Math.sqrt(2 * LOG_RANGE * peak)));
    double ratio = upperRatio(j);
    double term = 1;
    double sum = 0;
    double scale = 1;
    while (true) {
      double part = term * ratio;
      sum += part;
      if (j == anchor) {
        scale = term;
      }
      if (j >= anchor && !(part > NEGLIGIBLE * sum) || mean.hi() == 0) {
        break;
      }
      if (ratio > CERTAIN) {
        if (j < anchor) {
          return 1;
        }
        sum += part * restOfWeights(j + offset);
        break;
      }
      double s = shape.hi() + j;
      double step = (constant + slope * s) / (s + 1);
      ratio = (ratio + 1) / step;
      term *= mean.hi() * step / (j + offset + 1);
      j += 1;
    }
    return sum / scale * StrictMath.exp(logTerm(anchor));
  }

  /**
   * The logarithm of the derivative of the distribution function, by log x for gamma components and
   * by the logit of x for beta components.
   */
  double logSlope() {
    if (mean.hi() == 0) {
      return logTerm(0) + StrictMath.log(shape.hi());
    }
    double peak = balance();
    if (peak > MANY) {
      double anchor = Math.floor(peak - offset);
      double scale = shape.hi() + anchor;
      return logTerm(anchor)
          + StrictMath.log(scale)
          + StrictMath.log(samples(anchor, j -> (shape.hi() + j) / scale));
    }
    double anchor = Math.floor(Math.max(0, peak - offset));
    double sum = shape.hi() + anchor;
    double term = 1;
    double part;
    double j = anchor;
    do {
      double s = shape.hi() + j;
      term *= mean.hi() * (constant + slope * s) / ((s + 1) * (j + offset + 1));
      part = term * (s + 1);
      sum += part;
      j += 1;
    } while (part > NEGLIGIBLE * sum);
    term = 1;
    part = sum;
    for (j = anchor; j > 0 && part > NEGLIGIBLE * sum; j--) {
      double s = shape.hi() + (j - 1);
      term *= (s + 1) * (j + offset) / (mean.hi() * (constant + slope * s));
      part = term * s;
      sum += part;
    }
    return logTerm(anchor) + StrictMath.log(sum);
  }

  private double strided(double peak, DoubleUnaryOperator ratio) {
    double anchor = Math.floor(peak - offset);
    double top = logTerm(anchor);
    return top < UNDERFLOW ? 0 : samples(anchor, ratio) * StrictMath.exp(top);
  }

  /**
   * The sum of a smooth peak over the integers, relative to the term at the peak, from its values
   * half a width apart: by Poisson's summation formula the two differ by less than rounding. The
   * samples lie at whole numbers, which doubles hold exactly.
   */
  private double samples(double anchor, DoubleUnaryOperator factor) {
    double s = shape.hi() + anchor;
    double width = 1 / Math.sqrt(1 / anchor + 1 / s - (isGamma() ? 0 : 1 / (s + b)));
    double stride = Math.floor(0.5 * width);
    double top = logTerm(anchor);
    double sum = factor.applyAsDouble(anchor);
    for (int side = -1; side <= 1; side += 2) {
      double part;
      double j = anchor + side * stride;
      do {
        part = StrictMath.exp(logTerm(j) - top) * factor.applyAsDouble(j);
        sum += part;
        j += side * stride;
      } while (part > NEGLIGIBLE * sum && j > 0);
    }
    return stride * sum;
  }

  /** The Poisson weights above k over that at k. */
  private double restOfWeights(double k) {
    double sum = 0;
    double weight = 1;
    double index = k;
    do {
      index += 1;
      weight *= mean.hi() / index;
      sum += weight;
    } while (weight > NEGLIGIBLE * sum);
    return sum;
  }

  /** The real index at which the product of weight and component term is largest. */
  private double balance() {
    double h = shape.hi() - mean.hi() * slope;
    double p = mean.hi() * (constant + slope * shape.hi());
    double root = Math.sqrt(h * h + 4 * p);
    return h > 0 ? 2 * p / (h + root) : 0.5 * (root - h);
  }

  private double logTerm(double j) {
    double weight = mean.hi() == 0 ? 0 : LogTerms.poisson(DoubleDouble.sum(j, offset), mean);
    DoubleDouble s = shape.plus(j);
    if (isGamma()) {
      return weight + LogTerms.poisson(s, x);
    }
    return weight + LogTerms.beta(s.hi(), b, x.hi(), y.hi(), difference(s));
  }

  private double difference(DoubleDouble s) {
    return isGamma() ? x.minus(s).hi() : x.times(b).minus(y.times(s)).hi();
  }

  private double lowerRatio(double j) {
    DoubleDouble s = shape.plus(j);
    return isGamma()
        ? GammaTail.lower(s.hi(), x.hi(), difference(s))
        : BetaTail.lower(s.hi(), b, x.hi(), y.hi(), difference(s));
  }

  private double upperRatio(double j) {
    DoubleDouble s = shape.plus(j);
    return isGamma()
        ? GammaTail.upper(s.hi(), x.hi(), difference(s))
        : BetaTail.upper(s.hi(), b, x.hi(), y.hi(), difference(s));
  }
}
