package dev.holdfast.numeric;

import java.util.function.DoubleUnaryOperator;

/** Roots of monotone functions on the whole line, or on a half line. */
final class Search {
  private Search() {}

  /**
   * Returns the root of an increasing function, or the largest finite bracket end when the function
   * does not change sign.
   *
   * @param start where to begin
   * @param step the first step, doubled until the root is bracketed
   */
  static double increasing(DoubleUnaryOperator f, double start, double step) {
    double a = start;
    double fa = f.applyAsDouble(a);
    if (fa == 0) {
      return a;
    }
    double direction = fa < 0 ? 1 : -1;
    double width = step;
    while (width < 1e6) {
      double b = a + direction * width;
      double fb = f.applyAsDouble(b);
      if (fb == 0) {
        return b;
      }
      if (fb > 0 == direction > 0) {
        return Roots.bracketed(f, a, fa, b, fb, 0);
      }
      a = b;
      fa = fb;
      width *= 2;
    }
    return a;
  }

  /**
   * Returns the root in [low, high] of an increasing function that is negative at low.
   *
   * @param atLow the value at low
   * @param start where to begin
   * @return the root, or NaN if the function is still negative at high
   */
  static double within(DoubleUnaryOperator f, double low, double atLow, double high, double start) {
    double a = low;
    double fa = atLow;
    double b = Math.max(low, Math.min(high, start));
    double width = Math.max(1, 0.25 * (b - low));
    while (true) {
      double fb = f.applyAsDouble(b);
      if (fb >= 0) {
        if (fb > 0 && b - width > a) {
          double c = b - width;
          double fc = f.applyAsDouble(c);
          if (fc < 0) {
            a = c;
            fa = fc;
          } else {
            b = c;
            fb = fc;
          }
        }
        return Roots.bracketed(f, a, fa, b, fb, 0);
      }
      if (b >= high) {
        return Double.NaN;
      }
      a = b;
      fa = fb;
      b = Math.min(high, b + width);
      width *= 2;
    }
  }
}
