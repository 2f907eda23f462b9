package dev.holdfast.plan;

import java.util.Map;
import java.util.Optional;

/**
 * How many are enrolled, and what becomes of them.
 *
 * @param enrol number enrolled in all
 * @param enrolByGroup number enrolled by group, when given so
 * @param loss share lost before the analysis
 * @param noLossReason why nobody is lost, where that is so
 * @param place where the section starts
 */
public record Recruitment(
    Optional<Figure> enrol,
    Map<String, Figure> enrolByGroup,
    Optional<Figure> loss,
    Optional<String> noLossReason,
    Place place) {}
