package dev.holdfast.plan;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.networknt.schema.Schema;
import com.networknt.schema.SchemaLocation;
import com.networknt.schema.SchemaRegistry;
import com.networknt.schema.dialect.Dialects;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.TreeSet;
import java.util.function.BiConsumer;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import tools.jackson.databind.JsonNode;

class SchemasTest {
  private static final Path FOLDER = Path.of("..", "schema");
  private static final Set<String> WORDED =
      Set.of(
          "type",
          "pattern",
          "enum",
          "const",
          "format",
          "propertyNames",
          "minimum",
          "exclusiveMinimum",
          "maximum",
          "exclusiveMaximum",
          "minLength",
          "minItems",
          "maxItems",
          "minProperties",
          "maxProperties",
          "uniqueItems",
          "required",
          "additionalProperties");
  private static final Set<String> STRUCTURE =
      Set.of(
          "$schema",
          "$id",
          "$ref",
          "$comment",
          "title",
          "description",
          "examples",
          "definitions",
          "properties",
          "items",
          "allOf",
          "if",
          "then",
          "else");

  private final Schemas schemas = new Schemas();

  @Test
  void everyFileOfTheFolderIsInTheProgramByteForByte() throws IOException {
    for (String path : paths()) {
      assertEquals(Files.readString(FOLDER.resolve(path)), schemas.text(path).orElseThrow());
    }
  }

  @Test
  void nothingOutsideTheFolderIsGivenOut() {
    for (String path :
        List.of(
            "../plan/Plan.class",
            "/etc/passwd",
            "designs/../plan.schema.json",
            "designs",
            "",
            "none.json",
            "designs/none.json",
            "a/b/c.json")) {
      assertEquals(Optional.empty(), schemas.text(path), path);
    }
  }

  @Test
  void everySchemaIsValidAgainstTheMetaSchemaOfItsDraft() throws IOException {
    Schema metaSchema =
        SchemaRegistry.withDialect(Dialects.getDraft7())
            .getSchema(SchemaLocation.of("http://json-schema.org/draft-07/schema#"));
    for (String path : paths()) {
      assertEquals(List.of(), metaSchema.validate(schemas.document(path)), path);
      assertEquals(
          "http://json-schema.org/draft-07/schema#",
          schemas.document(path).path("$schema").asString());
      assertEquals(
          Path.of(path).getFileName().toString(), schemas.document(path).path("$id").asString());
    }
  }

  @Test
  void everyPropertyHasTitleDescriptionAndExamples() throws IOException {
    List<String> lacking = new ArrayList<>();
    eachProperty(
        (where, property) -> {
          for (String key : List.of("title", "description", "examples")) {
            JsonNode value = property.schema().path(key);
            if (value.isMissingNode() || value.isEmpty() && !value.isString()) {
              lacking.add(where + " " + key);
            }
          }
        });
    assertEquals(List.of(), lacking);
  }

  @Test
  void everyExampleIsValidAgainstItsProperty() throws IOException {
    SchemaRegistry registry = SchemaCheck.registry(schemas);
    List<String> wrong = new ArrayList<>();
    int[] examples = {0};
    eachProperty(
        (where, property) -> {
          Schema schema = registry.getSchema(SchemaLocation.of(SchemaCheck.BASE + where));
          for (JsonNode example : property.schema().path("examples")) {
            examples[0]++;
            schema.validate(example).forEach(error -> wrong.add(where + " " + error));
          }
        });
    assertEquals(List.of(), wrong);
    assertTrue(examples[0] > 500, "only " + examples[0] + " examples were seen");
  }

  @Test
  void everySectionWithKeysIsClosed() throws IOException {
    List<String> open = new ArrayList<>();
    eachSchema(
        (where, part) -> {
          boolean condition = where.contains("/if") || where.contains("/then");
          boolean frameOfAnalyses = where.endsWith("#/definitions/analysis");
          if (part.schema().has("properties")
              && !condition
              && !frameOfAnalyses
              && !part.schema().path("additionalProperties").equals(falseNode())) {
            open.add(where);
          }
        });
    assertEquals(List.of(), open);
  }

  @Test
  void everyKeywordIsStructureOrHasAWording() throws IOException {
    Set<String> strange = new TreeSet<>();
    eachSchema(
        (where, part) ->
            part.schema()
                .properties()
                .forEach(
                    entry -> {
                      if (!WORDED.contains(entry.getKey()) && !STRUCTURE.contains(entry.getKey())) {
                        strange.add(entry.getKey());
                      }
                    }));
    assertEquals(Set.of(), strange);
  }

  @Test
  void everyCellIsOneFileOneBranchAndTwoNamesOfItsTest() throws IOException {
    JsonNode analysis = schemas.document(Schemas.PLAN).at("/definitions/analysis");
    Set<String> branches = new TreeSet<>();
    Set<String> fitting = new TreeSet<>();
    for (JsonNode condition : analysis.path("allOf")) {
      JsonNode when = condition.at("/if/properties");
      String arrangement = when.at("/arrangement/const").asString();
      JsonNode reference = condition.at("/then/$ref");
      if (reference.isMissingNode()) {
        condition
            .at("/then/properties/test/enum")
            .forEach(test -> fitting.add(Schemas.design(arrangement, test.asString())));
      } else {
        String path = Schemas.design(arrangement, when.at("/test/const").asString());
        assertEquals(path, reference.asString());
        branches.add(path);
        JsonNode cell = schemas.document(path).path("properties");
        assertEquals(arrangement, cell.at("/arrangement/const").asString());
        assertEquals(when.at("/test/const"), cell.at("/test/const"));
      }
    }
    Set<String> files = new TreeSet<>(paths());
    files.removeIf(path -> !path.startsWith("designs/"));
    assertEquals(files, branches);
    assertEquals(files, fitting);
    Set<String> tests = new TreeSet<>();
    analysis.at("/properties/test/enum").forEach(test -> tests.add(test.asString()));
    Set<String> testsOfFiles = new TreeSet<>();
    files.forEach(path -> testsOfFiles.add(path.replaceAll("^.*\\.(.*)\\.json$", "$1")));
    assertEquals(testsOfFiles, tests);
  }

  private static JsonNode falseNode() {
    return tools.jackson.databind.node.JsonNodeFactory.instance.booleanNode(false);
  }

  private static List<String> paths() throws IOException {
    try (Stream<Path> files = Files.walk(FOLDER)) {
      return files
          .filter(file -> file.toString().endsWith(".json"))
          .map(file -> FOLDER.relativize(file).toString().replace('\\', '/'))
          .filter(path -> !path.startsWith("report"))
          .sorted()
          .toList();
    }
  }

  /** Visits every property with its location and, through a reference, its schema. */
  private void eachProperty(BiConsumer<String, Schemas.Part> visit) throws IOException {
    eachSchema(
        (where, part) -> {
          if (where.contains("/if") || where.contains("/then") || where.contains("/else")) {
            return;
          }
          for (Map.Entry<String, JsonNode> entry : part.schema().path("properties").properties()) {
            JsonNode property = entry.getValue();
            Schemas.Part target =
                property.has("$ref")
                    ? schemas.follow(part.path(), property.path("$ref").asString())
                    : new Schemas.Part(part.path(), property);
            visit.accept(where + "/properties/" + Nodes.escaped(entry.getKey()), target);
          }
        });
  }

  /** Visits every schema of every file, conditions included. */
  private void eachSchema(BiConsumer<String, Schemas.Part> visit) throws IOException {
    for (String path : paths()) {
      walk(path + "#", new Schemas.Part(path, schemas.document(path)), visit);
    }
  }

  private static void walk(
      String where, Schemas.Part part, BiConsumer<String, Schemas.Part> visit) {
    JsonNode schema = part.schema();
    if (!schema.isObject()) {
      return;
    }
    visit.accept(where, part);
    for (String key : List.of("properties", "definitions")) {
      schema
          .path(key)
          .properties()
          .forEach(
              entry ->
                  walk(
                      where + "/" + key + "/" + Nodes.escaped(entry.getKey()),
                      new Schemas.Part(part.path(), entry.getValue()),
                      visit));
    }
    for (String key :
        List.of("additionalProperties", "items", "propertyNames", "if", "then", "else")) {
      walk(where + "/" + key, new Schemas.Part(part.path(), schema.path(key)), visit);
    }
    for (int i = 0; i < schema.path("allOf").size(); i++) {
      walk(
          where + "/allOf/" + i, new Schemas.Part(part.path(), schema.path("allOf").get(i)), visit);
    }
  }
}
