package dev.holdfast.plan;

import java.util.Map;
import java.util.Optional;

/**
 * How a figure was made, as far as the plan says: convention's key to the word or number written.
 * Those of the analysis stand over those of the study.
 *
 * @param stated such as {@code reference} to {@code normal}
 */
public record Conventions(Map<String, Word> stated) {
  /** The word stated for a convention. */
  public Optional<String> of(String key) {
    return Optional.ofNullable(stated.get(key)).map(Word::text);
  }
}
