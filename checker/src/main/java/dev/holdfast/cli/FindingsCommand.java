package dev.holdfast.cli;

import dev.holdfast.check.FindingKind;
import dev.holdfast.plan.Nearest;
import dev.holdfast.report.FindingPages;
import java.util.Arrays;
import java.util.List;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.ParseResult;

/** {@code holdfast findings}: what each finding means and how to mend it. */
final class FindingsCommand implements Command {
  @Override
  public String name() {
    return "findings";
  }

  @Override
  public CommandSpec spec() {
    CommandSpec spec =
        Spec.command(
            name(),
            "List the findings, or print the page of one.",
            "Without a name, lists what can be found in a plan; with one, prints what the finding"
                + " says, why it matters, how to mend it, and an example.",
            List.of("holdfast findings", "holdfast findings power-drift"));
    spec.addPositional(Spec.parameter(0, "NAME", false, "The name of a finding."));
    return Spec.helped(spec);
  }

  @Override
  public int run(ParseResult parsed, Console console) {
    String name = parsed.matchedPositionalValue(0, "");
    if (name.isEmpty()) {
      console.print(FindingPages.list());
      return Status.HOLDS;
    }
    List<String> names = Arrays.stream(FindingKind.values()).map(FindingKind::word).toList();
    FindingKind kind =
        FindingKind.of(name)
            .orElseThrow(
                () ->
                    new UnusableException(
                        "there is no finding '"
                            + name
                            + "'; "
                            + Nearest.to(name, names)
                                .map(near -> "did you mean '" + near + "'?")
                                .orElse("see 'holdfast findings'")));
    console.print(FindingPages.page(kind));
    return Status.HOLDS;
  }
}
