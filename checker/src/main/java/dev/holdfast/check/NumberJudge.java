package dev.holdfast.check;

import dev.holdfast.design.LeastSample;
import dev.holdfast.plan.Claim;
import dev.holdfast.plan.Figure;
import dev.holdfast.plan.Plan;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.function.ToDoubleFunction;

/**
 * Judges a claimed number of participants, pairs or events: is it the least that reaches the power
 * aimed at?
 *
 * <p>Groups are rounded up one by one, or with their ratio kept; one unit a group above is taken as
 * rounding. Where the plan states no rounding, rounding in total and to the nearest are tried too,
 * as conventions left unstated.
 */
final class NumberJudge {
  /** How much of a number the printed digits of an effect may explain. */
  private static final double PRINTED_EFFECT_SLACK = 0.1;

  private final Situations situations;
  private final Plan plan;

  NumberJudge(Situations situations, Plan plan) {
    this.situations = situations;
    this.plan = plan;
  }

  /** One figure that a rounding gives, and what the plan would state to ask for it. */
  private record Rounded(double least, double most, String unstated) {}

  Judgement judge(Situation situation, Claim claim) {
    Optional<String> missing = NotComputed.number(situation);
    if (missing.isPresent()) {
      return Judgement.notComputed(0, missing.get());
    }
    if (situation.countsEvents()
        && !claim.kind().equals("events")
        && situation.effect().orElseThrow().eventShare().isEmpty()) {
      return Judgement.notComputed(
          0, "the share of participants with an event (event-share) is not given");
    }
    double target = TargetFinder.find(situation).getAsDouble();
    Candidate plain = situation.plain();
    Optional<LeastSample.Found> least = PowerJudge.least(situation, plain, target);
    if (least.isEmpty()) {
      return Judgement.notComputed(
          0, "no sample within reach has a power of " + Numbers.brief(target));
    }
    double claimed = claim.figure().value();
    List<Rounded> roundings = roundings(situation, claim, least.get());
    Rounded held = roundings.get(0);
    OptionalDouble computed = OptionalDouble.of(held.least());
    Verdict verdict;
    String explanation = "";
    if (fits(claim, claimed, held, slack(situation, claim))) {
      verdict = Verdict.HOLDS;
    } else {
      Optional<String> other = otherWay(situation, claim, target, roundings);
      if (other.isPresent()) {
        verdict = Verdict.CONDITIONAL;
        explanation = other.get();
      } else if (claimed > held.most()) {
        verdict = Verdict.UNDERSTATED;
        explanation =
            Numbers.count(claimed - held.least())
                + " more than the assumptions need for a power of "
                + Numbers.brief(target);
      } else {
        verdict = Verdict.SHORT;
      }
    }
    return new Judgement(verdict, computed, plain.title(), 0, explanation);
  }

  /**
   * Whether the claimed number is enough: whether it has the power aimed at, which takes one
   * evaluation where the search for the least number takes twenty.
   */
  static boolean stands(Situation situation, Claim claim) {
    if (NotComputed.number(situation).isPresent()) {
      return false;
    }
    double claimed = claim.figure().value();
    double[] sizes;
    if (situation.countsEvents()) {
      OptionalDouble share = situation.effect().orElseThrow().eventShare();
      if (!claim.kind().equals("events") && share.isEmpty()) {
        return false;
      }
      sizes =
          new double[] {claim.kind().equals("events") ? claimed : claimed * share.getAsDouble()};
    } else if (claim.kind().equals("sample")) {
      double weight = situation.allocation().sizes(1)[indexOf(situation, claim)];
      sizes = situation.allocation().wholeSizes(Math.round(claimed / weight));
    } else {
      sizes = situation.allocation().split(Math.round(claimed));
    }
    for (double size : sizes) {
      if (size < situation.arms().smallest()) {
        return false;
      }
    }
    double target = TargetFinder.find(situation).getAsDouble();
    Candidate plain = situation.plain();
    return situation.reachable(plain.method(), sizes)
        && situation.power(plain, sizes) >= situation.effectiveTarget(plain, target);
  }

  private static boolean fits(Claim claim, double claimed, Rounded rounded, double slack) {
    return switch (claim.relation()) {
      case IS -> claimed >= rounded.least() && claimed <= rounded.most() + slack;
      case AT_LEAST -> claimed >= rounded.least();
      case ABOUT -> Math.abs(claimed - rounded.least()) <= 0.025 * claimed + slack;
    };
  }

  /** One unit a group. */
  private static double slack(Situation situation, Claim claim) {
    if (situation.situation().settings().conventions().of("rounding").isPresent()) {
      return 0;
    }
    return claim.kind().equals("total") ? Math.max(1, situation.allocation().groups()) : 1;
  }

  private Optional<String> otherWay(
      Situation situation, Claim claim, double target, List<Rounded> plainRoundings) {
    double claimed = claim.figure().value();
    // Another method with the usual rounding is likelier than another rounding.
    Optional<String> found = byMethod(situation, claim, target, claimed, false);
    if (found.isPresent()) {
      return found;
    }
    for (Rounded rounded : plainRoundings) {
      if (!rounded.unstated().isEmpty() && exactly(claimed, rounded)) {
        return Optional.of(unstated("rounding", rounded.unstated()));
      }
    }
    found = byMethod(situation, claim, target, claimed, true);
    if (found.isPresent()) {
      return found;
    }
    return printedDigits(situation, claim, target, plainRoundings.get(0).least());
  }

  /** The first other method by which a number follows, with the usual rounding or another. */
  private Optional<String> byMethod(
      Situation situation, Claim claim, double target, double claimed, boolean otherRounding) {
    for (Candidate way : situation.candidates()) {
      if (way.unstated().isEmpty()) {
        continue;
      }
      if (!way.method().realSizes()) {
        if (!otherRounding && isLeastByEnumeration(situation, claim, way, target)) {
          return Optional.of(unstated(way.title(), way.unstated()));
        }
        continue;
      }
      Optional<LeastSample.Found> found = PowerJudge.least(situation, way, target);
      if (found.isEmpty()) {
        continue;
      }
      for (Rounded rounded : roundings(situation, claim, found.get())) {
        if (rounded.unstated().isEmpty() != otherRounding && exactly(claimed, rounded)) {
          String also = otherRounding ? ", " + rounded.unstated() : "";
          return Optional.of(unstated(way.title(), way.unstated() + also));
        }
      }
    }
    return Optional.empty();
  }

  private static boolean exactly(double claimed, Rounded rounded) {
    return claimed >= rounded.least() && claimed <= rounded.most();
  }

  private static String unstated(String title, String convention) {
    return "it follows by " + title + " (" + convention + "), which the plan does not state";
  }

  /** Two evaluations in place of a search: enough at the claimed number, too little one below. */
  private static boolean isLeastByEnumeration(
      Situation situation, Claim claim, Candidate way, double target) {
    if (!claim.kind().equals("total") && situation.allocation().groups() > 1) {
      return false;
    }
    long claimed = Math.round(claim.figure().value());
    double[] at = situation.allocation().split(claimed);
    double[] below = situation.allocation().split(claimed - situation.allocation().groups());
    for (double size : below) {
      if (size < situation.arms().smallest()) {
        return false;
      }
    }
    return situation.reachable(way.method(), at)
        && situation.power(way, at) >= target
        && situation.power(way, below) < target;
  }

  private Optional<String> printedDigits(
      Situation situation, Claim claim, double target, double computed) {
    Optional<Figure> printed = PrintedEffect.find(situation);
    double slack = Math.max(2, PRINTED_EFFECT_SLACK * computed);
    if (printed.isEmpty() || Math.abs(claim.figure().value() - computed) > slack) {
      return Optional.empty();
    }
    Figure figure = printed.get();
    double half = 0.5 * StrictMath.pow(10, -figure.decimals());
    double lowest = Double.POSITIVE_INFINITY;
    double highest = Double.NEGATIVE_INFINITY;
    for (double value : new double[] {figure.value() - half, figure.value() + half}) {
      Situation moved =
          situations.again(plan, situation, Overrides.of(Overrides.key(figure), value));
      if (NotComputed.number(moved).isPresent()) {
        return Optional.empty();
      }
      Optional<LeastSample.Found> found = PowerJudge.least(moved, moved.plain(), target);
      if (found.isEmpty()) {
        return Optional.empty();
      }
      double least = roundings(moved, claim, found.get()).get(0).least();
      lowest = Math.min(lowest, least);
      highest = Math.max(highest, least);
    }
    double claimed = claim.figure().value();
    return claimed >= lowest && claimed <= highest
        ? Optional.of(
            "it follows for an effect within the printed digits of "
                + figure.written()
                + ", not for "
                + figure.written()
                + " itself")
        : Optional.empty();
  }

  /** What the roundings that the plan leaves open make of a least sample, the one held to first. */
  private static List<Rounded> roundings(
      Situation situation, Claim claim, LeastSample.Found found) {
    Optional<String> stated = situation.situation().settings().conventions().of("rounding");
    List<Rounded> all = new ArrayList<>();
    boolean group = claim.kind().equals("sample");
    int index = group ? indexOf(situation, claim) : 0;
    ToDoubleFunction<double[]> part = sizes -> group ? sizes[index] : sum(sizes);
    double eventsToPeople = eventsToPeople(situation, claim);
    double upByGroup = up(part.applyAsDouble(found.sizes()) * eventsToPeople);
    double ratioKept = up(part.applyAsDouble(found.ratioKept()) * eventsToPeople);
    double real = part.applyAsDouble(situation.allocation().sizes(found.real())) * eventsToPeople;
    if (eventsToPeople != 1) {
      upByGroup = up(real);
    }
    Rounded byGroup =
        new Rounded(
            Math.min(upByGroup, ratioKept),
            Math.max(upByGroup, ratioKept),
            "rounding: up-by-group");
    Rounded inTotal = new Rounded(up(real), up(real), "rounding: up-in-total");
    double near =
        group
            ? Math.rint(real)
            : sumNearest(situation.allocation().sizes(found.real()), eventsToPeople);
    Rounded nearest =
        new Rounded(
            Math.min(near, Math.rint(real)), Math.max(near, Math.rint(real)), "rounding: nearest");
    if (stated.isEmpty()) {
      all.add(new Rounded(byGroup.least(), byGroup.most(), ""));
      all.add(inTotal);
      all.add(nearest);
    } else {
      Rounded only =
          switch (stated.get()) {
            case "up-in-total" -> inTotal;
            case "nearest" -> nearest;
            case "up-by-group" -> byGroup;
            default -> multiple(Double.parseDouble(stated.get()), real);
          };
      all.add(new Rounded(only.least(), only.most(), ""));
    }
    return all;
  }

  private static Rounded multiple(double of, double real) {
    double up = up(real / of) * of;
    return new Rounded(up, up, "");
  }

  private static double eventsToPeople(Situation situation, Claim claim) {
    return situation.countsEvents() && !claim.kind().equals("events")
        ? 1 / situation.effect().orElseThrow().eventShare().getAsDouble()
        : 1;
  }

  private static int indexOf(Situation situation, Claim claim) {
    List<String> names =
        !situation.situation().sample().isEmpty()
            ? List.copyOf(situation.situation().sample().keySet())
            : !situation.situation().allocation().isEmpty()
                ? List.copyOf(situation.situation().allocation().keySet())
                : situation.situation().claims().stream()
                    .flatMap(each -> each.group().stream())
                    .toList();
    return Math.max(0, names.indexOf(claim.group().orElse("")));
  }

  private static double up(double value) {
    return Math.ceil(value - 1e-9 * Math.max(1, value));
  }

  private static double sum(double[] sizes) {
    double sum = 0;
    for (double size : sizes) {
      sum += size;
    }
    return sum;
  }

  private static double sumNearest(double[] sizes, double factor) {
    double sum = 0;
    for (double size : sizes) {
      sum += Math.rint(size * factor);
    }
    return sum;
  }
}
