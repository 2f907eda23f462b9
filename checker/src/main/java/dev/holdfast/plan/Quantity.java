package dev.holdfast.plan;

import java.util.Optional;

/**
 * A number that the argument rests on.
 *
 * @param name its key
 * @param figure its value
 * @param unit its unit of measurement
 * @param meaning what it is, in words
 * @param source where it comes from
 * @param place where its key is written
 */
public record Quantity(
    String name,
    Figure figure,
    Optional<String> unit,
    Optional<String> meaning,
    Optional<Source> source,
    Place place) {}
