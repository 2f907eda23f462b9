package dev.holdfast.numeric;

/**
 * A computed number and a bound on its error.
 *
 * @param value the result
 * @param error an estimate of the absolute error of {@code value}, not negative
 */
public record Estimate(double value, double error) {}
