package dev.holdfast.check;

import dev.holdfast.design.Ledger;
import dev.holdfast.design.Step;
import dev.holdfast.design.catalogue.Catalogue;
import dev.holdfast.plan.Claim;
import dev.holdfast.plan.Plan;
import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;

/** Works out how the figures of a plan come about, step by step. */
public final class Derivations {
  private final Situations situations;

  /** Derivations over a catalogue of designs. */
  public Derivations(Catalogue catalogue) {
    this.situations = new Situations(catalogue);
  }

  /** The cases of an analysis, ready to be computed. */
  public List<Situation> situations(Plan plan, String analysis) {
    return situations.of(plan, Overrides.NONE).stream()
        .filter(each -> each.analysis().name().equals(analysis))
        .toList();
  }

  /**
   * Derives the claims of one analysis.
   *
   * @param plan a valid plan
   * @param analysis name of one of its analyses
   * @param report what the check of the same plan came to
   * @return one derivation a claim, in the order of the file
   */
  public List<Derivation> of(Plan plan, String analysis, PlanReport report) {
    List<Derivation> derivations = new ArrayList<>();
    for (Situation situation : situations(plan, analysis)) {
      for (ClaimResult result : report.claims()) {
        if (result.subject().equals(situation.subject())
            && result.caseNumber().equals(situation.number())) {
          derivations.add(derive(plan, situation, result));
        }
      }
    }
    return derivations;
  }

  private Derivation derive(Plan plan, Situation situation, ClaimResult result) {
    List<Step> effect = List.of();
    List<Step> power = List.of();
    List<Derivation.MethodFigure> others = List.of();
    String reference = "";
    if (result.computed().isPresent() && !result.claim().kind().equals("enrol")) {
      Ledger conversion = Ledger.open();
      situation.effect().orElseThrow().derive(conversion);
      effect = conversion.steps();
      reference = situation.plain().method().reference();
      if (situation.hasPower()) {
        Ledger steps = Ledger.open();
        situation
            .effect()
            .orElseThrow()
            .power(
                situation.plain().method(),
                situation.sizes().orElseThrow(),
                situation.plain().level(situation.level().orElseThrow()),
                steps);
        power = steps.steps();
      }
      others = others(plan, situation, result.claim());
    }
    return new Derivation(result, effect, power, others, reference);
  }

  /** The claim's figure by each method of the cell beside the one held to, stated or not. */
  private List<Derivation.MethodFigure> others(Plan plan, Situation situation, Claim claim) {
    List<Derivation.MethodFigure> figures = new ArrayList<>();
    Judge judge = new Judge(situations, plan);
    situation.cell().orElseThrow().methods().stream()
        .filter(method -> !method.equals(situation.plain().method()))
        .forEach(
            method -> {
              boolean reachable =
                  situation.sizes().isEmpty()
                      || situation.reachable(method, situation.sizes().get());
              if (reachable) {
                Situation by = situation.by(method);
                OptionalDouble figure = judge.judge(by, claim).computed();
                figure.ifPresent(
                    value ->
                        figures.add(
                            new Derivation.MethodFigure(method.title(), value, method.exact())));
              }
            });
    return figures;
  }
}
