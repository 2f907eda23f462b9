package dev.holdfast.cli;

import dev.holdfast.design.Bibliography;
import dev.holdfast.design.Cell;
import dev.holdfast.design.catalogue.Catalogue;
import dev.holdfast.plan.Nearest;
import dev.holdfast.report.CatalogueText;
import java.util.List;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.ParseResult;

/** {@code holdfast catalogue}: the grid of designs, or one cell. */
final class CatalogueCommand implements Command {
  @Override
  public String name() {
    return "catalogue";
  }

  @Override
  public CommandSpec spec() {
    CommandSpec spec =
        Spec.command(
            name(),
            "Print the grid of study designs, or one cell of it.",
            "A design is a cell of a grid: the outcome's scale, the arrangement of the comparison,"
                + " the test. Without a cell, prints the grid; with one, its inputs, its methods"
                + " with the conventions that ask for them, and their references.",
            List.of("holdfast catalogue", "holdfast catalogue parallel-groups/student-t"));
    spec.addPositional(
        Spec.parameter(0, "CELL", false, "Arrangement and test, with a slash between."));
    return Spec.helped(spec);
  }

  @Override
  public int run(ParseResult parsed, Console console) {
    Catalogue catalogue = Catalogue.standard();
    CatalogueText text = new CatalogueText(catalogue, Bibliography.standard());
    String name = parsed.matchedPositionalValue(0, "");
    console.print(name.isEmpty() ? text.grid() : text.cell(find(catalogue, name)));
    return Status.HOLDS;
  }

  /** The cell of a name such as {@code parallel-groups/student-t}. */
  static Cell find(Catalogue catalogue, String name) {
    int slash = name.indexOf('/');
    String arrangement = slash < 0 ? name : name.substring(0, slash);
    String test = slash < 0 ? "" : name.substring(slash + 1);
    return catalogue
        .find(arrangement, test)
        .orElseThrow(
            () ->
                new UnusableException(
                    "there is no cell '" + name + "'; " + advice(catalogue, name)));
  }

  private static String advice(Catalogue catalogue, String name) {
    List<String> names = catalogue.cells().stream().map(cell -> cell.key().toString()).toList();
    String row = name.replaceFirst("/.*", "") + "/";
    List<String> ofTheRow = names.stream().filter(each -> each.startsWith(row)).toList();
    return Nearest.to(name, names)
        .map(near -> "did you mean '" + near + "'?")
        .orElse(
            ofTheRow.isEmpty()
                ? "see 'holdfast catalogue'"
                : "there are " + String.join(", ", ofTheRow));
  }
}
