/**
 * The rules: one class for each kind of finding, and {@link dev.holdfast.check.rule.Rules}, the
 * list of them. A rule looks at a plan and at the verdicts on its claims, and says what it finds.
 *
 * <p>A rule computes no power itself, prints nothing, and knows no other rule.
 */
package dev.holdfast.check.rule;
