package dev.holdfast.check;

import dev.holdfast.plan.Plan;
import dev.holdfast.plan.PlanReading;
import java.util.List;

/**
 * What a rule sees.
 *
 * @param reading the plan as it was read
 * @param plan the plan
 * @param situations every case of every analysis, in the order of the file
 * @param claims every claim with its verdict
 */
public record StudyView(
    PlanReading reading, Plan plan, List<Situation> situations, List<ClaimResult> claims) {}
