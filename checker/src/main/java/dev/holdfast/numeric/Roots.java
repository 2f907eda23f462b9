package dev.holdfast.numeric;

import java.util.function.DoubleUnaryOperator;

/**
 * Roots of continuous functions of one variable, bracketed throughout.
 *
 * <p>The method is that of Brent (1973), Algorithms for Minimization without Derivatives, chapter
 * 4: inverse quadratic interpolation and secants, with bisection whenever they fail to shrink the
 * bracket. It needs no derivative and never leaves the bracket.
 */
public final class Roots {
  private static final int MAX_STEPS = 2200;

  private Roots() {}

  /**
   * Returns a root of {@code f} between {@code a} and {@code b}.
   *
   * @param f a continuous function whose values at {@code a} and {@code b} differ in sign
   * @param a one end, finite
   * @param b the other end, finite, in either order
   * @param relative the accuracy wanted, relative to the root; 0 for all that doubles can give
   * @throws IllegalArgumentException if an end is not finite, or the values at the ends do not
   *     differ in sign
   */
  public static double bracketed(DoubleUnaryOperator f, double a, double b, double relative) {
    if (!Double.isFinite(a) || !Double.isFinite(b)) {
      throw new IllegalArgumentException(
          "the bracket is " + a + " to " + b + "; it must be finite");
    }
    return bracketed(f, a, f.applyAsDouble(a), b, f.applyAsDouble(b), relative);
  }

  /** As {@link #bracketed(DoubleUnaryOperator, double, double, double)}, the end values known. */
  static double bracketed(
      DoubleUnaryOperator f, double start, double atStart, double end, double atEnd, double tol) {
    if (!(atStart <= 0 && atEnd >= 0 || atStart >= 0 && atEnd <= 0)) {
      throw new IllegalArgumentException(
          "f is "
              + atStart
              + " at "
              + start
              + " and "
              + atEnd
              + " at "
              + end
              + "; the signs must differ");
    }
    double a = start;
    double fa = atStart;
    double b = end;
    double fb = atEnd;
    double c = a;
    double fc = fa;
    double step = b - a;
    double previous = step;
    for (int i = 0; i < MAX_STEPS; i++) {
      if (fb > 0 == fc > 0) {
        c = a;
        fc = fa;
        step = b - a;
        previous = step;
      }
      if (Math.abs(fc) < Math.abs(fb)) {
        a = b;
        fa = fb;
        b = c;
        fb = fc;
        c = a;
        fc = fa;
      }
      double near = Math.max(Math.ulp(b), 0.5 * tol * Math.abs(b));
      double half = 0.5 * c - 0.5 * b;
      if (fb == 0 || Math.abs(half) <= near) {
        return b;
      }
      double next = half;
      double before = half;
      if (Math.abs(previous) >= near && Math.abs(fa) > Math.abs(fb)) {
        double candidate = interpolated(a, fa, b, fb, c, fc, half);
        if (2 * Math.abs(candidate) < Math.min(3 * Math.abs(half) - near, Math.abs(previous))) {
          next = candidate;
          before = step;
        }
      }
      previous = before;
      step = next;
      a = b;
      fa = fb;
      b += Math.abs(step) > near ? step : Math.copySign(near, half);
      fb = f.applyAsDouble(b);
    }
    return b;
  }

  /** The step from b proposed by inverse quadratic interpolation; NaN-safe: NaN is refused. */
  private static double interpolated(
      double a, double fa, double b, double fb, double c, double fc, double half) {
    double s = fb / fa;
    double p;
    double q;
    if (a == c) {
      p = 2 * half * s;
      q = 1 - s;
    } else {
      double u = fa / fc;
      double r = fb / fc;
      p = s * (2 * half * u * (u - r) - (b - a) * (r - 1));
      q = (u - 1) * (r - 1) * (s - 1);
    }
    // A step away from the bracket is refused by making it too long.
    double candidate = p / -q;
    return Math.signum(candidate) == Math.signum(half) ? candidate : Double.POSITIVE_INFINITY;
  }
}
