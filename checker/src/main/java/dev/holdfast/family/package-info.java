/**
 * Several analyses under one error rate: the level that a procedure leaves to each, and the joint
 * chances of success.
 *
 * <p>Nothing here knows plan files or findings. This package uses {@code design} and {@code
 * numeric}.
 */
package dev.holdfast.family;
