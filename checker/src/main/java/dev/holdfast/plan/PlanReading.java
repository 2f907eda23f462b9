package dev.holdfast.plan;

import java.util.List;
import java.util.Optional;
import java.util.Set;

/**
 * What came of reading one file.
 *
 * @param path the file's path as it is reported, with {@code /} between its parts
 * @param plan the plan, when the file is one without any problem
 * @param problems why it is none, in the order of their places
 * @param unusedQuantities names of quantities that nothing refers to
 */
public record PlanReading(
    String path, Optional<Plan> plan, List<PlanProblem> problems, Set<String> unusedQuantities) {}
