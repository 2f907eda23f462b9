package dev.holdfast.design;

/** A choice among published ways to compute the same figure, that a plan may state. */
public enum Convention {
  /** Distribution that the critical value and the power come from. */
  REFERENCE("reference"),
  /** Which variance stands under the null hypothesis and under the alternative. */
  VARIANCE("variance"),
  /** Whether a continuity correction was made. */
  CONTINUITY("continuity"),
  /** Formula for the number of events. */
  EVENTS_BY("events-by");

  private final String key;

  Convention(String key) {
    this.key = key;
  }

  /** The key of the plan file. */
  public String key() {
    return key;
  }
}
