package dev.holdfast.check;

import dev.holdfast.design.Effect;
import dev.holdfast.design.LeastSample;
import dev.holdfast.plan.Claim;
import dev.holdfast.plan.Figure;
import dev.holdfast.plan.Plan;
import java.util.Optional;
import java.util.OptionalDouble;

/** Judges a claimed power. */
final class PowerJudge {
  /** How far a power called "about" some figure may lie from it. */
  private static final double ABOUT = 0.01;

  /** How much power the printed digits of an effect may explain. */
  private static final double PRINTED_EFFECT_SLACK = 0.02;

  private enum Fit {
    FITS,
    OVER,
    UNDER
  }

  private final Situations situations;
  private final Plan plan;

  PowerJudge(Situations situations, Plan plan) {
    this.situations = situations;
    this.plan = plan;
  }

  Judgement judge(Situation situation, Claim claim) {
    int decimals = Math.max(claim.figure().decimals(), 2);
    Optional<String> missing = NotComputed.power(situation);
    if (missing.isPresent()) {
      return Judgement.notComputed(decimals, missing.get());
    }
    double claimed = claim.figure().value();
    double power = situation.power();
    Candidate plain = situation.plain();
    Fit fit = fit(situation, plain, claim, power);
    Verdict verdict;
    String explanation = "";
    if (fit == Fit.FITS) {
      boolean met =
          situation.target().isEmpty() || !isUnder(power, situation.target().getAsDouble(), claim);
      verdict = met ? Verdict.HOLDS : Verdict.UNMET;
      if (!met) {
        explanation =
            "it lies under the target power of " + Numbers.brief(situation.target().getAsDouble());
      }
    } else {
      Optional<String> other = otherWay(situation, claim, fit);
      if (other.isPresent()) {
        verdict = Verdict.CONDITIONAL;
        explanation = other.get();
      } else if (fit == Fit.OVER) {
        verdict = Verdict.UNDERSTATED;
        explanation = "a smaller sample would do for the power claimed";
      } else {
        verdict = Verdict.SHORT;
      }
    }
    int shown =
        verdict == Verdict.SHORT && Numbers.round(power, decimals) >= claimed
            ? decimals + 2
            : decimals;
    return new Judgement(verdict, OptionalDouble.of(power), plain.title(), shown, explanation);
  }

  /** Whether a claim stands with other values in force; what headroom is measured by. */
  boolean stands(Situation situation, Claim claim) {
    if (!situation.hasPower()) {
      return false;
    }
    double power = situation.power();
    int decimals = claim.figure().decimals();
    return claim.relation() == Claim.Relation.ABOUT
        ? power >= claim.figure().value() - ABOUT
        : Numbers.round(power, decimals) >= claim.figure().value();
  }

  private static boolean isUnder(double power, double target, Claim claim) {
    return Numbers.round(power, Math.max(2, claim.figure().decimals())) < target && power < target;
  }

  private Fit fit(Situation situation, Candidate way, Claim claim, double power) {
    double claimed = claim.figure().value();
    double rounded = Numbers.round(power, claim.figure().decimals());
    return switch (claim.relation()) {
      case AT_LEAST -> rounded >= claimed ? Fit.FITS : Fit.UNDER;
      case ABOUT ->
          Math.abs(power - claimed) <= ABOUT
              ? Fit.FITS
              : power < claimed
                  ? Fit.UNDER
                  : isLeast(situation, way, claimed) ? Fit.FITS : Fit.OVER;
      case IS -> {
        if (rounded == claimed) {
          yield Fit.FITS;
        }
        if (rounded < claimed) {
          yield Fit.UNDER;
        }
        yield isLeast(situation, way, claimed) ? Fit.FITS : Fit.OVER;
      }
    };
  }

  /** Whether the sample is the least, in whole units by group, that reaches the power claimed. */
  private static boolean isLeast(Situation situation, Candidate way, double claimed) {
    if (!(claimed > 0 && claimed < 1)) {
      return false;
    }
    double[] sizes = situation.sizes().orElseThrow();
    if (situation.countsEvents() || sizes.length == 1) {
      double[] fewer = {sizes[0] - 1};
      return fewer[0] < situation.arms().smallest() || situation.power(way, fewer) < claimed;
    }
    double[] fewer = sizes.clone();
    for (int i = 0; i < fewer.length; i++) {
      fewer[i] = Math.max(situation.arms().smallest(), fewer[i] - 1);
    }
    return situation.power(way, fewer) < claimed;
  }

  /**
   * The first way left open by the plan, other than the one held to, by which the claim follows.
   */
  private Optional<String> otherWay(Situation situation, Claim claim, Fit plain) {
    double[] sizes = situation.sizes().orElseThrow();
    for (Candidate way : situation.candidates()) {
      if (way.unstated().isEmpty() || !situation.reachable(way.method(), sizes)) {
        continue;
      }
      double power = situation.power(way, sizes);
      if (fit(situation, way, claim, power) == Fit.FITS) {
        return Optional.of(
            "it follows by "
                + way.title()
                + " ("
                + way.unstated()
                + "), which the plan does not state");
      }
    }
    return plain == Fit.UNDER ? printedDigits(situation, claim) : Optional.empty();
  }

  /** Whether an effect that the printed digits allow gives the claimed power. */
  private Optional<String> printedDigits(Situation situation, Claim claim) {
    Optional<Figure> printed = PrintedEffect.find(situation);
    if (printed.isEmpty()
        || Math.abs(situation.power() - claim.figure().value()) > PRINTED_EFFECT_SLACK) {
      return Optional.empty();
    }
    Figure figure = printed.get();
    double half = 0.5 * StrictMath.pow(10, -figure.decimals());
    boolean low = false;
    boolean high = false;
    for (double value : new double[] {figure.value() - half, figure.value() + half}) {
      Situation moved =
          situations.again(plan, situation, Overrides.of(Overrides.key(figure), value));
      if (!moved.hasPower()) {
        return Optional.empty();
      }
      double power = Numbers.round(moved.power(), claim.figure().decimals());
      low |= power <= claim.figure().value();
      high |= power >= claim.figure().value();
    }
    return low && high
        ? Optional.of(
            "it follows for an effect within the printed digits of "
                + figure.written()
                + ", not for "
                + figure.written()
                + " itself")
        : Optional.empty();
  }

  /** The least sample for a target, by one way. */
  static Optional<LeastSample.Found> least(Situation situation, Candidate way, double target) {
    Effect effect = situation.effect().orElseThrow();
    return LeastSample.find(
        effect,
        way.method(),
        situation.allocation(),
        situation.arms(),
        way.level(situation.level().orElseThrow()),
        situation.effectiveTarget(way, target));
  }
}
