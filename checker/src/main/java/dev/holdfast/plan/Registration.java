package dev.holdfast.plan;

import java.util.Optional;

/**
 * When and where the plan was registered.
 *
 * @param date ISO date
 * @param where the registry
 * @param seal fingerprint of what was registered, as {@code sha256:} and hexadecimal digits
 * @param place where the section starts
 */
public record Registration(
    Optional<String> date, Optional<String> where, Optional<Word> seal, Place place) {}
