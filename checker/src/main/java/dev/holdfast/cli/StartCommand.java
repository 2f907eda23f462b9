package dev.holdfast.cli;

import dev.holdfast.check.Checker;
import dev.holdfast.check.ClaimResult;
import dev.holdfast.check.FindingKind;
import dev.holdfast.check.Numbers;
import dev.holdfast.check.PlanReport;
import dev.holdfast.check.rule.Rules;
import dev.holdfast.design.Cell;
import dev.holdfast.design.Convention;
import dev.holdfast.design.catalogue.Catalogue;
import dev.holdfast.plan.PlanFiles;
import dev.holdfast.plan.PlanReader;
import dev.holdfast.plan.PlanReading;
import dev.holdfast.plan.Schemas;
import java.io.IOException;
import java.io.InputStream;
import java.io.InputStreamReader;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Properties;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.ParseResult;

/**
 * {@code holdfast start}: a commented plan for a cell, whose claims hold and whose sources are left
 * to fill in. Never writes over a file.
 */
final class StartCommand implements Command {
  @Override
  public String name() {
    return "start";
  }

  @Override
  public CommandSpec spec() {
    CommandSpec spec =
        Spec.command(
            name(),
            "Write a first plan for a design.",
            "Writes a commented plan whose claims hold. Its figures are examples, and their sources"
                + " are left for you to fill in; 'holdfast check' says so until you have. Never"
                + " writes over a file.",
            List.of(
                "holdfast start parallel-groups/student-t",
                "holdfast start association/pearson-r reading/study-plan.yaml",
                "",
                "'holdfast catalogue' lists the designs."));
    spec.addPositional(
        Spec.parameter(0, "CELL", true, "Arrangement and test, with a slash between."));
    spec.addPositional(
        Spec.parameter(1, "FILE", false, "Where to write it; study-plan.yaml unless given."));
    return Spec.helped(spec);
  }

  @Override
  public int run(ParseResult parsed, Console console) {
    Cell cell = CatalogueCommand.find(Catalogue.standard(), parsed.matchedPositionalValue(0, ""));
    Path file = Path.of(parsed.matchedPositionalValue(1, "study-plan.yaml"));
    String name = file.getFileName() == null ? "" : file.getFileName().toString();
    if (!PlanFiles.isPlan(name)) {
      throw new UnusableException(
          "'"
              + name
              + "' is no name of a plan, and would not be found; call it study-plan.yaml or "
              + name.replaceFirst("\\.[^.]*$", "")
              + ".study-plan.yaml");
    }
    if (Files.exists(file)) {
      throw new UnusableException(
          PlanFiles.shown(file) + " exists; name another file, or move it away");
    }
    Beside.create(file, plan(cell));
    console.print(
        "wrote "
            + PlanFiles.shown(file)
            + "; put in your figures and their sources, then: holdfast check "
            + PlanFiles.shown(file)
            + "\n");
    return Status.HOLDS;
  }

  /**
   * A plan for a cell, with the figures that its assumptions give by the standard method; where the
   * best method gives less, by that, and the plan states it.
   */
  static String plan(Cell cell) {
    String plan = plan(cell, Map.of());
    Checker checker = new Checker(Catalogue.standard(), Rules.standard(), false);
    boolean optimistic =
        checker.check(read(plan)).findings().stream()
            .anyMatch(finding -> finding.kind() == FindingKind.METHOD_OPTIMISTIC);
    return optimistic ? plan(cell, cell.best().conventions()) : plan;
  }

  private static String plan(Cell cell, Map<Convention, String> conventions) {
    StartText text = new StartText(cell, examples(cell), conventions);
    Checker checker = new Checker(Catalogue.standard(), List.of(), false);
    // Twice: first to compute what the sample must be, then to write down what follows from it.
    PlanReport asked = checker.check(read(text.write(List.of(), List.of())));
    List<String> sizes = new ArrayList<>();
    for (ClaimResult result : asked.claims()) {
      if (!result.claim().kind().equals("power")) {
        sizes.add(Numbers.count(result.computed().orElseThrow()));
      }
    }
    PlanReport sized = checker.check(read(text.write(sizes, List.of("0.80"))));
    double power =
        sized.claims().stream()
            .filter(result -> result.claim().kind().equals("power"))
            .findFirst()
            .orElseThrow()
            .computed()
            .orElseThrow();
    return text.write(sizes, List.of(Numbers.fixed(power, 2)));
  }

  private static PlanReading read(String plan) {
    PlanReading reading = new PlanReader(new Schemas()).read("start", bytes(plan));
    if (reading.plan().isEmpty()) {
      throw new IllegalStateException("start: " + reading.problems());
    }
    return reading;
  }

  private static byte[] bytes(String text) {
    return text.getBytes(StandardCharsets.UTF_8);
  }

  private static String examples(Cell cell) {
    Properties properties = new Properties();
    try (InputStream in = StartCommand.class.getResourceAsStream("start.properties");
        InputStreamReader reader = new InputStreamReader(in, StandardCharsets.UTF_8)) {
      properties.load(reader);
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
    String found = properties.getProperty(cell.key().toString());
    if (found == null) {
      throw new IllegalStateException("no example for the cell " + cell.key());
    }
    return found;
  }
}
