package dev.holdfast.cli;

import dev.holdfast.check.Checker;
import dev.holdfast.check.Derivations;
import dev.holdfast.check.PlanReport;
import dev.holdfast.check.rule.Rules;
import dev.holdfast.design.Bibliography;
import dev.holdfast.design.catalogue.Catalogue;
import dev.holdfast.plan.Nearest;
import dev.holdfast.plan.Plan;
import dev.holdfast.plan.PlanReader;
import dev.holdfast.plan.PlanReading;
import dev.holdfast.plan.Schemas;
import dev.holdfast.report.Explanation;
import dev.holdfast.report.Paint;
import dev.holdfast.report.TextReport;
import java.nio.file.Path;
import java.util.List;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.ParseResult;

/** {@code holdfast explain}: the derivation of a plan's figures. */
final class ExplainCommand implements Command {
  @Override
  public String name() {
    return "explain";
  }

  @Override
  public CommandSpec spec() {
    CommandSpec spec =
        Spec.command(
            name(),
            "Write out how the figures of a plan come about.",
            "For each analysis: the assumptions with their sources, every step with its numbers put"
                + " in, the method and its reference, what the other methods give, and what the"
                + " power means in plain frequencies.",
            List.of("holdfast explain study-plan.yaml", "holdfast explain study-plan.yaml main"));
    spec.addPositional(Spec.parameter(0, "PLAN", true, "A plan file, or a folder with one plan."));
    spec.addPositional(
        Spec.parameter(1, "ANALYSIS", false, "The name of an analysis; all of them unless given."));
    return Spec.helped(spec);
  }

  @Override
  public int run(ParseResult parsed, Console console) {
    String path = parsed.matchedPositionalValue(0, "");
    String analysis = parsed.matchedPositionalValue(1, "");
    PlanReading reading = PlanSource.read(new PlanReader(new Schemas()), Path.of(path));
    Catalogue catalogue = Catalogue.standard();
    PlanReport report = new Checker(catalogue, Rules.standard(), true).check(reading);
    if (reading.plan().isEmpty()) {
      console.print(
          new TextReport(Paint.none(), TextReport.Extent.WHAT_MATTERS).write(List.of(report)));
      return Status.BLOCKS;
    }
    Plan plan = reading.plan().get();
    if (!analysis.isEmpty() && !plan.analyses().containsKey(analysis)) {
      throw new UnusableException(
          "the plan has no analysis '"
              + analysis
              + "'; "
              + Nearest.to(analysis, plan.analyses().keySet())
                  .map(near -> "did you mean '" + near + "'?")
                  .orElse("it has " + String.join(", ", plan.analyses().keySet())));
    }
    List<String> names =
        analysis.isEmpty() ? List.copyOf(plan.analyses().keySet()) : List.of(analysis);
    Explanation explanation = new Explanation(new Derivations(catalogue), Bibliography.standard());
    console.print(explanation.write(plan, report, names));
    return Status.HOLDS;
  }
}
