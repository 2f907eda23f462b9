package dev.holdfast.numeric;

/**
 * An unevaluated sum of two doubles, about 31 significant digits.
 *
 * <p>Error-free sums and products after Dekker (1971), Numerische Mathematik 18, 224-242, with a
 * fused multiply-add for the product. Used where a difference of nearly equal parameters enters an
 * exponent; the values must stay clear of overflow and of the subnormal range.
 *
 * @param hi the rounded value
 * @param lo what rounding left over, at most half a unit in the last place of {@code hi}
 */
record DoubleDouble(double hi, double lo) {

  static DoubleDouble of(double value) {
    return new DoubleDouble(value, 0);
  }

  static DoubleDouble sum(double a, double b) {
    double s = a + b;
    double bb = s - a;
    return new DoubleDouble(s, (a - (s - bb)) + (b - bb));
  }

  static DoubleDouble product(double a, double b) {
    double p = a * b;
    return new DoubleDouble(p, Math.fma(a, b, -p));
  }

  static DoubleDouble quotient(double a, double b) {
    double q = a / b;
    return normalized(q, Math.fma(-q, b, a) / b);
  }

  private static DoubleDouble normalized(double a, double b) {
    double s = a + b;
    return new DoubleDouble(s, b - (s - a));
  }

  DoubleDouble plus(DoubleDouble other) {
    DoubleDouble s = sum(hi, other.hi);
    DoubleDouble t = sum(lo, other.lo);
    DoubleDouble u = normalized(s.hi, s.lo + t.hi);
    return normalized(u.hi, u.lo + t.lo);
  }

  DoubleDouble plus(double other) {
    DoubleDouble s = sum(hi, other);
    return normalized(s.hi, s.lo + lo);
  }

  DoubleDouble minus(DoubleDouble other) {
    return plus(other.negated());
  }

  DoubleDouble minus(double other) {
    return plus(-other);
  }

  DoubleDouble times(DoubleDouble other) {
    double p = hi * other.hi;
    double e = Math.fma(hi, other.hi, -p) + (hi * other.lo + lo * other.hi);
    return normalized(p, e);
  }

  DoubleDouble times(double other) {
    double p = hi * other;
    return normalized(p, Math.fma(hi, other, -p) + lo * other);
  }

  DoubleDouble dividedBy(DoubleDouble other) {
    double q = hi / other.hi;
    DoubleDouble rest = minus(other.times(q));
    double q2 = rest.hi / other.hi;
    double q3 = rest.minus(other.times(q2)).hi / other.hi;
    return normalized(q, q2).plus(q3);
  }

  DoubleDouble negated() {
    return new DoubleDouble(-hi, -lo);
  }

  double toDouble() {
    return hi + lo;
  }
}
