/**
 * Distributions that power rests on and no maintained JVM library has, exact tests by enumeration,
 * root finding: pure functions of doubles.
 *
 * <p>Nothing here knows of plans, designs or files. Outside its domain a function throws and names
 * the argument; it never returns NaN or a probability outside [0, 1].
 */
package dev.holdfast.numeric;
