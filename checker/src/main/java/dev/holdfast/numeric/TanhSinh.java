package dev.holdfast.numeric;

import java.util.function.DoubleUnaryOperator;

/**
 * Integration over a finite interval by the double exponential rule.
 *
 * <p>The substitution x = tanh(π/2 sinh u) of Takahasi and Mori (1974), Publications of the RIMS 9,
 * 721-741, turns the integrand into one that the trapezoidal rule sums with an error falling
 * exponentially, even when the integrand or its derivatives are infinite at an end. The step is
 * halved until two sums agree.
 */
public final class TanhSinh {
  private static final int MAX_HALVINGS = 9;
  private static final double LIMIT = 4;

  private TanhSinh() {}

  /** A function given its argument and, without cancellation, the distance to the nearer end. */
  @FunctionalInterface
  public interface EndpointFunction {
    /**
     * Returns the value at {@code x}.
     *
     * @param x the argument, inside the interval or, by rounding, on its end
     * @param fromEnd the distance from x to the nearer end: positive from the left end, negative
     *     from the right end
     */
    double at(double x, double fromEnd);
  }

  /**
   * Returns the integral of {@code f} from {@code a} to {@code b}.
   *
   * @param f finite inside the interval; values that are not finite at its very ends are left out
   * @param a the lower end, finite
   * @param b the upper end, finite
   * @param relative the relative accuracy wanted, at least 1e-15
   * @return the integral, with the difference of the last two sums as its error
   */
  public static Estimate integrate(DoubleUnaryOperator f, double a, double b, double relative) {
    return integrate((x, fromEnd) -> f.applyAsDouble(x), a, b, relative);
  }

  /** As the other form, for a function that needs the distance to the nearer end. */
  public static Estimate integrate(EndpointFunction f, double a, double b, double relative) {
    double half = 0.5 * b - 0.5 * a;
    double step = 1;
    double sum = f.at(0.5 * a + 0.5 * b, half) * 0.5 * Math.PI;
    for (double u = step; u <= LIMIT; u += step) {
      sum += pair(f, a, b, half, u);
    }
    double before = sum * step * half;
    double error = Math.abs(before);
    for (int level = 0; level < MAX_HALVINGS; level++) {
      step /= 2;
      for (double u = step; u <= LIMIT; u += 2 * step) {
        sum += pair(f, a, b, half, u);
      }
      double now = sum * step * half;
      error = Math.abs(now - before);
      before = now;
      // The error of the finer sum is about the square of the difference.
      if (level > 1 && error <= Math.max(1e-15, relative) * Math.abs(now)) {
        break;
      }
    }
    return new Estimate(before, error);
  }

  private static double pair(EndpointFunction f, double a, double b, double half, double u) {
    double q = StrictMath.exp(-Math.PI * StrictMath.sinh(u));
    double fromEnd = half * 2 * q / (1 + q);
    double weight = 2 * Math.PI * StrictMath.cosh(u) * q / ((1 + q) * (1 + q));
    double left = f.at(a + fromEnd, fromEnd);
    double right = f.at(b - fromEnd, -fromEnd);
    return weight * ((Double.isFinite(left) ? left : 0) + (Double.isFinite(right) ? right : 0));
  }
}
