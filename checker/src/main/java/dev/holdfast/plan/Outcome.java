package dev.holdfast.plan;

import java.util.Optional;

/**
 * What is measured.
 *
 * @param name its key
 * @param role {@code primary}, {@code secondary} or {@code exploratory}
 * @param scale {@code continuous}, {@code binary}, {@code ordered}, {@code categories}, {@code
 *     count} or {@code time-to-event}
 * @param unit its unit of measurement
 * @param place where its key is written
 */
public record Outcome(String name, String role, String scale, Optional<String> unit, Place place) {}
