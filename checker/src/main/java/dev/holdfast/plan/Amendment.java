package dev.holdfast.plan;

import java.util.Optional;

/**
 * A change made after registration.
 *
 * @param date ISO date
 * @param changes dotted path of what changed, such as {@code quantities.onset-sd}
 * @param reason why
 * @param beforeData whether it was made before data were seen
 * @param place where the entry starts
 */
public record Amendment(
    String date, Word changes, String reason, Optional<Boolean> beforeData, Place place) {}
