package dev.holdfast.check;

import dev.holdfast.plan.Analysis;
import dev.holdfast.plan.Figure;
import dev.holdfast.plan.Plan;
import dev.holdfast.plan.Recruitment;
import java.util.Optional;

/** The share lost before an analysis. */
public final class Losses {
  private Losses() {}

  /** The analysis's own loss, or else the study's. */
  public static Optional<Figure> of(Plan plan, Analysis analysis) {
    return analysis.loss().isPresent()
        ? analysis.loss()
        : plan.recruitment().flatMap(Recruitment::loss);
  }
}
