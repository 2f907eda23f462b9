package dev.holdfast.plan;

import java.util.List;
import java.util.Map;
import java.util.Optional;

/**
 * A plan file, read and valid against the schema: every name of a quantity replaced by its figure,
 * defaults carried into the analyses. All maps keep the order of the file.
 *
 * @param study what the study is
 * @param quantities the numbers that the argument rests on, by name
 * @param outcomes what is measured, by name
 * @param analyses the tests planned, by name
 * @param families groups of analyses under one error rate, by name
 * @param recruitment how many are enrolled and how many are lost
 * @param registration when and where the plan was registered
 * @param amendments changes after registration, in the order of the file
 * @param waivers findings excused, in the order of the file
 */
public record Plan(
    Study study,
    Map<String, Quantity> quantities,
    Map<String, Outcome> outcomes,
    Map<String, Analysis> analyses,
    Map<String, Family> families,
    Optional<Recruitment> recruitment,
    Optional<Registration> registration,
    List<Amendment> amendments,
    List<Waiver> waivers) {}
