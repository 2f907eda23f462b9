package dev.holdfast.numeric;

import java.util.function.DoubleUnaryOperator;

/**
 * Gauss-Legendre quadrature of a fixed order: exact for polynomials of degree 2n - 1.
 *
 * <p>Nodes are the roots of the Legendre polynomial, by Newton's method from the estimate of
 * Tricomi (1950); weights are 2 / ((1 - x²) P'ₙ(x)²) (Abramowitz and Stegun 1964, 25.4.29). Node
 * and weight errors stay below 1e-15. Immutable; make an instance once and keep it.
 */
public final class GaussLegendre {
  private final double[] nodes;
  private final double[] weights;

  private GaussLegendre(double[] nodes, double[] weights) {
    this.nodes = nodes;
    this.weights = weights;
  }

  /**
   * Returns the rule with {@code order} nodes.
   *
   * @param order in [1, 512]
   * @throws IllegalArgumentException if the order is outside its range
   */
  public static GaussLegendre of(int order) {
    if (order < 1 || order > 512) {
      throw new IllegalArgumentException("order is " + order + "; it must lie in [1, 512]");
    }
    double[] nodes = new double[order];
    double[] weights = new double[order];
    for (int i = 0; i < (order + 1) / 2; i++) {
      double x = StrictMath.cos(Math.PI * (i + 0.75) / (order + 0.5));
      if (2 * i + 1 == order) {
        x = 0;
      }
      double slope = 0;
      for (int step = 0; step < 6; step++) {
        double before = 1;
        double p = x;
        for (int k = 2; k <= order; k++) {
          double next = x * p + (k - 1.0) / k * (x * p - before);
          before = p;
          p = next;
        }
        slope = order * (before - x * p) / ((1 - x) * (1 + x));
        x -= p / slope;
      }
      double weight = 2 / ((1 - x) * (1 + x) * slope * slope);
      nodes[i] = -x;
      nodes[order - 1 - i] = x;
      weights[i] = weight;
      weights[order - 1 - i] = weight;
    }
    return new GaussLegendre(nodes, weights);
  }

  /** Returns the number of nodes. */
  public int order() {
    return nodes.length;
  }

  /** Returns node {@code i} on [-1, 1], in increasing order. */
  public double node(int i) {
    return nodes[i];
  }

  /** Returns the weight of node {@code i}; the weights sum to 2. */
  public double weight(int i) {
    return weights[i];
  }

  /** Returns the integral of {@code f} from {@code a} to {@code b}, both finite. */
  public double integrate(DoubleUnaryOperator f, double a, double b) {
    double half = 0.5 * b - 0.5 * a;
    double centre = 0.5 * a + 0.5 * b;
    double sum = 0;
    for (int i = 0; i < nodes.length; i++) {
      sum += weights[i] * f.applyAsDouble(centre + half * nodes[i]);
    }
    return sum * half;
  }
}
