package dev.holdfast.plan;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.concurrent.Callable;
import java.util.concurrent.ExecutorService;
import java.util.concurrent.Executors;
import java.util.concurrent.Future;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.MethodSource;

class PlanReaderTest {
  @Test
  void theValidPlansHaveNoProblem() {
    for (String name : Plans.NAMES) {
      PlanReading reading = Plans.read(Plans.text(name));
      assertEquals(List.of(), reading.problems(), name);
      assertTrue(reading.plan().isPresent(), name);
    }
  }

  @Test
  void aPlanNeedsNoMoreThanFormatAndStudy() {
    Plan plan = Plans.plan("bare");
    assertEquals("Counting swifts", plan.study().title());
    assertEquals("draft", plan.study().stage());
    assertEquals(Map.of(), plan.analyses());
    assertEquals(Optional.empty(), plan.recruitment());
  }

  @Test
  void aFigureKeepsItsWrittenFormItsNameAndItsPlace() {
    Plan plan = Plans.plan("orchard-thinning");
    Analysis analysis = plan.analyses().get("heavier-fruit");
    Figure sd = ((Input.One) analysis.cases().get(0).effect().get("sd")).figure();
    assertEquals(21.5, sd.value());
    assertEquals("21.5", sd.written());
    assertEquals(1, sd.decimals());
    assertEquals(Optional.of("weight-sd"), sd.quantity());
    assertEquals(new Place(63, 44, "/analyses/heavier-fruit/effect/sd"), sd.place());
    Figure power = analysis.cases().get(0).claims().get(0).figure();
    assertEquals("0.80", power.written());
    assertEquals(2, power.decimals());
    assertEquals(Optional.empty(), power.quantity());
    assertEquals(new Place(65, 22, "/analyses/heavier-fruit/claims/power"), power.place());
  }

  @Test
  void defaultsAreCarriedIntoEachCaseAndOverriddenFromOutsideIn() {
    Plan plan = Plans.plan("orchard-thinning");
    Settings plain = plan.analyses().get("heavier-fruit").cases().get(0).settings();
    assertEquals("0.05", plain.alpha().orElseThrow().written());
    assertEquals("two", plain.sides().orElseThrow().text());
    assertEquals(Optional.of("division"), plain.conventions().of("loss-by"));
    assertEquals(Optional.of("student-t"), plain.conventions().of("reference"));
    List<Case> grid = plan.analyses().get("fruit-set").cases();
    assertEquals("one", grid.get(1).settings().sides().orElseThrow().text());
    assertEquals("0.01", grid.get(1).settings().alpha().orElseThrow().written());
    assertEquals("0.05", grid.get(2).settings().alpha().orElseThrow().written());
    assertEquals("0.9", grid.get(2).settings().targetPower().orElseThrow().written());
    assertEquals(Optional.of("pooled"), grid.get(0).settings().conventions().of("variance"));
    assertEquals(Optional.of("unpooled"), grid.get(2).settings().conventions().of("variance"));
    assertEquals(Optional.of("10"), grid.get(2).settings().conventions().of("rounding"));
    assertEquals(Optional.of("no"), grid.get(2).settings().conventions().of("continuity"));
  }

  @Test
  void aCaseHasFromItsAnalysisWhatItLeavesOut() {
    List<Case> grid = Plans.plan("orchard-thinning").analyses().get("fruit-set").cases();
    assertEquals(3, grid.size());
    assertEquals(Set.of("base-share", "ratio", "direction"), grid.get(1).effect().keySet());
    assertEquals(0.6, ((Input.One) grid.get(1).effect().get("ratio")).figure().value());
    assertEquals("decrease", ((Input.Word) grid.get(1).effect().get("direction")).word());
    assertEquals(52, grid.get(1).sample().get("thinned").value());
    assertEquals(40, grid.get(2).sample().get("thinned").value());
    assertEquals("0.71", grid.get(1).claims().get(0).figure().written());
    assertEquals(List.of(88, 89, 90), grid.stream().map(each -> each.place().line()).toList());
  }

  @Test
  void anAnalysisWithCasesIsACaseItselfOnlyWhenItClaimsSomething() {
    String text =
        Plans.changed(
            "orchard-thinning", "    cases:\n", "    claims: { power: 0.4 }\n    cases:\n");
    List<Case> grid = Plans.read(text).plan().orElseThrow().analyses().get("fruit-set").cases();
    assertEquals(4, grid.size());
    assertEquals("0.4", grid.get(0).claims().get(0).figure().written());
    assertEquals(0.7, ((Input.One) grid.get(0).effect().get("ratio")).figure().value());
  }

  @Test
  void claimsKeepRelationGroupAndMetric() {
    List<Claim> claims =
        Plans.plan("orchard-thinning").analyses().get("firmer-fruit").cases().get(0).claims();
    assertEquals(Claim.Relation.AT_LEAST, claims.get(0).relation());
    assertEquals(Optional.of("thinned"), claims.get(1).group());
    assertEquals(Claim.Relation.IS, claims.get(2).relation());
    assertEquals(60, claims.get(2).figure().value());
    assertEquals("d", claims.get(3).metric().orElseThrow().text());
  }

  @Test
  void inputsKeepTheirFormAndOrder() {
    Plan plan = Plans.plan("choir-school");
    Case routines = plan.analyses().get("routines-differ").cases().get(0);
    Input.Named means = (Input.Named) routines.effect().get("means");
    assertEquals(List.of("none", "short", "long"), List.copyOf(means.figures().keySet()));
    Case parts = plan.analyses().get("parts-differ").cases().get(0);
    Input.Table cells = (Input.Table) parts.effect().get("cells");
    assertEquals(0.3, cells.rows().get(1).get(2).value());
    Analysis drift = Plans.plan("tide-gauge").analyses().get("no-drift");
    assertEquals(
        Set.of("clusters", "looks", "covariates", "prior", "finite-population"),
        drift.beyond().keySet());
    Input.Named margin = (Input.Named) drift.margin().orElseThrow();
    assertEquals(-5, margin.figures().get("lower").value());
  }

  @Test
  void theOtherSectionsAreRead() {
    Plan plan = Plans.plan("orchard-thinning");
    assertEquals("PEAR-4", plan.study().id().orElseThrow());
    assertEquals("published-study", plan.quantities().get("firmness-d").source().get().kind());
    assertEquals(
        "10.5555/12345678",
        plan.quantities().get("firmness-d").source().get().fields().get("doi").text());
    Family family = plan.families().get("primary");
    assertEquals("holm", family.control().text());
    assertEquals(0.04, family.levels().get("heavier-fruit").value());
    assertFalse(family.independent());
    assertTrue(Plans.plan("choir-school").families().get("primary").independent());
    assertEquals(58, plan.recruitment().get().enrolByGroup().get("thinned").value());
    assertEquals(Optional.of("frost-loss"), plan.recruitment().get().loss().get().quantity());
    assertEquals("2026-02-10", plan.registration().get().date().orElseThrow());
    assertEquals(
        List.of(Optional.of(true), Optional.of(false)),
        plan.amendments().stream().map(Amendment::beforeData).toList());
    assertEquals("analyses.fruit-set", plan.waivers().get(0).at().text());
  }

  @Test
  void unusedQuantitiesAreNamedAndThoseOfLaterSectionsCountAsUsed() {
    assertEquals(Set.of("spare"), Plans.read(Plans.text("tide-gauge")).unusedQuantities());
  }

  static Stream<Arguments> mistakes() {
    return Stream.of(
        mistake(
            "conventions: { reference",
            "conventons: { reference",
            "62:5",
            "'conventons'",
            "Did you mean 'conventions'?"),
        mistake(
            "difference: weight-gain",
            "diference: weight-gain",
            "63:15",
            "'diference'",
            "Did you mean 'difference'?"),
        mistake(
            "arrangement: parallel-groups",
            "arangement: parallel-groups",
            "60:5",
            "'arangement'",
            "Did you mean 'arrangement'?"),
        mistake("title: Hand", "titel: Hand", "5:3", "'titel'", "Did you mean 'title'?"),
        mistake(
            "test: student-t", "test: student", "61:11", "'student'", "Did you mean 'student-t'?"),
        mistake(
            "test: student-t",
            "test: mcnemar",
            "61:11",
            "does not go with parallel-groups",
            "Known there: student-t"),
        mistake("target-power: 0.80", "target-power: .8", "16:17", "'.8'", "Write 0.8."),
        mistake("alpha: 0.025", "alpha: 0,025", "70:12", "'0,025'", "Write 0.025."),
        mistake("alpha: 0.025", "alpha: \"0.025\"", "70:12", "'0.025'", "Write 0.025."),
        mistake("alpha: 0.025", "alpha: .NaN", "70:12", "'.NaN'", "Write a finite number."),
        mistake("alpha: 0.025", "alpha:", "70:11", "'alpha' has no value", "Write one after it"),
        mistake("{ d: firmness-d,", "{ d: 0,45,", "71:20", "'45'", "write 0.45 with a point"),
        mistake("value: 12\n", "value: 012\n", "33:12", "'012'", "Write 12."),
        mistake("value: 12\n", "value: +12\n", "33:12", "'+12'", "Write 12."),
        mistake("value: 12\n", "value: 1_2\n", "33:12", "'1_2'", "Write 12."),
        mistake("value: 0.10", "value: 10%", "38:12", "'10%'", "Write 0.10."),
        mistake(
            "sd: weight-sd",
            "sd: weight-ds",
            "63:44",
            "No quantity is named 'weight-ds'",
            "Did you mean 'weight-sd'?"),
        mistake(
            "value: 0.10",
            "value: 10",
            "73:11",
            "10, the value of 'frost-loss', but must be at most 1",
            "0.10"),
        mistake(
            "claims: { power: 0.80,", "claims: { power: 80,", "65:22", "must be below 1", "0.80"),
        mistake(
            "sample: { thinned: 52,", "sample: { thinned: 0,", "64:24", "must be at least 1", ""),
        mistake(
            "sample: { thinned: 52,",
            "sample: { thinned: 52,5,",
            "64:28",
            "'5' has no value",
            "write 52.5"),
        mistake(
            "multiple-of: 10", "multiple-of: 2.5", "84:79", "must be a whole number", "Round it"),
        mistake(
            "sample: { thinned: 52, unthinned: 52 }",
            "sample: [52, 52]",
            "64:13",
            "is a list",
            "{ dimmed: 119, usual: 119 }"),
        mistake(
            "{ at-least: 0.7 }",
            "{ at-least: 0.7, about: 0.8 }",
            "75:14",
            "holds 2 entries",
            "Keep one"),
        mistake(
            "conventions: { continuity: no",
            "conventions: { continuity: false",
            "84:32",
            "false",
            "Write no."),
        mistake("id: PEAR-4", "id: 4", "6:7", "must be a text", "\"4\""),
        mistake(
            "outcome: weight\n",
            "outcome: wieght\n",
            "58:14",
            "No outcome is named 'wieght'",
            "Did you mean 'weight'?"),
        mistake(
            "of: [heavier-fruit,",
            "of: [heavier-fruits,",
            "98:10",
            "No analysis is named 'heavier-fruits'",
            "Did you mean 'heavier-fruit'?"),
        mistake(
            "levels: { heavier-fruit:",
            "levels: { fruit-set:",
            "102:15",
            "No analysis of this family is named 'fruit-set'",
            "Known: "),
        mistake(
            "date: 2026-02-10",
            "date: 2026-02-30",
            "108:9",
            "no day of the calendar",
            "2026-05-02"),
        mistake("\"sha256:9f86", "\"sha256:xx86", "110:9", "'seal'", "sha256:9f86"),
        mistake(
            "role: primary",
            "role: main",
            "52:19",
            "'main'",
            "Known: primary, secondary, exploratory."),
        mistake(
            "kind: own-records",
            "kind: own-record",
            "40:21",
            "'own-record'",
            "Did you mean 'own-records'?"),
        mistake(
            "  heavier-fruit:\n    outcome",
            "  heavier fruit:\n    outcome",
            "57:3",
            "'heavier fruit' cannot be a name",
            "begins with a letter"),
        mistake(
            "holdfast-plan/1",
            "holdfast-plan/2",
            "2:9",
            "'holdfast-plan/2'",
            "Write holdfast-plan/1."),
        mistake("format: holdfast-plan/1\n", "", "1:1", "'format' is missing", "Add it."),
        mistake(
            "    claims: { power: 0.80, total: 104, enrol: { about: 116 } }",
            "    power: 0.80",
            "65:5",
            "'power' is not known",
            "It belongs under 'claims'."),
        mistake(
            "alpha: 0.05\n    correlation: 0.3",
            "alpha: 0.05\n    correlation: 1.3",
            "101:18",
            "must be below 1",
            ""));
  }

  private static Arguments mistake(
      String from, String to, String place, String message, String remedy) {
    return Arguments.of(from, to, place, message, remedy);
  }

  @ParameterizedTest
  @MethodSource("mistakes")
  void aMistakeIsOneProblemAtItsPlaceWithARemedy(
      String from, String to, String place, String message, String remedy) {
    PlanReading reading = Plans.read(Plans.changed("orchard-thinning", from, to));
    assertTrue(reading.plan().isEmpty());
    List<String> told = Plans.told(reading);
    assertEquals(1, told.size(), told::toString);
    String[] parts = told.get(0).split(" ", 2);
    assertEquals(place, parts[0]);
    assertTrue(parts[1].substring(0, parts[1].indexOf(" | ")).contains(message), parts[1]);
    assertTrue(parts[1].substring(parts[1].indexOf(" | ")).contains(remedy), parts[1]);
  }

  /** Each number of the plans but those that must be numbers is replaced by a name, in turn. */
  @Test
  void aNameMayStandForEveryNumberTheArgumentRestsOn() {
    String numbersOnly =
        "/quantities/.*|/amendments/.*|.*/conventions/z-rounded-to|.*/rounding/multiple-of";
    int replaced = 0;
    for (String name : Plans.NAMES) {
      Node root =
          new TreeReader()
              .read(Plans.text(name).getBytes(StandardCharsets.UTF_8))
              .root()
              .orElseThrow();
      List<Node.Scalar> numbers = new ArrayList<>();
      numbers(root, numbers);
      for (Node.Scalar number : numbers) {
        if (number.place().pointer().matches(numbersOnly)) {
          continue;
        }
        replaced++;
        List<String> lines = new ArrayList<>(Plans.text(name).lines().toList());
        String line = lines.get(number.place().line() - 1);
        int column = number.place().column() - 1;
        lines.set(
            number.place().line() - 1,
            line.substring(0, column)
                + "no-such"
                + line.substring(column + number.text().length()));
        List<String> told = Plans.told(Plans.read(String.join("\n", lines)));
        assertEquals(
            List.of(
                number.place().line()
                    + ":"
                    + number.place().column()
                    + " No quantity is named 'no-such'. | Add it under quantities, or write a"
                    + " number."),
            told,
            number.place().pointer());
      }
    }
    assertTrue(replaced > 100, "only " + replaced + " numbers were seen");
  }

  private static void numbers(Node node, List<Node.Scalar> found) {
    if (node instanceof Node.Mapping mapping) {
      mapping.entries().values().forEach(entry -> numbers(entry.value(), found));
    } else if (node instanceof Node.Sequence sequence) {
      sequence.items().forEach(item -> numbers(item, found));
    } else if (node instanceof Node.Scalar scalar && scalar.kind() == Node.Scalar.Kind.NUMBER) {
      found.add(scalar);
    }
  }

  @Test
  void rowsOfATableAreEquallyLong() {
    PlanReading reading =
        Plans.read(Plans.changed("choir-school", "[0.4, 0.3, 0.3]", "[0.4, 0.6]"));
    assertEquals(
        List.of(
            "23:42 This row holds 2 figures, the first row 3. | Give every row the same number of"
                + " figures."),
        Plans.told(reading));
  }

  @Test
  void problemsAreToldInTheOrderOfTheFile() {
    String text =
        Plans.text("orchard-thinning")
            .replace("sd: weight-sd", "sd: weight-ds")
            .replace("id: PEAR-4", "id: 4")
            .replace("kind: own-records", "kind: own-record");
    assertEquals(
        List.of(6, 40, 63),
        Plans.read(text).problems().stream().map(p -> p.place().line()).toList());
  }

  @Test
  void aPlanThatIsNoSectionIsOneProblem() {
    for (String text : List.of("- a\n- b\n", "hello\n", "5\n", "null\n")) {
      List<String> told = Plans.told(Plans.read(text));
      assertEquals(1, told.size(), told::toString);
      assertTrue(told.get(0).startsWith("1:1 "), told.get(0));
    }
  }

  @Test
  void severalThreadsReadTheSameWithOneReader() throws Exception {
    List<String> texts = new ArrayList<>();
    Plans.NAMES.forEach(name -> texts.add(Plans.text(name)));
    mistakes()
        .forEach(
            each ->
                texts.add(
                    Plans.changed(
                        "orchard-thinning", (String) each.get()[0], (String) each.get()[1])));
    List<PlanReading> alone = texts.stream().map(Plans::read).toList();
    PlanReader shared = new PlanReader(new Schemas());
    ExecutorService threads = Executors.newFixedThreadPool(8);
    try {
      List<Callable<List<PlanReading>>> tasks = new ArrayList<>();
      for (int i = 0; i < 8; i++) {
        int from = i * 5;
        tasks.add(() -> readFrom(shared, texts, from));
      }
      for (Future<List<PlanReading>> each : threads.invokeAll(tasks)) {
        List<PlanReading> readings = each.get();
        assertTrue(alone.equals(readings), "a shared reader read something else");
      }
    } finally {
      threads.shutdownNow();
    }
  }

  /** Reads all texts, each thread another one first, so that schemas are compiled in a race. */
  private static List<PlanReading> readFrom(PlanReader reader, List<String> texts, int from) {
    PlanReading[] readings = new PlanReading[texts.size()];
    for (int i = 0; i < texts.size(); i++) {
      int index = (from + i) % texts.size();
      readings[index] =
          reader.read("study-plan.yaml", texts.get(index).getBytes(StandardCharsets.UTF_8));
    }
    return List.of(readings);
  }

  @Test
  void theLocaleOfTheMachineChangesNothing() {
    Locale before = Locale.getDefault();
    List<List<String>> told = new ArrayList<>();
    try {
      for (String tag : List.of("en-US", "tr-TR", "ar-EG-u-nu-arab", "de-DE", "hi-IN-u-nu-deva")) {
        Locale.setDefault(Locale.forLanguageTag(tag));
        PlanReader reader = new PlanReader(new Schemas());
        told.add(
            mistakes()
                .flatMap(
                    each ->
                        Plans.told(
                            reader.read(
                                "study-plan.yaml",
                                Plans.changed(
                                        "orchard-thinning",
                                        (String) each.get()[0],
                                        (String) each.get()[1])
                                    .getBytes(StandardCharsets.UTF_8)))
                            .stream())
                .toList());
      }
    } finally {
      Locale.setDefault(before);
    }
    told.forEach(each -> assertEquals(told.get(0), each));
  }
}
