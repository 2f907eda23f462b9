package dev.holdfast.numeric;

import java.util.Arrays;
import java.util.function.DoubleUnaryOperator;

/**
 * Means of functions of S = sqrt(V / ν), V chi-square with ν degrees of freedom, as integrals over
 * u = log S.
 *
 * <p>In u the density is sqrt(ν/π) exp(-ε(ν/2) - ν/2 (e^2u - 1 - 2u)), ε Stirling's error: it peaks
 * at 0 and no part of the exponent cancels, whatever ν.
 */
final class ChiMean {
  /** Up from here the density is near enough Gaussian for the trapezoidal rule at half a width. */
  private static final double GAUSSIAN = 25;

  /** Fewer degrees of freedom leave a long flat stretch, which is left to adaptive panels. */
  private static final double FEW = 0.5;

  private static final double LOG_RANGE = 42;
  private static final GaussLegendre RULE = GaussLegendre.of(20);
  private static final double LOG_PI = 1.1447298858494002;

  private ChiMean() {}

  /** The logarithm of the density of u, without its constant. */
  static double exponent(double df, double u) {
    return -0.5 * df * LogTerms.expExcess(2 * u);
  }

  static double logConstant(double df) {
    return 0.5 * (StrictMath.log(df) - LOG_PI) - LogTerms.stirlingError(0.5 * df);
  }

  /**
   * The logarithm of the mean of a function of S over S between two limits.
   *
   * @param logOfFunction the logarithm of the function at u = log S; log-concave in S
   * @param low the lower limit of u, may be infinite
   * @param high the upper limit of u, may be infinite
   * @param breaks from {@link #breaks}
   */
  static double log(
      double df, DoubleUnaryOperator logOfFunction, double low, double high, double... breaks) {
    return logConstant(df)
        + UnimodalQuadrature.log(
            u -> exponent(df, u) + logOfFunction.applyAsDouble(u),
            low,
            high,
            Math.max(low, Math.min(high, 0)),
            1 / Math.sqrt(2 * df),
            breaks);
  }

  /**
   * Points in u about which a function of shift + slope S may turn from flat to steep within less
   * than the width of the density of u.
   */
  static double[] breaks(double df, double shift, double slope) {
    double width = Math.min(1, 1 / Math.abs(shift));
    boolean isStep = shift * slope < 0 && width < 0.3 * Math.min(1, 1 / Math.sqrt(2 * df));
    boolean isFlat = df < 2;
    double[] points = new double[(isStep ? 5 : 0) + (isFlat ? 11 : 0)];
    int count = 0;
    if (isStep) {
      double at = StrictMath.log(-shift / slope);
      for (double offset : new double[] {-9, -3, 0, 3, 9}) {
        points[count++] = at + offset * width;
      }
    }
    if (isFlat) {
      // Both factors leave their limit for u to minus infinity exponentially.
      double knee =
          -StrictMath.log(Math.max(1e-300, Math.abs(slope)) * Math.max(1, Math.abs(shift)));
      for (double offset : new double[] {-36, -16, -7, -3, 0, 2}) {
        points[count++] = knee + offset;
      }
      for (double offset : new double[] {-18, -8, -3, -1, 0.5}) {
        points[count++] = offset;
      }
    }
    Arrays.sort(points);
    return points;
  }

  /** The mean of P(Z > shift + slope S), for any real shift and slope. */
  static double ofNormalTail(double df, double shift, double slope) {
    if (df >= GAUSSIAN && shift >= 0 && slope >= 0) {
      return trapezoid(df, shift, slope);
    }
    if (df >= FEW && shift >= 0 && slope > 0) {
      return panels(df, shift, slope);
    }
    return StrictMath.exp(
        log(
            df,
            logNormalTail(shift, slope),
            Double.NEGATIVE_INFINITY,
            Double.POSITIVE_INFINITY,
            breaks(df, shift, slope)));
  }

  /** log P(Z > shift + slope e^u), as a function of u. */
  static DoubleUnaryOperator logNormalTail(double shift, double slope) {
    double atOne = shift + slope;
    return u -> Normal.logSurvival(linear(shift, slope, atOne, u));
  }

  /** shift + slope e^u; near u = 0, where a large df puts the mass, without cancellation. */
  static double linear(double shift, double slope, double atOne, double u) {
    return Math.abs(u) < 0.1
        ? atOne + slope * StrictMath.expm1(u)
        : shift + slope * StrictMath.exp(u);
  }

  /** The logarithm of the density of (Z + delta)/S at t. */
  static double logNormalDensity(double df, double delta, double t) {
    double atOne = t - delta;
    return log(
        df,
        u -> u + Normal.logDensity(linear(-delta, t, atOne, u)),
        Double.NEGATIVE_INFINITY,
        Double.POSITIVE_INFINITY,
        breaks(df, -delta, t));
  }

  /** The trapezoidal rule about the peak; its error falls like exp(-2π² (width/step)²). */
  private static double trapezoid(double df, double shift, double slope) {
    double u = peak(df, shift, slope);
    double step = 0.5 / Math.sqrt(curvature(df, shift, slope, u));
    double top = logTail(df, shift, slope, u);
    double sum = 1;
    for (int side = -1; side <= 1; side += 2) {
      double part;
      int i = side;
      do {
        part = StrictMath.exp(logTail(df, shift, slope, u + i * step) - top);
        sum += part;
        i += side;
      } while (part > 1e-18 * sum);
    }
    return step * sum * StrictMath.exp(top + logConstant(df));
  }

  /**
   * Gauss-Legendre on panels that widen away from the peak, for few degrees of freedom. The
   * exponent is concave: to the left it stays below its asymptote, to the right below a parabola in
   * s.
   */
  private static double panels(double df, double shift, double slope) {
    double peak = peak(df, shift, slope);
    double s = StrictMath.exp(peak);
    double top = logTail(df, shift, slope, peak);
    double left = Math.min(peak, (top - 0.5 * df - LOG_RANGE - Normal.logSurvival(shift)) / df);
    // The second derivative of log P(Z > z) is below -2/π for positive z.
    double reach = Math.sqrt(2 * LOG_RANGE / (df + 0.63 * slope * slope));
    double right = StrictMath.log(s + reach);
    double middle = 0.5 * (peak + right);
    double sum =
        panel(df, shift, slope, top, peak, middle) + panel(df, shift, slope, top, middle, right);
    double end = peak;
    double width = Math.min(1, 4.5 / Math.sqrt(2 * df));
    while (end > left) {
      double start = Math.max(left, end - width);
      sum += panel(df, shift, slope, top, start, end);
      end = start;
      width *= 1.8;
    }
    return sum * StrictMath.exp(top + logConstant(df));
  }

  private static double panel(
      double df, double shift, double slope, double top, double a, double b) {
    double half = 0.5 * (b - a);
    double centre = 0.5 * (a + b);
    double sum = 0;
    for (int i = 0; i < RULE.order(); i++) {
      double u = centre + half * RULE.node(i);
      double s = StrictMath.exp(u);
      double z = shift + slope * s;
      double exponent = -0.5 * df * (s * s - 1 - 2 * u) - 0.5 * z * z;
      sum += RULE.weight(i) * StrictMath.exp(exponent - top) * Normal.scaledSurvival(z);
    }
    return half * sum;
  }

  /** Newton's method for the peak of the exponent, concave for a shift and slope not negative. */
  private static double peak(double df, double shift, double slope) {
    // With the normal tail replaced by its exponential part the peak solves a quadratic in s.
    double b = slope * shift;
    double a = df + slope * slope;
    double u = StrictMath.log(2 * df / (b + Math.sqrt(b * b + 4 * a * df)));
    for (int i = 0; i < 20; i++) {
      double s = StrictMath.exp(u);
      double derivative = -df * StrictMath.expm1(2 * u) - slope * s * hazard(shift + slope * s);
      double curvature = curvature(df, shift, slope, u);
      double move = derivative / curvature;
      u += move;
      if (move * move * curvature < 0.01) {
        break;
      }
    }
    return u;
  }

  /** Minus the second derivative of the exponent in u. */
  private static double curvature(double df, double shift, double slope, double u) {
    double s = StrictMath.exp(u);
    double z = shift + slope * s;
    double hazard = hazard(z);
    return 2 * df * s * s + slope * s * (hazard + slope * s * Math.max(0, hazard * (hazard - z)));
  }

  private static double hazard(double z) {
    return Normal.INVERSE_SQRT_TWO_PI / Normal.scaledSurvival(z);
  }

  private static double logTail(double df, double shift, double slope, double u) {
    return exponent(df, u) + Normal.logSurvival(shift + slope * StrictMath.exp(u));
  }
}
