package dev.holdfast.plan;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;
import static org.junit.jupiter.api.Assertions.fail;
import static org.junit.jupiter.api.Assumptions.assumeTrue;

import java.io.IOException;
import java.net.URI;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Set;
import java.util.TreeSet;
import java.util.concurrent.TimeUnit;
import java.util.stream.Stream;
import org.junit.jupiter.api.AfterAll;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.Timeout;
import tools.jackson.databind.JsonNode;

/**
 * The published schema as an editor uses it: through the language server, by the path in a plan's
 * first line. Needs {@code npm ci} in {@code src/test/yaml-editor}; without it these tests are
 * skipped, but not where the environment says {@code CI}.
 */
@Timeout(value = 120, unit = TimeUnit.SECONDS, threadMode = Timeout.ThreadMode.SEPARATE_THREAD)
class YamlEditorTest {
  private static final Path EDITOR = Path.of("src", "test", "yaml-editor").toAbsolutePath();
  private static final Path SCRIPT =
      EDITOR.resolve("node_modules/yaml-language-server/bin/yaml-language-server");
  private static final String MODELINE =
      "# yaml-language-server: $schema=../../../../schema/plan.schema.json\n";

  private static LanguageServer server;

  @BeforeAll
  static void startTheServer() throws IOException {
    if (!Files.exists(SCRIPT)) {
      String reason = "no language server: run 'npm ci' in " + EDITOR;
      if (System.getenv("CI") != null) {
        fail(reason);
      }
      assumeTrue(false, reason);
    }
    server = new LanguageServer(SCRIPT);
  }

  @AfterAll
  static void stopTheServer() throws IOException {
    if (server != null) {
      server.close();
    }
  }

  @Test
  void theValidPlansHaveNoDiagnostic() throws IOException {
    for (String name : Plans.NAMES) {
      assertEquals(List.of(), open(name, Plans.text(name)), name);
    }
  }

  @Test
  void theExamplePlansHaveNoDiagnostic() throws IOException {
    Path examples = Path.of("..", "example-plans");
    try (Stream<Path> files = Files.walk(examples)) {
      for (Path plan : files.filter(each -> each.endsWith("study-plan.yaml")).sorted().toList()) {
        String text = Files.readString(plan);
        assertEquals(List.of(), open(plan.getParent().getFileName().toString(), text));
      }
    }
  }

  @Test
  void aMisspeltKeyIsOneDiagnosticAtTheKey() throws IOException {
    String text =
        Plans.changed("orchard-thinning", "difference: weight-gain", "diference: weight-gain");
    List<JsonNode> diagnostics = open("misspelt", text);
    assertEquals(1, diagnostics.size(), diagnostics::toString);
    assertTrue(diagnostics.get(0).path("message").asString().contains("diference"));
    assertEquals("62:14", place(diagnostics.get(0)));
  }

  @Test
  void aTestThatTheArrangementDoesNotHaveIsOneDiagnostic() throws IOException {
    List<JsonNode> diagnostics =
        open("misfit", Plans.changed("orchard-thinning", "test: student-t", "test: mcnemar"));
    assertEquals(1, diagnostics.size(), diagnostics::toString);
    assertEquals("60:10", place(diagnostics.get(0)));
  }

  @Test
  void hoveringAKeyGivesItsTitleAndDescription() throws IOException {
    String text = MODELINE + Plans.text("orchard-thinning");
    URI uri = uri("hovered");
    server.open(uri, text);
    String[] lines = text.split("\n");
    for (String[] expected :
        new String[][] {
          {"    effect: { difference", "sd: weight-sd", "Standard deviation of the outcome within"},
          {"    test: student-t", "test", "The test that will be run"},
          {"    claims: { power: 0.80", "total", "Number of participants needed over all groups"},
          {"    interval", "interval", "Lower and upper limit of what the value may be"}
        }) {
      int line = 0;
      while (!lines[line].startsWith(expected[0])) {
        line++;
      }
      String hover = server.hover(uri, line, lines[line].indexOf(expected[1]) + 1);
      assertTrue(hover.contains(expected[2]), expected[1] + ": " + hover);
    }
  }

  @Test
  void completionOffersTheInputsOfTheCell() throws IOException {
    String text =
        MODELINE
            + """
            format: holdfast-plan/1
            study: { title: x, justification: power, participants: humans }
            analyses:
              a:
                outcome: latency
                arrangement: matched-pairs
                test: mcnemar
                effect:
                 \s
            """;
    URI uri = uri("completed");
    server.open(uri, text);
    Set<String> offered = new TreeSet<>(server.completion(uri, 9, 6));
    assertEquals(Set.of("discordant", "discordant-share", "odds-ratio", "difference"), offered);
  }

  @Test
  void completionOffersTheWordsOfAKey() throws IOException {
    String text = MODELINE + "format: holdfast-plan/1\nstudy:\n  participants: \n";
    URI uri = uri("words");
    server.open(uri, text);
    assertTrue(
        server
            .completion(uri, 3, 16)
            .containsAll(List.of("humans", "animals", "samples", "records", "simulated")));
  }

  /**
   * Opens a plan whose own modeline, if it has one, is replaced by one that leads to the schema.
   */
  private static List<JsonNode> open(String name, String text) throws IOException {
    String body =
        text.startsWith("# yaml-language-server") ? text.substring(text.indexOf('\n') + 1) : text;
    return server.open(uri(name), MODELINE + body);
  }

  /** Where an editor would have the plan; nothing is written there. */
  private static URI uri(String name) {
    return EDITOR.resolve(name + ".study-plan.yaml").toUri();
  }

  private static String place(JsonNode diagnostic) {
    JsonNode start = diagnostic.at("/range/start");
    return start.path("line").asInt() + ":" + start.path("character").asInt();
  }
}
