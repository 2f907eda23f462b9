package dev.holdfast.check;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Arrays;
import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/**
 * Sample-size statements of published protocols and registrations, transcribed with their citation;
 * each gets the verdict that its own figures deserve ({@code statements/verdicts.csv} says why).
 */
class StatementsTest {
  private static final Path FOLDER = Path.of("src", "test", "resources", "statements");

  /** A line of the list. */
  record Expected(String id, String pointer, String verdict, String why) {
    @Override
    public String toString() {
      return id + " " + pointer + " " + verdict + ": " + why;
    }
  }

  static Stream<Expected> statements() throws IOException {
    return Files.readAllLines(FOLDER.resolve("verdicts.csv"), StandardCharsets.UTF_8).stream()
        .filter(line -> !line.startsWith("#") && !line.startsWith("id;"))
        .map(line -> line.split(";", 4))
        .map(cells -> new Expected(cells[0], cells[1], cells[2], cells[3]));
  }

  @ParameterizedTest
  @MethodSource("statements")
  void aPublishedStatementGetsTheVerdictOfItsOwnFigures(Expected expected) throws IOException {
    byte[] bytes = Files.readAllBytes(FOLDER.resolve(expected.id() + ".study-plan.yaml"));
    PlanReport report = Plans.check(new String(bytes, StandardCharsets.UTF_8));
    List<ClaimResult> claims =
        report.claims().stream()
            .filter(
                result ->
                    result
                        .claim()
                        .figure()
                        .place()
                        .pointer()
                        .matches(expected.pointer() + "(/(is|about|at-least))?"))
            .toList();
    assertEquals(1, claims.size(), report.findings().toString());
    assertEquals(expected.verdict(), claims.get(0).verdict().word(), claims.get(0).toString());
  }

  @Test
  void everyStatementIsListedAndCitesItsSource() throws IOException {
    List<String> listed = statements().map(Expected::id).distinct().sorted().toList();
    try (Stream<Path> files = Files.list(FOLDER)) {
      List<Path> plans =
          files.filter(file -> file.toString().endsWith(".study-plan.yaml")).sorted().toList();
      assertEquals(
          listed,
          plans.stream()
              .map(file -> file.getFileName().toString().replace(".study-plan.yaml", ""))
              .toList());
      for (Path plan : plans) {
        assertTrue(Files.readString(plan).startsWith("# "), plan.toString());
      }
    }
  }

  @Test
  void everyVerdictOccursAmongThem() throws IOException {
    List<String> occurring = statements().map(Expected::verdict).distinct().toList();
    assertTrue(
        occurring.containsAll(
            Arrays.asList("holds", "conditional", "short", "understated", "not-computed")),
        occurring.toString());
  }
}
