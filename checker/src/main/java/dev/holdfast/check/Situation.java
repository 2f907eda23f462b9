package dev.holdfast.check;

import dev.holdfast.design.Allocation;
import dev.holdfast.design.Arms;
import dev.holdfast.design.Cell;
import dev.holdfast.design.Effect;
import dev.holdfast.design.LeastSample;
import dev.holdfast.design.Ledger;
import dev.holdfast.design.Level;
import dev.holdfast.design.Method;
import dev.holdfast.design.Unit;
import dev.holdfast.design.ZPower;
import dev.holdfast.plan.Analysis;
import dev.holdfast.plan.Case;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.OptionalInt;

/**
 * One case of an analysis, ready to be computed as far as the plan allows.
 *
 * @param analysis the analysis
 * @param situation the case
 * @param number which case, from 1, where the analysis has several
 * @param cell its cell of the catalogue; empty where there is none or the plan asks for more than
 *     the cell
 * @param effect the assumed effect
 * @param level the level of the test as used
 * @param levelOrigin how the level came about, where a family made it
 * @param sizes numbers analysed by group, or the number of events
 * @param allocation ratio of the groups
 * @param target power aimed at
 * @param candidates ways to compute, the one that the plan is held to first
 * @param missing what keeps every claim from being computed
 * @param inputProblem an input that cannot be; it is in {@code missing} too
 * @param plainPower power by the way that the plan is held to, where the plan has all that it needs
 */
public record Situation(
    Analysis analysis,
    Case situation,
    OptionalInt number,
    Optional<Cell> cell,
    Optional<Effect> effect,
    Optional<Level> level,
    String levelOrigin,
    Optional<double[]> sizes,
    Allocation allocation,
    OptionalDouble target,
    List<Candidate> candidates,
    List<Missing> missing,
    Optional<InputProblem> inputProblem,
    OptionalDouble plainPower) {

  /**
   * An input that cannot be.
   *
   * @param key key of the effect section
   * @param message what is wrong, as a sentence without a full stop
   */
  public record InputProblem(String key, String message) {}

  /** Dotted path of the analysis. */
  public String subject() {
    return "analyses." + analysis.name();
  }

  /** What the cell allows of groups. */
  Arms arms() {
    return cell.orElseThrow().arms();
  }

  /** Whether sizes count events rather than participants. */
  public boolean countsEvents() {
    return cell.isPresent() && cell.get().arms().unit() == Unit.EVENTS;
  }

  /** The way of computing that the plan is held to. */
  Candidate plain() {
    return candidates.get(0);
  }

  /** Whether the power can be computed. */
  public boolean hasPower() {
    return plainPower.isPresent();
  }

  /** Power by the way that the plan is held to; {@link #hasPower} must hold. */
  public double power() {
    return plainPower.orElseThrow();
  }

  double power(Candidate candidate, double[] at) {
    return effect
        .orElseThrow()
        .power(candidate.method(), at, candidate.level(level.orElseThrow()), Ledger.closed());
  }

  /** The power that reaches a target when quantiles are rounded as a candidate has it. */
  double effectiveTarget(Candidate candidate, double wanted) {
    return ZPower.effectiveTarget(wanted, candidate.level(level.orElseThrow()));
  }

  /** Whether a method can be asked for at the given sizes. */
  boolean reachable(Method method, double[] at) {
    return effect.orElseThrow().beyondReach(method, at).isEmpty()
        && (method.realSizes() || whole(at));
  }

  /** Power by the best method, where that is another than the one held to and within reach. */
  public OptionalDouble bestPower() {
    Method best = cell.orElseThrow().best();
    if (best.equals(plain().method()) || !reachable(best, sizes.orElseThrow())) {
      return OptionalDouble.empty();
    }
    return OptionalDouble.of(
        effect
            .orElseThrow()
            .power(best, sizes.orElseThrow(), level.orElseThrow(), Ledger.closed()));
  }

  /** The same case with one method as the only way to compute it. */
  Situation by(Method method) {
    return new Situation(
        analysis,
        situation,
        number,
        cell,
        effect,
        level,
        levelOrigin,
        sizes,
        allocation,
        target,
        List.of(new Candidate(method, OptionalInt.empty(), "")),
        missing,
        inputProblem,
        hasPower()
            ? OptionalDouble.of(
                power(new Candidate(method, OptionalInt.empty(), ""), sizes.orElseThrow()))
            : OptionalDouble.empty());
  }

  /** The least sample that reaches a power by the way that the plan is held to. */
  public Optional<LeastSample.Found> least(double wanted) {
    return PowerJudge.least(this, plain(), wanted);
  }

  private static boolean whole(double[] sizes) {
    for (double size : sizes) {
      if (size != Math.rint(size)) {
        return false;
      }
    }
    return true;
  }
}
