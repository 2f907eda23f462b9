package dev.holdfast.check;

import dev.holdfast.plan.Claim;
import dev.holdfast.plan.Figure;
import dev.holdfast.plan.Plan;
import java.util.Optional;
import java.util.OptionalDouble;

/**
 * Judges a claimed number to enrol: what is analysed, made good for the loss.
 *
 * <p>The loss is a share of those enrolled, so that the number analysed is divided by what remains;
 * multiplication by one plus the loss, which falls short of it, is tried as a convention left
 * unstated.
 */
final class EnrolJudge {
  private final Plan plan;

  EnrolJudge(Plan plan) {
    this.plan = plan;
  }

  Judgement judge(Situation situation, Claim claim) {
    Optional<Figure> loss = Losses.of(plan, situation.analysis());
    Optional<double[]> analysed = analysed(situation);
    if (loss.isEmpty()) {
      return Judgement.notComputed(0, "the loss is not given (recruitment.loss)");
    }
    if (analysed.isEmpty()) {
      return Judgement.notComputed(0, "the sample analysed is not given");
    }
    double lost = loss.get().value();
    if (!(lost >= 0 && lost < 1)) {
      return Judgement.notComputed(0, "the loss does not lie between 0 and 1");
    }
    String stated = situation.situation().settings().conventions().of("loss-by").orElse("");
    double claimed = claim.figure().value();
    double held = stated.equals("multiplication") ? 1 + lost : 1 / (1 - lost);
    double other = 1 + lost;
    double[] sizes = analysed.get();
    double least = total(sizes, held);
    double most = byGroup(sizes, held);
    double slack = sizes.length;
    boolean fits =
        switch (claim.relation()) {
          case IS -> claimed >= least && claimed <= most + slack;
          case AT_LEAST -> claimed >= least;
          case ABOUT -> Math.abs(claimed - least) <= 0.025 * claimed + slack;
        };
    Verdict verdict;
    String explanation = "";
    if (fits) {
      verdict = Verdict.HOLDS;
    } else if (claimed == Math.rint(sum(sizes) * held)) {
      verdict = Verdict.CONDITIONAL;
      explanation =
          "it follows by rounding to the nearest (rounding: nearest), which the plan does not state";
    } else if (stated.isEmpty()
        && claimed >= Math.floor(sum(sizes) * other)
        && claimed <= byGroup(sizes, other)) {
      verdict = Verdict.CONDITIONAL;
      explanation =
          "it follows by multiplication with 1 + loss (loss-by: multiplication), which the plan does not state";
    } else if (claimed > most) {
      verdict = Verdict.UNDERSTATED;
      explanation = Numbers.count(claimed - least) + " more than the loss calls for";
    } else {
      verdict = Verdict.SHORT;
    }
    String method =
        stated.equals("multiplication") ? "multiplication with 1 + loss" : "division by 1 - loss";
    return new Judgement(verdict, OptionalDouble.of(least), method, 0, explanation);
  }

  /** The numbers analysed: the sample, or the total claimed. */
  private static Optional<double[]> analysed(Situation situation) {
    if (!situation.countsEvents()) {
      return situation.sizes();
    }
    if (!situation.situation().sample().isEmpty()) {
      return Optional.of(
          situation.situation().sample().values().stream().mapToDouble(Figure::value).toArray());
    }
    return situation.situation().claims().stream()
        .filter(each -> each.kind().equals("total"))
        .map(each -> new double[] {each.figure().value()})
        .findFirst();
  }

  private static double total(double[] sizes, double factor) {
    return Math.ceil(sum(sizes) * factor - 1e-9);
  }

  private static double byGroup(double[] sizes, double factor) {
    double sum = 0;
    for (double size : sizes) {
      sum += Math.ceil(size * factor - 1e-9);
    }
    return sum;
  }

  private static double sum(double[] sizes) {
    double sum = 0;
    for (double size : sizes) {
      sum += size;
    }
    return sum;
  }
}
