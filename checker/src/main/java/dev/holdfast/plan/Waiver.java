package dev.holdfast.plan;

import java.util.Optional;

/**
 * A finding that the team excuses.
 *
 * @param finding name of the finding
 * @param at dotted path of what it concerns, such as {@code analyses.fatigue-lower}
 * @param reason why it is excused
 * @param until ISO date of the last day on which it holds
 * @param place where the entry starts
 */
public record Waiver(Word finding, Word at, String reason, Optional<String> until, Place place) {}
