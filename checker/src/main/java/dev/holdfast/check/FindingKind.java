package dev.holdfast.check;

import java.util.Optional;

/**
 * The kinds of finding, in the order in which they are listed. Each has a page of documentation of
 * the same name among the resources. A name, once published, never changes its meaning.
 */
public enum FindingKind {
  PLAN_INVALID("plan-invalid", Weight.BLOCKS, "the file is not a valid plan"),
  POWER_DRIFT("power-drift", Weight.BLOCKS, "the claimed power does not follow"),
  TOTAL_DRIFT("total-drift", Weight.BLOCKS, "the claimed number does not follow"),
  DETECTABLE_DRIFT(
      "detectable-drift", Weight.BLOCKS, "the claimed detectable effect does not follow"),
  JOINT_POWER_DRIFT(
      "joint-power-drift", Weight.BLOCKS, "a family's claimed chance does not follow"),
  UNDER_TARGET("under-target", Weight.BLOCKS, "the power lies under the plan's own target"),
  CASES_CONTRADICT(
      "cases-contradict", Weight.BLOCKS, "the plan's own figures contradict each other"),
  CONVENTION_UNSTATED(
      "convention-unstated", Weight.WARNS, "a claim follows only by a convention left unstated"),
  METHOD_OPTIMISTIC(
      "method-optimistic", Weight.WARNS, "true by the stated method, not by the best one"),
  CLAIM_NOT_COMPUTED("claim-not-computed", Weight.WARNS, "a claim could not be computed"),
  SOURCE_MISSING("source-missing", Weight.BLOCKS, "an assumed figure has no source"),
  SOURCE_INCOMPLETE(
      "source-incomplete", Weight.WARNS, "a source lacks what would make it checkable"),
  UNIT_MISMATCH("unit-mismatch", Weight.BLOCKS, "figures that belong together differ in unit"),
  EFFECT_INCONSISTENT(
      "effect-inconsistent", Weight.BLOCKS, "two statements of the same effect disagree"),
  OUTCOMES_UNCORRECTED(
      "outcomes-uncorrected", Weight.BLOCKS, "several primary analyses, no correction"),
  FAMILY_INCOMPLETE("family-incomplete", Weight.WARNS, "a family leaves out an analysis it needs"),
  ALPHA_OVERSPENT("alpha-overspent", Weight.BLOCKS, "a family's levels exceed its alpha"),
  PRIMARY_UNTESTED("primary-untested", Weight.WARNS, "a primary outcome has no analysis"),
  TEST_UNFIT("test-unfit", Weight.BLOCKS, "the test does not fit the outcome"),
  LOSS_IGNORED("loss-ignored", Weight.WARNS, "no loss of participants is planned for"),
  ENROLMENT_SHORT("enrolment-short", Weight.BLOCKS, "too few are enrolled for the loss expected"),
  NOT_WHOLE("not-whole", Weight.BLOCKS, "a number of units is not whole"),
  ONE_SIDED_UNEXPLAINED("one-sided-unexplained", Weight.WARNS, "a one-sided test without a reason"),
  QUANTITY_UNUSED("quantity-unused", Weight.NOTES, "nothing refers to a quantity");

  private final String word;
  private final Weight weight;
  private final String summary;

  FindingKind(String word, Weight weight, String summary) {
    this.word = word;
    this.weight = weight;
    this.summary = summary;
  }

  /** Its name, kebab-case. */
  public String word() {
    return word;
  }

  /** Its weight where nothing else is said. */
  public Weight weight() {
    return weight;
  }

  /** What it says, as a phrase. */
  public String summary() {
    return summary;
  }

  /** The kind of a name. */
  public static Optional<FindingKind> of(String word) {
    for (FindingKind kind : values()) {
      if (kind.word.equals(word)) {
        return Optional.of(kind);
      }
    }
    return Optional.empty();
  }
}
