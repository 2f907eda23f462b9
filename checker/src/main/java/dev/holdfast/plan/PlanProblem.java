package dev.holdfast.plan;

/**
 * Why a file is no valid plan.
 *
 * @param message what is wrong, as a sentence without its place
 * @param remedy what to do about it, as a sentence
 * @param place where
 */
public record PlanProblem(String message, String remedy, Place place) {}
