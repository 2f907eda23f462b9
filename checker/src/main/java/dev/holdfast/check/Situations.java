package dev.holdfast.check;

import dev.holdfast.design.Cell;
import dev.holdfast.design.Effect;
import dev.holdfast.design.InputException;
import dev.holdfast.design.catalogue.Catalogue;
import dev.holdfast.plan.Analysis;
import dev.holdfast.plan.Case;
import dev.holdfast.plan.Plan;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.OptionalInt;

/** Makes the cases of a plan ready to be computed. */
final class Situations {
  private final Catalogue catalogue;

  Situations(Catalogue catalogue) {
    this.catalogue = catalogue;
  }

  /** All cases of all analyses, in the order of the file. */
  List<Situation> of(Plan plan, Overrides overrides) {
    List<Situation> situations = new ArrayList<>();
    for (Analysis analysis : plan.analyses().values()) {
      int number = 0;
      for (Case each : analysis.cases()) {
        number++;
        situations.add(
            of(
                plan,
                analysis,
                each,
                analysis.cases().size() > 1 ? OptionalInt.of(number) : OptionalInt.empty(),
                overrides));
      }
    }
    return situations;
  }

  /** The same case with other values in force. */
  Situation again(Plan plan, Situation situation, Overrides overrides) {
    return of(plan, situation.analysis(), situation.situation(), situation.number(), overrides);
  }

  private Situation of(
      Plan plan, Analysis analysis, Case each, OptionalInt number, Overrides overrides) {
    Optional<Cell> cell = catalogue.find(analysis.arrangement().text(), analysis.test().text());
    List<Missing> missing = notYet(analysis, cell.isPresent());
    LevelFinder.Found level = LevelFinder.find(plan, analysis, each, overrides);
    missing.addAll(level.missing());
    OptionalDouble target =
        each.settings().targetPower().isPresent()
            ? OptionalDouble.of(overrides.value(each.settings().targetPower().get()))
            : OptionalDouble.empty();
    Sampling sampling =
        cell.isPresent()
            ? Sampling.of(each, cell.get(), overrides)
            : Sampling.bare(each, overrides);
    missing.addAll(sampling.missing());
    Optional<Effect> effect = Optional.empty();
    Optional<Situation.InputProblem> problem = Optional.empty();
    List<Candidate> candidates = List.of();
    if (cell.isPresent()) {
      try {
        effect = Optional.of(cell.get().assume(EffectInputs.of(each, sampling, overrides)));
      } catch (InputException e) {
        missing.add(
            e.isMissing()
                ? new Missing(e.getMessage() + " is not given", "add it under effect")
                : new Missing(e.getMessage(), "correct it under effect"));
        if (!e.isMissing()) {
          problem = Optional.of(new Situation.InputProblem(e.inputs().get(0), e.getMessage()));
        }
      }
      candidates = Ways.open(cell.get(), each, missing);
    }
    return powered(
        new Situation(
            analysis,
            each,
            number,
            cell,
            effect,
            level.level(),
            level.origin(),
            sampling.sizes(),
            sampling.allocation(),
            target,
            candidates,
            missing,
            problem,
            OptionalDouble.empty()));
  }

  /** What the plan asks for and the program does not compute. */
  private static List<Missing> notYet(Analysis analysis, boolean hasCell) {
    List<Missing> missing = new ArrayList<>();
    if (!hasCell) {
      missing.add(
          new Missing(
              "no design for the test "
                  + analysis.test()
                  + " in the arrangement "
                  + analysis.arrangement()
                  + " is computed",
              "choose a design of 'holdfast catalogue'"));
    }
    for (String key : analysis.beyond().keySet()) {
      missing.add(
          new Missing("the section '" + key + "' is not computed yet", "check the claim by hand"));
    }
    if (!analysis.aim().text().equals("superiority")) {
      missing.add(
          new Missing(
              "the aim '" + analysis.aim() + "' is not computed yet", "check the claim by hand"));
    }
    return missing;
  }

  /** The same with its power, where it has all that a power needs. */
  private static Situation powered(Situation bare) {
    boolean ready =
        bare.missing().isEmpty()
            && bare.level().isPresent()
            && bare.sizes().isPresent()
            && bare.effect().isPresent()
            && bare.effect().get().value().isPresent();
    OptionalDouble power = OptionalDouble.empty();
    List<Missing> missing = bare.missing();
    if (ready) {
      double[] sizes = bare.sizes().get();
      Optional<String> beyond = bare.effect().get().beyondReach(bare.plain().method(), sizes);
      if (beyond.isPresent()) {
        missing = List.of(new Missing(beyond.get(), "state another method"));
      } else if (!bare.reachable(bare.plain().method(), sizes)) {
        missing = List.of(new Missing("the sample is not in whole units", "round it up"));
      } else {
        try {
          power = OptionalDouble.of(bare.power(bare.plain(), sizes));
        } catch (IllegalArgumentException e) {
          missing = List.of(beyondDomain(e));
        }
      }
    }
    return new Situation(
        bare.analysis(),
        bare.situation(),
        bare.number(),
        bare.cell(),
        bare.effect(),
        bare.level(),
        bare.levelOrigin(),
        bare.sizes(),
        bare.allocation(),
        bare.target(),
        bare.candidates(),
        missing,
        bare.inputProblem(),
        power);
  }

  /** Figures so extreme that a distribution refuses them. */
  static Missing beyondDomain(IllegalArgumentException e) {
    return new Missing(
        "the figures are beyond what is computed (" + e.getMessage() + ")", "see to the figures");
  }
}
