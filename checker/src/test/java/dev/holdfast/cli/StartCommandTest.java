package dev.holdfast.cli;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import dev.holdfast.check.Finding;
import dev.holdfast.check.FindingKind;
import dev.holdfast.check.PlanReport;
import dev.holdfast.check.Plans;
import dev.holdfast.check.Verdict;
import dev.holdfast.design.Cell;
import dev.holdfast.design.catalogue.Catalogue;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Set;
import java.util.stream.Collectors;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

class StartCommandTest {
  @TempDir Path folder;

  static List<Cell> cells() {
    return Catalogue.standard().cells();
  }

  @ParameterizedTest
  @MethodSource("cells")
  void aPlanOfEveryCellLacksNothingButItsSources(Cell cell) {
    String plan = StartCommand.plan(cell);
    PlanReport report = Plans.check(plan);
    Set<FindingKind> kinds =
        report.findings().stream().map(Finding::kind).collect(Collectors.toSet());
    assertEquals(Set.of(FindingKind.SOURCE_MISSING), kinds, () -> report.findings() + "\n" + plan);
    assertTrue(report.claims().size() >= 2, plan);
    assertTrue(
        report.claims().stream().allMatch(result -> result.verdict() == Verdict.HOLDS),
        () -> report.claims() + "\n" + plan);
  }

  @ParameterizedTest
  @MethodSource("cells")
  void withItsSourcesFilledInItHolds(Cell cell) {
    String plan =
        StartCommand.plan(cell)
            .replace(
                "# source: still to fill in", "source: { kind: assumption, reason: for a test }");
    PlanReport report = Plans.check(plan);
    assertEquals(PlanReport.Standing.HOLDS, report.standing(), () -> report.findings() + plan);
    assertEquals(List.of(), report.findings());
  }

  @Test
  void thePlanIsWrittenWhereItIsAskedForAndSaysWhatToDoNext() throws Exception {
    Path file = folder.resolve("a new/place/study-plan.yaml");
    Ran ran = new Terminal().run("start", "parallel-groups/student-t", file.toString());
    assertEquals(0, ran.status(), ran.err());
    assertTrue(ran.out().contains("holdfast check "), ran.out());
    assertEquals(
        StartCommand.plan(Catalogue.standard().find("parallel-groups", "student-t").orElseThrow()),
        Files.readString(file));
    try (var files = Files.list(file.getParent())) {
      assertEquals(1, files.count());
    }
  }

  @Test
  void aFileThatIsThereIsNeverWrittenOver() throws Exception {
    Path file = Files.writeString(folder.resolve("study-plan.yaml"), "mine");
    Ran ran = new Terminal().run("start", "parallel-groups/student-t", file.toString());
    assertEquals(2, ran.status());
    assertTrue(ran.err().contains("exists; name another file"), ran.err());
    assertEquals("mine", Files.readString(file));
  }

  @Test
  void anotherNameThanThatOfAPlanIsRefusedSinceItWouldNotBeFound() {
    Path file = folder.resolve("plan.yaml");
    Ran ran = new Terminal().run("start", "parallel-groups/student-t", file.toString());
    assertEquals(2, ran.status());
    assertTrue(ran.err().contains("plan.study-plan.yaml"), ran.err());
    assertFalse(Files.exists(file));
  }
}
