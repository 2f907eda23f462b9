package dev.holdfast.numeric;

import java.util.Arrays;
import java.util.function.DoubleUnaryOperator;

/**
 * The integral of a positive function with a single peak, given by its logarithm.
 *
 * <p>The peak is found first, then the places to both sides where the function has fallen by a
 * factor of 1e-18, and the stretch between them is integrated by Gauss-Legendre panels halved until
 * halving changes nothing. Nothing cancels and nothing underflows, so the relative error does not
 * depend on how small the integral is.
 */
final class UnimodalQuadrature {
  private static final GaussLegendre RULE = GaussLegendre.of(16);
  private static final double LOG_RANGE = 42;
  private static final double TOLERANCE = 1e-12;

  /** More are asked for only when the function itself is too rough for the tolerance. */
  private static final int MAX_HALVINGS = 200;

  private static final double GOLDEN = 0.3819660112501051;

  private final DoubleUnaryOperator log;
  private final double shift;
  private int halvings;

  private UnimodalQuadrature(DoubleUnaryOperator log, double shift) {
    this.log = log;
    this.shift = shift;
  }

  /**
   * Returns the logarithm of the integral of exp(log) from {@code low} to {@code high}.
   *
   * @param log rises to one peak and falls; minus infinity where the function is 0
   * @param low the lower limit, may be infinite
   * @param high the upper limit, may be infinite, above low
   * @param start a point within the limits
   * @param step a first step, about the width of the peak
   * @param breaks increasing points at which flat stretches end, where a panel might not see it
   */
  static double log(
      DoubleUnaryOperator log,
      double low,
      double high,
      double start,
      double step,
      double... breaks) {
    double peak = peak(log, low, high, start, step);
    double top = log.applyAsDouble(peak);
    if (top == Double.NEGATIVE_INFINITY) {
      return top;
    }
    UnimodalQuadrature quadrature = new UnimodalQuadrature(log, top);
    double left = quadrature.edge(peak, -step, low);
    double right = quadrature.edge(peak, step, high);
    double[] ends = ends(left, peak, right, breaks);
    double[] rough = new double[ends.length - 1];
    double total = 0;
    for (int i = 0; i < rough.length; i++) {
      rough[i] = quadrature.panel(ends[i], ends[i + 1]);
      total += rough[i];
    }
    // A logarithm of large size carries its own rounding, which no halving removes.
    double tolerance = Math.max(TOLERANCE, 1e-15 * Math.abs(top)) * total;
    double sum = 0;
    for (int i = 0; i < rough.length; i++) {
      quadrature.halvings = 0;
      sum += quadrature.refined(ends[i], ends[i + 1], rough[i], tolerance);
    }
    return top + StrictMath.log(sum);
  }

  private static double[] ends(double left, double peak, double right, double[] breaks) {
    double[] ends = new double[breaks.length + 3];
    int count = 0;
    ends[count++] = left;
    boolean peakIsIn = peak == left;
    for (double point : breaks) {
      if (!peakIsIn && point >= peak) {
        ends[count++] = peak;
        peakIsIn = true;
      }
      if (point > ends[count - 1] && point < right) {
        ends[count++] = point;
      }
    }
    if (!peakIsIn && peak < right) {
      ends[count++] = peak;
    }
    ends[count++] = right;
    return Arrays.copyOf(ends, count);
  }

  /** Golden sections, until the three points differ by less than one in the logarithm. */
  private static double peak(
      DoubleUnaryOperator log, double low, double high, double start, double step) {
    double b = start;
    double fb = log.applyAsDouble(b);
    double a = Math.max(low, start - step);
    double fa = log.applyAsDouble(a);
    double c = Math.min(high, start + step);
    double fc = log.applyAsDouble(c);
    double width = step;
    while (fa > fb && a > low) {
      width *= 2;
      c = b;
      fc = fb;
      b = a;
      fb = fa;
      a = Math.max(low, b - width);
      fa = log.applyAsDouble(a);
    }
    while (fc > fb && c < high) {
      width *= 2;
      a = b;
      fa = fb;
      b = c;
      fb = fc;
      c = Math.min(high, b + width);
      fc = log.applyAsDouble(c);
    }
    for (int i = 0; i < 200 && Math.max(fb, Math.max(fa, fc)) - Math.min(fa, fc) > 1; i++) {
      boolean leftIsLonger = b - a > c - b;
      double x = leftIsLonger ? b - GOLDEN * (b - a) : b + GOLDEN * (c - b);
      double fx = log.applyAsDouble(x);
      if (leftIsLonger) {
        if (fx > fb) {
          c = b;
          fc = fb;
          b = x;
          fb = fx;
        } else {
          a = x;
          fa = fx;
        }
      } else if (fx > fb) {
        a = b;
        fa = fb;
        b = x;
        fb = fx;
      } else {
        c = x;
        fc = fx;
      }
    }
    if (fa > fb && fa >= fc) {
      return a;
    }
    return fc > fb ? c : b;
  }

  /** A point, up to the limit, beyond which the function is below exp(-LOG_RANGE) of its peak. */
  private double edge(double peak, double step, double limit) {
    if (peak == limit) {
      return peak;
    }
    double inner = peak;
    double outer = peak + step;
    double width = step;
    while (step > 0 ? outer < limit : outer > limit) {
      if (log.applyAsDouble(outer) - shift < -LOG_RANGE) {
        break;
      }
      inner = outer;
      width *= 2;
      outer = inner + width;
    }
    outer = step > 0 ? Math.min(outer, limit) : Math.max(outer, limit);
    if (log.applyAsDouble(outer) - shift > -1.4 * LOG_RANGE) {
      return outer;
    }
    for (int i = 0; i < 60; i++) {
      double middle = 0.5 * (inner + outer);
      double fall = log.applyAsDouble(middle) - shift;
      if (fall < -LOG_RANGE) {
        outer = middle;
        if (fall > -1.4 * LOG_RANGE) {
          break;
        }
      } else {
        inner = middle;
        if (i > 3 && Math.abs(outer - inner) < 0.1 * Math.abs(outer - peak)) {
          break;
        }
      }
    }
    return outer;
  }

  private double panel(double a, double b) {
    double half = 0.5 * (b - a);
    double centre = 0.5 * (a + b);
    double sum = 0;
    for (int i = 0; i < RULE.order(); i++) {
      sum +=
          RULE.weight(i) * StrictMath.exp(log.applyAsDouble(centre + half * RULE.node(i)) - shift);
    }
    return half * sum;
  }

  private double refined(double a, double b, double whole, double tolerance) {
    double middle = 0.5 * (a + b);
    double left = panel(a, middle);
    double right = panel(middle, b);
    halvings++;
    if (Math.abs(left + right - whole) <= tolerance || halvings > MAX_HALVINGS) {
      return left + right;
    }
    return refined(a, middle, left, tolerance) + refined(middle, b, right, tolerance);
  }
}
