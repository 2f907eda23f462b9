package dev.holdfast.plan;

import java.util.Optional;

/**
 * What the study is.
 *
 * @param title its title
 * @param id the team's short name for it
 * @param justification {@code power}, {@code precision}, {@code resources}, {@code
 *     whole-population}, {@code rule-of-thumb} or {@code none}
 * @param sensitivity what the sample can show, where the justification is not power
 * @param unit the experimental unit, when observations come several to one
 * @param participants {@code humans}, {@code animals}, {@code samples}, {@code records} or {@code
 *     simulated}
 * @param stage {@code draft}, {@code registered}, {@code collecting} or {@code analysed}
 * @param place where the section starts
 */
public record Study(
    String title,
    Optional<String> id,
    String justification,
    Optional<String> sensitivity,
    Optional<String> unit,
    String participants,
    String stage,
    Place place) {}
