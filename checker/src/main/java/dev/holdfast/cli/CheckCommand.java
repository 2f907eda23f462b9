package dev.holdfast.cli;

import dev.holdfast.check.Checker;
import dev.holdfast.check.PlanReport;
import dev.holdfast.check.Weight;
import dev.holdfast.check.rule.Rules;
import dev.holdfast.design.catalogue.Catalogue;
import dev.holdfast.history.GitException;
import dev.holdfast.plan.PlanReader;
import dev.holdfast.plan.Schemas;
import dev.holdfast.report.Paint;
import dev.holdfast.report.TextReport;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Map;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.ParseResult;

/** {@code holdfast check}: recomputes plans and says what no longer holds. */
final class CheckCommand implements Command {
  private static final int MOST_THREADS = 256;

  @Override
  public String name() {
    return "check";
  }

  @Override
  public CommandSpec spec() {
    CommandSpec spec =
        Spec.command(
            name(),
            "Recompute plans and say what no longer holds.",
            "Recomputes every claim of the plans from what they assume, and looks for what"
                + " undermines them: sources that are missing, outcomes that are not corrected for,"
                + " losses that nobody planned. Where everything holds, it prints one line.",
            List.of(
                "holdfast check                          the plans below this folder",
                "holdfast check --since main plans/      and what moved since the branch main",
                "holdfast check --staged                 what is about to be committed",
                "holdfast check --verbose study-plan.yaml",
                "                                        every claim, and how far it would hold",
                "holdfast check --output text --output json=report.json",
                "                                        one report to read, one for programs"));
    spec.addPositional(
        Spec.parameters(
            "PATH",
            "Plan files, or folders that are searched for study-plan.yaml, study-plan.yml,"
                + " *.study-plan.yaml and *.study-plan.yml; this folder if none is given."));
    spec.addOption(
        Spec.flag(
            "Check the plans of git's index that differ from the last commit, and compare them"
                + " with it.",
            "--staged"));
    spec.addOption(
        Spec.option(
            "--since",
            "REVISION",
            String.class,
            "Say of a claim that fell what it was at a revision of the git repository, and what"
                + " moved since."));
    spec.addOption(
        Spec.option(
            "--output",
            "KIND[=FILE]",
            String[].class,
            "text, the default, or json; to a file where one is named. May be given again."));
    spec.addOption(
        Spec.flag("List every claim with its headroom, and the notes.", "-v", "--verbose"));
    spec.addOption(Spec.flag("List only what blocks.", "-q", "--quiet"));
    spec.addOption(
        Spec.option("--colour", "WHEN", String.class, "always, never or auto, the default."));
    spec.addOption(
        Spec.option(
            "--threads",
            "NUMBER",
            Integer.class,
            "Threads that check; as many as there are processors unless given."));
    return Spec.helped(spec);
  }

  @Override
  public int run(ParseResult parsed, Console console) {
    TextReport.Extent extent = extent(parsed);
    Outputs outputs =
        new Outputs(Arrays.asList(parsed.matchedOptionValue("--output", new String[0])));
    Paint paint = paint(parsed, console);
    int threads = threads(parsed);
    Jobs jobs = jobs(parsed, console.environment());
    boolean everyHeadroom = extent == TextReport.Extent.EVERYTHING || outputs.isComplete();
    Checker checker = new Checker(Catalogue.standard(), Rules.standard(), everyHeadroom);
    Checks.Outcome outcome =
        new Checks(new PlanReader(new Schemas()), checker, threads).of(jobs.jobs());
    List<String> failures = new ArrayList<>(jobs.failures());
    failures.addAll(outcome.failures());
    if (jobs.jobs().isEmpty() && failures.isEmpty()) {
      console.remark("no staged plan differs from the last commit");
    }
    failures.addAll(outputs.write(outcome.reports(), console, paint, extent));
    failures.forEach(console::remark);
    if (!outcome.faults().isEmpty()) {
      throw outcome.faults().get(0);
    }
    return failures.isEmpty() ? status(outcome.reports()) : Status.NOT_CHECKED;
  }

  private static int status(List<PlanReport> reports) {
    boolean blocks = reports.stream().anyMatch(report -> report.count(Weight.BLOCKS) > 0);
    return blocks ? Status.BLOCKS : Status.HOLDS;
  }

  private static TextReport.Extent extent(ParseResult parsed) {
    boolean verbose = parsed.matchedOptionValue("--verbose", false);
    boolean quiet = parsed.matchedOptionValue("--quiet", false);
    if (verbose && quiet) {
      throw new UnusableException("--verbose and --quiet contradict each other; give one");
    }
    return verbose
        ? TextReport.Extent.EVERYTHING
        : quiet ? TextReport.Extent.WHAT_BLOCKS : TextReport.Extent.WHAT_MATTERS;
  }

  private static Paint paint(ParseResult parsed, Console console) {
    String wish = parsed.matchedOptionValue("--colour", "auto");
    if (!List.of("always", "never", "auto").contains(wish)) {
      throw new UnusableException("--colour is '" + wish + "'; it can be always, never or auto");
    }
    return Paint.of(wish, console.environment(), console.isTerminal());
  }

  private static int threads(ParseResult parsed) {
    int threads =
        parsed.matchedOptionValue("--threads", Runtime.getRuntime().availableProcessors());
    if (threads < 1 || threads > MOST_THREADS) {
      throw new UnusableException(
          "--threads is " + threads + "; it can be from 1 to " + MOST_THREADS);
    }
    return threads;
  }

  private static Jobs jobs(ParseResult parsed, Map<String, String> environment) {
    String[] given = parsed.matchedPositionalValue(0, new String[0]);
    boolean staged = parsed.matchedOptionValue("--staged", false);
    String since = parsed.matchedOptionValue("--since", "");
    if (staged && (given.length > 0 || parsed.hasMatchedOption("--since"))) {
      throw new UnusableException("--staged takes neither paths nor --since");
    }
    try {
      if (staged) {
        return Jobs.staged(environment);
      }
      List<Path> paths =
          given.length == 0 ? List.of(Path.of(".")) : Arrays.stream(given).map(Path::of).toList();
      return parsed.hasMatchedOption("--since")
          ? Jobs.inFilesSince(paths, since, environment)
          : Jobs.inFiles(paths);
    } catch (GitException e) {
      throw new UnusableException(e.getMessage());
    }
  }
}
