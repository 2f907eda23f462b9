package dev.holdfast.plan;

import java.util.List;
import java.util.Map;
import java.util.Optional;

/**
 * One situation of an analysis: assumptions and what is claimed to follow from them. What a case
 * does not say itself, it has from its analysis.
 *
 * @param settings level, sides, target and conventions
 * @param effect the assumed effect and spread, by key of the cell
 * @param effectPlace where the effect stands, or the analysis when it gives none
 * @param sample numbers analysed by group, in the order of the file; empty when not given
 * @param allocation relative sizes of the groups, when given instead of or beside the sample
 * @param events number of events, for designs that count them
 * @param method the published method that made the figures, when stated
 * @param claims what is claimed
 * @param place where the case starts
 */
public record Case(
    Settings settings,
    Map<String, Input> effect,
    Place effectPlace,
    Map<String, Figure> sample,
    Map<String, Figure> allocation,
    Optional<Figure> events,
    Optional<Word> method,
    List<Claim> claims,
    Place place) {}
