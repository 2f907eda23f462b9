package dev.holdfast.cli;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.networknt.schema.Schema;
import com.networknt.schema.SchemaRegistry;
import com.networknt.schema.dialect.Dialects;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import org.junit.jupiter.params.provider.ValueSource;
import tools.jackson.databind.JsonNode;
import tools.jackson.databind.ObjectMapper;
import tools.jackson.dataformat.yaml.YAMLMapper;

class SchemaCommandTest {
  private static final ObjectMapper YAML =
      YAMLMapper.builder()
          .enable(tools.jackson.databind.DeserializationFeature.USE_BIG_DECIMAL_FOR_FLOATS)
          .build();

  private static Schema schema(String... name) {
    String[] arguments = new String[name.length + 1];
    arguments[0] = "schema";
    System.arraycopy(name, 0, arguments, 1, name.length);
    Ran ran = new Terminal().run(arguments);
    assertEquals(0, ran.status(), ran.err());
    assertFalse(ran.out().matches("(?s).*\"\\$ref\" : \"[^#].*"), "a reference to elsewhere");
    return SchemaRegistry.withDialect(Dialects.getDraft7()).getSchema(YAML.readTree(ran.out()));
  }

  static List<Path> examples() throws IOException {
    try (Stream<Path> files = Files.walk(Path.of("../example-plans"))) {
      return files.filter(file -> file.toString().endsWith("study-plan.yaml")).sorted().toList();
    }
  }

  @ParameterizedTest
  @MethodSource("examples")
  void inOnePieceItTakesWhatTheProgramTakes(Path example) throws IOException {
    assertEquals(List.of(), schema().validate(YAML.readTree(Files.readString(example))));
  }

  @Test
  void inOnePieceItRefusesWhatTheProgramRefuses() throws IOException {
    String plan = Files.readString(examples().get(0));
    JsonNode misspelt = YAML.readTree(plan.replaceFirst("    effect:", "    efect:"));
    assertFalse(schema().validate(misspelt).isEmpty());
    JsonNode unknown =
        YAML.readTree(plan.replaceFirst("participants: \\w+", "participants: elves"));
    assertFalse(schema().validate(unknown).isEmpty());
  }

  @ParameterizedTest
  @ValueSource(strings = {"plan", "report", "parallel-groups/student-t"})
  void eachIsASchemaOfItsDraft(String name) {
    String text = new Terminal().run("schema", name).out();
    JsonNode root = YAML.readTree(text);
    assertEquals("http://json-schema.org/draft-07/schema#", root.path("$schema").asString());
    assertTrue(text.endsWith("}\n"));
    schema(name);
  }
}
