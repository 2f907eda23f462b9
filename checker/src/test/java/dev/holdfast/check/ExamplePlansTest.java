package dev.holdfast.check;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.LinkedHashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.TreeSet;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;

/** The example plans show what their README says they show. */
class ExamplePlansTest {
  private static final Path EXAMPLES = Path.of("..", "example-plans");
  private static final Pattern ROW = Pattern.compile("^\\| `([a-z-]+)` \\|[^|]*\\|([^|]*)\\|$");
  private static final Pattern NAME = Pattern.compile("`([a-z-]+)`");

  /** The findings that the README promises, by plan. */
  private static Map<String, Set<String>> promised() throws IOException {
    Map<String, Set<String>> rows = new LinkedHashMap<>();
    for (String line : Files.readAllLines(EXAMPLES.resolve("README.md"))) {
      Matcher row = ROW.matcher(line);
      if (row.matches()) {
        Set<String> names = new TreeSet<>();
        Matcher name = NAME.matcher(row.group(2));
        while (name.find()) {
          names.add(name.group(1));
        }
        rows.put(row.group(1), names);
      }
    }
    return rows;
  }

  private static PlanReport report(String name) throws IOException {
    return Plans.check(Files.readString(EXAMPLES.resolve(name).resolve("study-plan.yaml")));
  }

  @Test
  void eachPlanHasTheFindingsThatTheReadmePromises() throws IOException {
    for (Map.Entry<String, Set<String>> row : promised().entrySet()) {
      Set<String> found = new TreeSet<>();
      report(row.getKey()).findings().forEach(finding -> found.add(finding.kind().word()));
      assertEquals(row.getValue(), found, row.getKey());
    }
  }

  @Test
  void aPlanWithoutFindingsHolds() throws IOException {
    for (Map.Entry<String, Set<String>> row : promised().entrySet()) {
      boolean holds = report(row.getKey()).standing() == PlanReport.Standing.HOLDS;
      assertEquals(row.getValue().isEmpty(), holds, row.getKey());
    }
  }

  @Test
  void theReadmeListsEveryPlan() throws IOException {
    try (Stream<Path> folders = Files.list(EXAMPLES)) {
      Set<String> present = new TreeSet<>();
      folders
          .filter(Files::isDirectory)
          .forEach(each -> present.add(each.getFileName().toString()));
      assertEquals(present, new TreeSet<>(promised().keySet()));
    }
  }

  @Test
  void theirAnalysesCoverMostOfTheGrid() throws IOException {
    Set<String> cells = new LinkedHashSet<>();
    for (String name : promised().keySet()) {
      Plans.read(Files.readString(EXAMPLES.resolve(name).resolve("study-plan.yaml")))
          .plan()
          .orElseThrow()
          .analyses()
          .values()
          .forEach(each -> cells.add(each.arrangement() + "/" + each.test()));
    }
    assertTrue(cells.size() >= 13, List.copyOf(cells).toString());
  }
}
