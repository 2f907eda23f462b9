package dev.holdfast.plan;

import java.util.Optional;

/**
 * What an analysis, or one case of it, is computed with; the plan's defaults are already in it.
 *
 * @param alpha the level of the test as used
 * @param sides {@code one} or {@code two}
 * @param targetPower the power aimed at
 * @param conventions how the figures were made
 */
public record Settings(
    Optional<Figure> alpha,
    Optional<Word> sides,
    Optional<Figure> targetPower,
    Conventions conventions) {}
