package dev.holdfast.check;

import java.math.BigDecimal;
import java.math.MathContext;
import java.math.RoundingMode;

/** Rounding and writing of numbers, the same on every machine. */
public final class Numbers {
  private Numbers() {}

  /** Rounds half away from zero, in decimal. */
  public static double round(double value, int decimals) {
    return BigDecimal.valueOf(value).setScale(decimals, RoundingMode.HALF_UP).doubleValue();
  }

  /** Writes a number with a fixed count of decimals. */
  public static String fixed(double value, int decimals) {
    return BigDecimal.valueOf(value).setScale(decimals, RoundingMode.HALF_UP).toPlainString();
  }

  /**
   * Writes a chance with a fixed count of decimals; one that would read as certain or impossible
   * without being so is written as above, or below, the last figure short of that.
   */
  public static String chance(double value, int decimals) {
    String written = fixed(value, decimals);
    BigDecimal last = BigDecimal.ONE.movePointLeft(decimals);
    if (value < 1 && new BigDecimal(written).compareTo(BigDecimal.ONE) >= 0) {
      return "above " + BigDecimal.ONE.subtract(last).toPlainString();
    }
    if (value > 0 && new BigDecimal(written).signum() == 0) {
      return "below " + last.toPlainString();
    }
    return written;
  }

  /** Writes a number with up to four significant digits, without trailing zeros. */
  public static String brief(double value) {
    return significant(value, 4, RoundingMode.HALF_UP);
  }

  /** Writes a number with up to a count of significant digits, without trailing zeros. */
  public static String significant(double value, int digits, RoundingMode mode) {
    if (value == 0) {
      return "0";
    }
    BigDecimal rounded = BigDecimal.valueOf(value).round(new MathContext(digits, mode));
    return rounded.scale() <= 0
        ? rounded.toBigInteger().toString()
        : rounded.stripTrailingZeros().toPlainString();
  }

  /** Writes a count without decimals, or with two where it is not whole. */
  public static String count(double value) {
    return value == Math.rint(value) ? fixed(value, 0) : fixed(value, 2);
  }
}
