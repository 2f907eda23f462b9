package dev.holdfast.plan;

/** Ends the reading of a file that cannot be read further. */
final class Malformed extends Exception {
  private static final long serialVersionUID = 1L;

  private final transient PlanProblem problem;

  Malformed(PlanProblem problem) {
    super(problem.message(), null, false, false);
    this.problem = problem;
  }

  Malformed(String message, String remedy, Place place) {
    this(new PlanProblem(message, remedy, place));
  }

  PlanProblem problem() {
    return problem;
  }
}
