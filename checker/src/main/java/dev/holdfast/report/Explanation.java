package dev.holdfast.report;

import dev.holdfast.check.ClaimResult;
import dev.holdfast.check.Derivation;
import dev.holdfast.check.Derivations;
import dev.holdfast.check.Headroom;
import dev.holdfast.check.Numbers;
import dev.holdfast.check.PlanReport;
import dev.holdfast.check.Situation;
import dev.holdfast.design.Bibliography;
import dev.holdfast.design.Sides;
import dev.holdfast.design.Step;
import dev.holdfast.plan.Analysis;
import dev.holdfast.plan.Figure;
import dev.holdfast.plan.Input;
import dev.holdfast.plan.Plan;
import dev.holdfast.plan.Quantity;
import java.math.RoundingMode;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.stream.Collectors;

/**
 * Explains the figures of an analysis: what is assumed and from which source, every step with its
 * numbers put in, the method and its reference, the other methods beside it, and what the power
 * means in plain frequencies.
 */
public final class Explanation {
  /** Claims of what a design needs. */
  private static final Set<String> COUNTS = Set.of("total", "sample", "events");

  private final Derivations derivations;
  private final Bibliography bibliography;

  /** Explanations by these derivations and references. */
  public Explanation(Derivations derivations, Bibliography bibliography) {
    this.derivations = derivations;
    this.bibliography = bibliography;
  }

  /**
   * Explains analyses of a plan.
   *
   * @param plan a valid plan
   * @param report what its check came to, headroom included
   * @param analyses names of the analyses
   */
  public String write(Plan plan, PlanReport report, List<String> analyses) {
    StringBuilder text = new StringBuilder();
    text.append(Safe.line(plan.study().title())).append('\n');
    for (String name : analyses) {
      analysis(plan, report, plan.analyses().get(name), text);
    }
    for (ClaimResult result : report.claims()) {
      if (result.subject().startsWith("families.")) {
        text.append('\n').append(Safe.line(TextReport.plainClaim(result))).append('\n');
      }
    }
    String caution = Caution.of(plan.study().participants());
    if (!caution.isEmpty()) {
      text.append('\n').append(caution).append('\n');
    }
    return text.toString();
  }

  private void analysis(Plan plan, PlanReport report, Analysis analysis, StringBuilder text) {
    text.append('\n').append(Safe.line(analysis.name()));
    analysis.question().ifPresent(question -> text.append(" - ").append(Safe.line(question)));
    text.append('\n');
    List<Situation> situations = derivations.situations(plan, analysis.name());
    List<Derivation> derived = derivations.of(plan, analysis.name(), report);
    for (Situation situation : situations) {
      situation.number().ifPresent(number -> text.append("\n  case ").append(number).append('\n'));
      situation
          .cell()
          .ifPresent(
              cell ->
                  text.append("  design      ")
                      .append(cell.title())
                      .append(" (")
                      .append(cell.key())
                      .append(")\n"));
      level(situation, text);
      assumptions(plan, situation, text);
      List<Derivation> own =
          derived.stream()
              .filter(each -> each.claim().caseNumber().equals(situation.number()))
              .toList();
      steps(own, text);
      least(situation, own, text);
      own.forEach(each -> claim(each, text));
      frequencies(situation, text);
    }
  }

  private static void level(Situation situation, StringBuilder text) {
    situation
        .level()
        .ifPresent(
            level -> {
              text.append("  level       alpha ")
                  .append(Numbers.brief(level.alpha()))
                  .append(level.sides() == Sides.TWO ? ", two sides" : ", one side");
              if (!situation.levelOrigin().isEmpty()) {
                text.append(" (").append(Safe.line(situation.levelOrigin())).append(')');
              }
              text.append('\n');
            });
  }

  private static void assumptions(Plan plan, Situation situation, StringBuilder text) {
    Map<String, Figure> figures = new LinkedHashMap<>();
    situation
        .situation()
        .effect()
        .forEach(
            (key, input) -> {
              if (input instanceof Input.One one) {
                figures.put(key, one.figure());
              } else if (input instanceof Input.Named named) {
                named.figures().forEach((name, figure) -> figures.put(key + "." + name, figure));
              }
            });
    situation
        .situation()
        .sample()
        .forEach((group, figure) -> figures.put("sample." + group, figure));
    situation.situation().events().ifPresent(figure -> figures.put("events", figure));
    String lead = "  assumed     ";
    for (Map.Entry<String, Figure> entry : figures.entrySet()) {
      Figure figure = entry.getValue();
      text.append(lead).append(Safe.line(entry.getKey())).append(" = ").append(figure.written());
      figure
          .quantity()
          .map(name -> plan.quantities().get(name))
          .ifPresent(quantity -> text.append(Safe.line(origin(quantity))));
      text.append('\n');
      lead = "              ";
    }
  }

  private static String origin(Quantity quantity) {
    StringBuilder text = new StringBuilder();
    quantity.unit().ifPresent(unit -> text.append(' ').append(unit));
    text.append("  (").append(quantity.name()).append(", line ").append(quantity.place().line());
    quantity
        .source()
        .ifPresent(
            source -> {
              text.append("; ").append(source.kind());
              for (String field : List.of("cite", "reason", "file", "who")) {
                if (source.fields().containsKey(field)) {
                  text.append(": ").append(source.fields().get(field).text());
                  break;
                }
              }
            });
    return text.append(')').toString();
  }

  private void steps(List<Derivation> derived, StringBuilder text) {
    Map<String, List<Step>> written = new LinkedHashMap<>();
    for (Derivation each : derived) {
      List<Step> all = new ArrayList<>(each.effectSteps());
      all.addAll(each.powerSteps());
      if (!all.isEmpty()) {
        written.putIfAbsent(each.reference(), all);
      }
    }
    written.forEach(
        (reference, all) -> {
          text.append("  computed\n");
          all.forEach(step -> text.append(Substitution.write(step, "    ")));
          if (!reference.isEmpty()) {
            text.append("    reference: ").append(bibliography.entry(reference)).append('\n');
          }
        });
  }

  /** The least sample for the target, where a number is claimed to be that. */
  private static void least(Situation situation, List<Derivation> own, StringBuilder text) {
    boolean counted =
        own.stream()
            .map(each -> each.claim())
            .anyMatch(
                result -> result.computed().isPresent() && COUNTS.contains(result.claim().kind()));
    if (!counted || !situation.hasPower() || situation.target().isEmpty()) {
      return;
    }
    double target = situation.target().getAsDouble();
    situation
        .least(target)
        .ifPresent(
            found ->
                text.append("  least       for a power of ")
                    .append(Numbers.brief(target))
                    .append(": ")
                    .append(
                        Arrays.stream(found.ratioKept())
                            .mapToObj(Numbers::count)
                            .collect(Collectors.joining(" + ")))
                    .append(", ")
                    .append(Numbers.significant(found.realTotal(), 6, RoundingMode.HALF_UP))
                    .append(" in all before rounding\n"));
  }

  private static void claim(Derivation derivation, StringBuilder text) {
    ClaimResult result = derivation.claim();
    text.append("  claim       ").append(Safe.line(TextReport.plainClaim(result))).append('\n');
    if (!result.explanation().isEmpty() && result.computed().isPresent()) {
      text.append("              ").append(Safe.line(result.explanation())).append('\n');
    }
    for (Derivation.MethodFigure other : derivation.others()) {
      text.append("              by ")
          .append(other.method())
          .append(other.exact() ? " (exact): " : ": ")
          .append(Numbers.fixed(other.figure(), result.decimals() + extra(result)))
          .append('\n');
    }
    for (Headroom room : result.headroom()) {
      text.append("              ")
          .append(Safe.line(TextReport.headroom(result, room)))
          .append('\n');
    }
  }

  private static int extra(ClaimResult result) {
    return result.claim().kind().equals("power") ? 2 : 0;
  }

  private static void frequencies(Situation situation, StringBuilder text) {
    if (!situation.hasPower()) {
      return;
    }
    double power = situation.power();
    double alpha = situation.level().orElseThrow().alpha();
    // Of a hundred, 99.6 would read as all of them.
    int studies = power > 0.995 || power < 0.005 ? 1000 : 100;
    text.append("  in words    Of ")
        .append(studies)
        .append(" such studies, if the effect is as assumed, ")
        .append(of(studies, power))
        .append(" find it and ")
        .append(of(studies, 1 - power))
        .append(" miss it;\n              if there is no effect, ")
        .append(Numbers.brief(studies * alpha))
        .append(" in ")
        .append(studies)
        .append(" claim one all the same.\n");
  }

  private static String of(int studies, double chance) {
    double number = Numbers.round(studies * chance, 0);
    if (number == studies && chance < 1) {
      return "more than " + (studies - 1);
    }
    return number == 0 && chance > 0 ? "fewer than 1" : Numbers.fixed(number, 0);
  }
}
