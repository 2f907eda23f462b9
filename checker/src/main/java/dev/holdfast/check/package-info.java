/**
 * Verdicts: what a plan's assumptions give for each of its claims, what follows for the plan as a
 * whole, how far each quantity can move. One class a finding is in {@code check.rule}; the findings
 * are listed in {@link dev.holdfast.check.FindingKind}.
 *
 * <p>Nothing here reads a file, a clock or a repository, and nothing prints. This package uses
 * {@code plan}, {@code family} and {@code design}.
 */
package dev.holdfast.check;
