package dev.holdfast.report;

import dev.holdfast.design.Bibliography;
import dev.holdfast.design.Cell;
import dev.holdfast.design.Convention;
import dev.holdfast.design.InputSpec;
import dev.holdfast.design.Method;
import dev.holdfast.design.Scale;
import dev.holdfast.design.catalogue.Catalogue;
import java.util.ArrayList;
import java.util.Collection;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.TreeSet;

/** The grid of designs, and one cell of it, as text. */
public final class CatalogueText {
  private final Catalogue catalogue;
  private final Bibliography bibliography;

  /** The text of a catalogue. */
  public CatalogueText(Catalogue catalogue, Bibliography bibliography) {
    this.catalogue = catalogue;
    this.bibliography = bibliography;
  }

  /** The grid: a row for each scale, a column for each arrangement, the tests where they meet. */
  public String grid() {
    Map<String, List<Cell>> byArrangement = new LinkedHashMap<>();
    for (Cell cell : catalogue.cells()) {
      byArrangement
          .computeIfAbsent(cell.key().arrangement().word(), each -> new ArrayList<>())
          .add(cell);
    }
    List<List<String>> rows = new ArrayList<>();
    List<String> heading = new ArrayList<>(List.of(""));
    heading.addAll(byArrangement.keySet());
    rows.add(heading);
    for (Scale scale : Scale.values()) {
      rows.addAll(rows(scale, byArrangement.values()));
    }
    return "A design is a cell of a grid: scale of the outcome, arrangement, test.\n\n"
        + table(rows)
        + "\nOne cell: holdfast catalogue ARRANGEMENT/TEST, as in parallel-groups/student-t\n";
  }

  /** The lines of one scale: as many as the arrangement with the most tests needs. */
  private static List<List<String>> rows(Scale scale, Collection<List<Cell>> arrangements) {
    List<List<String>> columns = new ArrayList<>();
    for (List<Cell> cells : arrangements) {
      columns.add(
          cells.stream()
              .filter(cell -> cell.scales().contains(scale))
              .map(cell -> cell.key().test())
              .toList());
    }
    List<List<String>> rows = new ArrayList<>();
    int height = columns.stream().mapToInt(List::size).max().orElse(0);
    for (int i = 0; i < height; i++) {
      List<String> row = new ArrayList<>(List.of(i == 0 ? scale.word() : ""));
      for (List<String> column : columns) {
        row.add(i < column.size() ? column.get(i) : "");
      }
      rows.add(row);
    }
    return rows;
  }

  /** Columns as wide as their widest entry. */
  private static String table(List<List<String>> rows) {
    StringBuilder text = new StringBuilder();
    for (List<String> row : rows) {
      StringBuilder line = new StringBuilder();
      for (int i = 0; i < row.size(); i++) {
        int column = i;
        int width = rows.stream().mapToInt(each -> each.get(column).length()).max().orElse(0);
        line.append(pad(row.get(i), width + 2));
      }
      text.append(line.toString().stripTrailing()).append('\n');
    }
    return text.toString();
  }

  /** One cell: its inputs, methods, conventions and references. */
  public String cell(Cell cell) {
    StringBuilder text = new StringBuilder();
    text.append(cell.key()).append("\n\n");
    text.append(capital(cell.title())).append(". ").append(cell.question()).append('\n');
    text.append("Scale: ")
        .append(String.join(", ", cell.scales().stream().map(Scale::word).sorted().toList()))
        .append(". Sizes count ")
        .append(cell.arms().unit().word(2))
        .append(".\n\nInputs, under effect:\n");
    for (InputSpec input : cell.inputs()) {
      text.append("  ")
          .append(pad(input.name(), 22))
          .append(pad(input.form().title(), 18))
          .append(input.meaning())
          .append('\n');
    }
    text.append("\nMethods; a plan that states no convention is held to the first:\n");
    Set<String> references = new TreeSet<>();
    for (Method method : cell.methods()) {
      text.append("  ").append(pad(method.key(), 22)).append(method.title());
      text.append(method.exact() ? " (exact)" : "").append('\n');
      if (!method.conventions().isEmpty()) {
        text.append("  ").append(pad("", 22)).append(conventions(method)).append('\n');
      }
      references.add(method.reference());
    }
    text.append("\nReferences:\n");
    references.forEach(key -> text.append("  ").append(bibliography.entry(key)).append('\n'));
    return text.toString();
  }

  private static String conventions(Method method) {
    List<String> words = new ArrayList<>();
    for (Convention convention : Convention.values()) {
      String word = method.conventions().get(convention);
      if (word != null) {
        words.add(convention.key() + ": " + word);
      }
    }
    return String.join(", ", words);
  }

  private static String pad(String text, int width) {
    return text.length() >= width ? text + " " : text + " ".repeat(width - text.length());
  }

  private static String capital(String text) {
    return Character.toUpperCase(text.charAt(0)) + text.substring(1);
  }
}
