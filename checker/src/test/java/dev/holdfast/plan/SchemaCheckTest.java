package dev.holdfast.plan;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.networknt.schema.Schema;
import com.networknt.schema.SchemaException;
import com.networknt.schema.SchemaLocation;
import com.networknt.schema.SchemaRegistry;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Random;
import java.util.Set;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.constraints.IntRange;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import tools.jackson.databind.JsonNode;
import tools.jackson.databind.node.ArrayNode;
import tools.jackson.databind.node.JsonNodeFactory;
import tools.jackson.databind.node.ObjectNode;

class SchemaCheckTest {
  private static final JsonNodeFactory NODES = JsonNodeFactory.instance;

  private final Schemas schemas = new Schemas();
  private final SchemaCheck check = new SchemaCheck(schemas);
  private final Schema published =
      SchemaCheck.registry(schemas).getSchema(SchemaLocation.of(SchemaCheck.BASE + Schemas.PLAN));

  @ParameterizedTest
  @ValueSource(
      strings = {
        "https://example.org/plan.json",
        "http://127.0.0.1:9/plan.json",
        "file:///etc/hostname",
        "jar:file:/x.jar!/plan.json",
        "classpath:/dev/holdfast/schema/plan.schema.json",
        "holdfast:/schema/../schema/plan.schema.json",
        "holdfast:/schema/none.json",
        "urn:x"
      })
  void noSchemaOutsideTheProgramIsLoaded(String location) {
    SchemaRegistry registry = SchemaCheck.registry(schemas);
    assertThrows(
        SchemaException.class, () -> registry.getSchema(SchemaLocation.of(location)), location);
  }

  @Test
  void aReferenceOutsideTheProgramIsRefused() {
    SchemaRegistry registry = SchemaCheck.registry(schemas);
    ObjectNode schema = NODES.objectNode().put("$ref", "https://example.org/plan.json");
    assertThrows(
        SchemaException.class, () -> registry.getSchema(schema).validate(NODES.objectNode()));
  }

  @Test
  void bothRoutesAcceptTheValidPlans() {
    for (String name : Plans.NAMES) {
      JsonNode plan = tree(Plans.text(name)).json();
      assertEquals(List.of(), check.faults(plan), name);
      assertEquals(List.of(), published.validate(plan), name);
    }
  }

  /**
   * Editors take the published schema's branches, the reader goes to the cell itself; whatever is
   * done to a plan, both must say the same.
   */
  @Property(tries = 1500)
  void bothRoutesTellTheSameProblems(
      @ForAll @IntRange(min = 0, max = 3) int plan,
      @ForAll @IntRange(min = 1, max = 4) int changes,
      @ForAll long seed) {
    Random random = new Random(seed);
    ObjectNode json = (ObjectNode) tree(Plans.text(Plans.NAMES.get(plan))).json();
    for (int i = 0; i < changes; i++) {
      change(json, random);
    }
    // JSON is YAML: the changed plan is read again so that its problems have places.
    Node root = tree(json.toString());
    FaultWording wording = new FaultWording(schemas, root, root);
    Set<PlanProblem> byDispatch = new LinkedHashSet<>(wording.problems(check.faults(root.json())));
    Set<PlanProblem> byBranches =
        new LinkedHashSet<>(wording.problems(check.faults(published.validate(root.json()), "")));
    assertEquals(byBranches, byDispatch, json::toString);
    byDispatch.forEach(problem -> assertFalse(problem.remedy().isBlank(), problem::toString));
  }

  @Test
  void mostChangesOfThePropertyAboveBreakAPlan() {
    int broken = 0;
    for (int seed = 0; seed < 200; seed++) {
      ObjectNode json = (ObjectNode) tree(Plans.text("orchard-thinning")).json();
      change(json, new Random(seed));
      broken += check.faults(json).isEmpty() ? 0 : 1;
    }
    assertTrue(broken > 80 && broken < 195, broken + " of 200 were broken");
  }

  private static void change(ObjectNode plan, Random random) {
    List<JsonNode> containers = new ArrayList<>();
    collect(plan, containers);
    JsonNode container = containers.get(random.nextInt(containers.size()));
    if (container instanceof ObjectNode object) {
      List<String> keys = new ArrayList<>(object.propertyNames());
      String key = keys.isEmpty() ? "new" : keys.get(random.nextInt(keys.size()));
      switch (random.nextInt(5)) {
        case 0 -> object.remove(key);
        case 1 -> {
          JsonNode value = object.remove(key);
          object.set(key.length() > 2 ? key.substring(1) : key + "x", value);
        }
        case 2 -> object.set(word(random), value(random));
        default -> object.set(key, value(random));
      }
    } else if (container instanceof ArrayNode array) {
      if (array.isEmpty() || random.nextBoolean()) {
        array.add(value(random));
      } else if (random.nextBoolean()) {
        array.remove(random.nextInt(array.size()));
      } else {
        array.set(random.nextInt(array.size()), value(random));
      }
    }
  }

  private static void collect(JsonNode node, List<JsonNode> containers) {
    if (node.isContainer()) {
      containers.add(node);
      node.forEach(child -> collect(child, containers));
    }
  }

  private static String word(Random random) {
    List<String> words =
        List.of(
            "arrangement",
            "test",
            "outcome",
            "effect",
            "sample",
            "claims",
            "cases",
            "alpha",
            "power",
            "sd",
            "at-least",
            "as",
            "kind",
            "value",
            "x y",
            "a/b",
            "~",
            "");
    return words.get(random.nextInt(words.size()));
  }

  private static JsonNode value(Random random) {
    List<String> words =
        List.of(
            "student-t",
            "log-rank",
            "parallel-groups",
            "single-group",
            "association",
            "holm",
            "yes",
            "one",
            "weight-sd",
            ".5",
            "",
            "2026-02-30",
            "primary");
    return switch (random.nextInt(9)) {
      case 0 -> NODES.nullNode();
      case 1 -> NODES.booleanNode(random.nextBoolean());
      case 2 -> NODES.numberNode(random.nextInt(200) - 50);
      case 3 -> NODES.numberNode(random.nextInt(30) / 8.0 - 1);
      case 4 -> NODES.objectNode();
      case 5 -> NODES.arrayNode().add(1).add("x");
      case 6 -> NODES.objectNode().set(word(random), NODES.numberNode(0.5));
      default -> NODES.stringNode(words.get(random.nextInt(words.size())));
    };
  }

  private static Node tree(String text) {
    return new TreeReader().read(text.getBytes(StandardCharsets.UTF_8)).root().orElseThrow();
  }
}
