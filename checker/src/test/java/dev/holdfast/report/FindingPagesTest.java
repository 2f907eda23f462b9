package dev.holdfast.report;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import dev.holdfast.check.FindingKind;
import dev.holdfast.check.PlanReport;
import dev.holdfast.check.Plans;
import dev.holdfast.check.Weight;
import java.net.URI;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Arrays;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;

class FindingPagesTest {
  private static final List<String> HEADINGS =
      List.of("What it says", "Why it matters", "How to mend it", "Example", "Reference");

  private static final Pattern FRAGMENT = Pattern.compile("```yaml\n(.*?)```", Pattern.DOTALL);

  @Test
  void everyKindHasAPageAndEveryPageAKind() throws Exception {
    URI folder = FindingKind.class.getResource("findings/power-drift.md").toURI();
    try (Stream<Path> pages = Files.list(Path.of(folder).getParent())) {
      assertEquals(
          Arrays.stream(FindingKind.values()).map(kind -> kind.word() + ".md").sorted().toList(),
          pages.map(page -> page.getFileName().toString()).sorted().toList());
    }
  }

  @ParameterizedTest
  @EnumSource
  void aPageSaysWhatItsKindSays(FindingKind kind) {
    String summary = Character.toUpperCase(kind.summary().charAt(0)) + kind.summary().substring(1);
    String weight =
        kind.weight() == Weight.NOTES ? "It is a note." : "It " + kind.weight().word() + ".";
    String page = FindingPages.page(kind);
    assertEquals(
        List.of("# " + kind.word(), "", summary + ". " + weight), page.lines().limit(3).toList());
    assertEquals(
        HEADINGS,
        page.lines()
            .filter(line -> line.startsWith("## "))
            .map(line -> line.substring(3))
            .toList());
    assertTrue(page.lines().allMatch(line -> line.length() <= 100), "no line is over 100 long");
  }

  @ParameterizedTest
  @EnumSource
  void theExampleOfAPageIsFoundAndItsMendedFormIsNot(FindingKind kind) {
    Matcher fragments = FRAGMENT.matcher(FindingPages.page(kind));
    assertTrue(fragments.find(), "an example");
    PlanReport found = Plans.check(around(fragments.group(1)));
    assertFalse(Plans.findings(found, kind).isEmpty(), () -> "found: " + found.findings());
    assertTrue(fragments.find(), "a mended example");
    PlanReport mended = Plans.check(around(fragments.group(1)));
    assertTrue(Plans.findings(mended, kind).isEmpty(), () -> "found: " + mended.findings());
    assertTrue(
        Plans.findings(mended, FindingKind.PLAN_INVALID).isEmpty(),
        () -> "found: " + mended.findings());
  }

  /** A plan with the sections of a fragment in place of its own. */
  private static String around(String fragment) {
    Map<String, String> sections = sections(Plans.TWO_MEANS);
    sections.putAll(sections(fragment));
    return String.join("", sections.values());
  }

  private static Map<String, String> sections(String yaml) {
    Map<String, String> sections = new LinkedHashMap<>();
    for (String section : yaml.split("(?m)^(?=\\w)")) {
      if (!section.isBlank()) {
        sections.put(section.substring(0, section.indexOf(':')), section);
      }
    }
    return sections;
  }
}
