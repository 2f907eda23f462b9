package dev.holdfast.report;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import dev.holdfast.check.Finding;
import dev.holdfast.check.FindingKind;
import dev.holdfast.check.PlanReport;
import dev.holdfast.check.Plans;
import dev.holdfast.plan.Place;
import dev.holdfast.report.TextReport.Extent;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import org.junit.jupiter.api.Test;

class TextReportTest {
  private static String write(Extent extent, PlanReport... reports) {
    return new TextReport(Paint.none(), extent).write(List.of(reports));
  }

  private static PlanReport found(Finding... findings) {
    return new PlanReport(
        "plans/a.study-plan.yaml",
        Optional.of("A"),
        PlanReport.Standing.BLOCKED,
        List.of(),
        List.of(findings));
  }

  @Test
  void whatHoldsIsOneLine() {
    assertEquals("1 plan holds.\n", write(Extent.WHAT_MATTERS, Plans.check(Plans.TWO_MEANS)));
    PlanReport report = Plans.check(Plans.TWO_MEANS);
    assertEquals("2 plans hold.\n", write(Extent.WHAT_MATTERS, report, report));
  }

  @Test
  void aFallenClaimSaysWhereWhatMovedAndWhatWouldMendIt() {
    PlanReport report =
        Plans.check(Plans.TWO_MEANS.replace("value: 10,", "value: 11.5,"), Plans.TWO_MEANS);
    assertEquals(
        """
        study-plan.yaml:19:22: blocks power-drift: main claims power 0.80; its assumptions give \
        0.68 by the noncentral t distribution.
            At HEAD it was 0.80; since then score-sd moved from 10 to 11.5 (line 8).
        """,
        write(Extent.WHAT_MATTERS, report)
            .lines()
            .limit(2)
            .map(line -> line + "\n")
            .reduce("", String::concat));
    String text = write(Extent.WHAT_MATTERS, report);
    assertTrue(text.contains("\n    to mend: "), text);
    assertTrue(text.contains("score-sd at most 10."), text);
    assertTrue(text.contains("\n         or: "), text);
    assertTrue(text.endsWith("1 plan, and it does not hold; 2 findings block.\n"), text);
  }

  @Test
  void ofSeveralFiguresThatMovedEachIsShownAlone() {
    PlanReport report =
        Plans.check(
            Plans.TWO_MEANS
                .replace("value: 10,", "value: 11.5,")
                .replace("value: 5,", "value: 4.8,"),
            Plans.TWO_MEANS);
    String text = write(Extent.WHAT_MATTERS, report);
    assertTrue(text.contains("\n    had score-sd alone stayed at 10: 0.77\n"), text);
    assertTrue(text.contains("\n    had gain alone stayed at 5: 0.68\n"), text);
  }

  @Test
  void theExtentDecidesWhichWeightsAreWritten() {
    PlanReport report =
        found(
            Finding.of(FindingKind.LOSS_IGNORED, "", Place.START, "A warning."),
            Finding.of(FindingKind.QUANTITY_UNUSED, "", Place.START, "A note."),
            Finding.of(FindingKind.NOT_WHOLE, "", Place.START, "A block."));
    String blocks = write(Extent.WHAT_BLOCKS, report);
    assertFalse(blocks.contains("A warning.") || blocks.contains("A note."), blocks);
    String matters = write(Extent.WHAT_MATTERS, report);
    assertTrue(matters.contains("A warning.") && !matters.contains("A note."), matters);
    assertTrue(matters.endsWith("1 finding blocks, 1 warns, 1 note. --verbose lists the notes.\n"));
    String everything = write(Extent.EVERYTHING, report);
    assertTrue(everything.contains("notes quantity-unused: A note."), everything);
    assertFalse(everything.contains("--verbose"), everything);
  }

  @Test
  void withEverythingEachClaimIsListedWithItsHeadroom() {
    PlanReport report = Plans.checker(true).check(Plans.read(Plans.TWO_MEANS));
    String text = write(Extent.EVERYTHING, report);
    assertTrue(text.startsWith("study-plan.yaml  holds\n    holds  main: power 0.80,"), text);
    assertTrue(text.contains("\n        stands while score-sd is at most 10."), text);
  }

  @Test
  void manyFindingsOfAKindAreCutWithTheirNumber() {
    List<Finding> many = new ArrayList<>();
    for (int i = 1; i <= 40; i++) {
      many.add(
          Finding.of(FindingKind.SOURCE_MISSING, "", new Place(i, 1, ""), "Quantity " + i + "."));
    }
    many.add(Finding.of(FindingKind.NOT_WHOLE, "", new Place(50, 1, ""), "Another kind."));
    String text = write(Extent.WHAT_MATTERS, found(many.toArray(new Finding[0])));
    assertEquals(25, text.lines().filter(line -> line.contains("Quantity")).count());
    assertTrue(text.contains("and 15 more of source-missing; the JSON report has them all\n"));
    assertTrue(text.contains("Another kind."));
    assertTrue(text.contains("41 findings block"));
  }

  @Test
  void hostileTextOfAPlanStaysOnItsLineAndHarmless() {
    PlanReport report =
        new PlanReport(
            "::error::/a\u001B[2J.study-plan.yaml",
            Optional.of("x"),
            PlanReport.Standing.BLOCKED,
            List.of(),
            List.of(
                Finding.of(
                    FindingKind.NOT_WHOLE,
                    "x",
                    Place.START,
                    "A key\n::warning::is ##[error]hostile\u202E.",
                    "mend\r\n::error::it")));
    String text = write(Extent.EVERYTHING, report);
    assertEquals(4, text.lines().count(), text);
    assertTrue(
        text.lines().noneMatch(line -> line.strip().startsWith("::") || line.contains("##[")),
        text);
    assertTrue(text.chars().allMatch(c -> c == '\n' || c >= ' ' && c != 0x202E), text);
  }

  @Test
  void theLocaleOfTheMachineChangesNothing() {
    Locale before = Locale.getDefault();
    PlanReport report = Plans.check(Plans.TWO_MEANS.replace("value: 10,", "value: 11.5,"));
    String here = write(Extent.EVERYTHING, report);
    try {
      Locale.setDefault(Locale.forLanguageTag("ar-EG-u-nu-arab"));
      PlanReport there = Plans.check(Plans.TWO_MEANS.replace("value: 10,", "value: 11.5,"));
      assertEquals(here, write(Extent.EVERYTHING, there));
      assertEquals(new JsonReport().write(List.of(report)), new JsonReport().write(List.of(there)));
    } finally {
      Locale.setDefault(before);
    }
  }

  @Test
  void aRunWithoutPlansSaysSo() {
    assertEquals("No plan was checked.\n", write(Extent.WHAT_MATTERS));
  }
}
