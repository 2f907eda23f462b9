package dev.holdfast.cli;

import dev.holdfast.design.Cell;
import dev.holdfast.design.catalogue.Catalogue;
import dev.holdfast.plan.SchemaBundle;
import dev.holdfast.plan.Schemas;
import java.util.List;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.ParseResult;

/** {@code holdfast schema}: a JSON Schema in one piece, for editors and programs. */
final class SchemaCommand implements Command {
  private static final String PLAN = "plan";
  private static final String REPORT = "report";

  @Override
  public String name() {
    return "schema";
  }

  @Override
  public CommandSpec spec() {
    CommandSpec spec =
        Spec.command(
            name(),
            "Print a JSON Schema.",
            "Prints in one piece the schema of plan files, of the JSON report, or of the analyses of"
                + " one design. An editor that reads the first line of a plan,"
                + " '# yaml-language-server: $schema=plan.schema.json', completes keys and explains"
                + " them.",
            List.of(
                "holdfast schema > plan.schema.json",
                "holdfast schema report",
                "holdfast schema parallel-groups/student-t"));
    spec.addPositional(
        Spec.parameter(
            0,
            "NAME",
            false,
            "plan, the default; report; or a design: arrangement and test, with a slash between."));
    return Spec.helped(spec);
  }

  @Override
  public int run(ParseResult parsed, Console console) {
    console.print(new SchemaBundle(new Schemas()).of(file(parsed.matchedPositionalValue(0, PLAN))));
    return Status.HOLDS;
  }

  private static String file(String name) {
    if (name.equals(PLAN)) {
      return Schemas.PLAN;
    }
    if (name.equals(REPORT)) {
      return Schemas.REPORT;
    }
    if (!name.contains("/")) {
      throw new UnusableException(
          "there is no schema '" + name + "'; there are plan, report and one for each design");
    }
    Cell cell = CatalogueCommand.find(Catalogue.standard(), name);
    return Schemas.design(cell.key().arrangement().word(), cell.key().test());
  }
}
