package dev.holdfast.plan;

import com.networknt.schema.Error;
import com.networknt.schema.Schema;
import com.networknt.schema.SchemaLocation;
import com.networknt.schema.SchemaRegistry;
import com.networknt.schema.SchemaRegistryConfig;
import com.networknt.schema.dialect.Dialects;
import com.networknt.schema.resource.InputStreamSource;
import com.networknt.schema.resource.SchemaLoader;
import java.io.ByteArrayInputStream;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import java.util.concurrent.ConcurrentHashMap;
import tools.jackson.databind.JsonNode;
import tools.jackson.databind.node.ArrayNode;
import tools.jackson.databind.node.ObjectNode;

/**
 * Holds a plan against the schema.
 *
 * <p>The published schema reaches the closed definition of an analysis by a branch for each cell of
 * the grid, which is what editors understand. Here the frame is validated without the branches, and
 * each analysis against the definition that its own branch names: the same definitions, at a
 * fraction of the cost, and compiled only when a plan needs them. Safe for any number of threads.
 */
final class SchemaCheck {
  /** Base of all locations; no scheme that anything could be fetched by. */
  static final String BASE = "holdfast:/schema/";

  private final Schemas schemas;
  private final SchemaRegistry registry;
  private final Map<String, Schema> cells = new ConcurrentHashMap<>();
  private final Map<String, String> cellPaths = new HashMap<>();
  private final Schema frame;

  SchemaCheck(Schemas schemas) {
    this.schemas = schemas;
    registry = registry(schemas);
    frame = registry.getSchema(SchemaLocation.of(BASE + Schemas.PLAN), withoutBranches(cellPaths));
  }

  /** A registry that holds nothing yet and can load nothing but the schemas of the program. */
  static SchemaRegistry registry(Schemas schemas) {
    SchemaLoader loader =
        new SchemaLoader(
            List.of(),
            List.of(iri -> source(schemas, iri.toString())),
            iri -> iri.toString().startsWith(BASE),
            iri -> false);
    return SchemaRegistry.withDialect(
        Dialects.getDraft7(),
        builder ->
            builder
                .schemaLoader(loader)
                .schemaRegistryConfig(
                    SchemaRegistryConfig.builder()
                        .formatAssertionsEnabled(true)
                        .locale(Locale.ROOT)
                        .build()));
  }

  /** Where a plan breaks the schema, in no order that means anything. */
  List<Fault> faults(JsonNode plan) {
    List<Fault> faults = new ArrayList<>(faults(frame.validate(plan), ""));
    JsonNode analyses = plan.path("analyses");
    if (analyses.isObject()) {
      analyses
          .properties()
          .forEach(
              entry ->
                  cell(entry.getValue().path("arrangement"), entry.getValue().path("test"))
                      .ifPresent(
                          path ->
                              faults.addAll(
                                  faults(
                                      compiled(path).validate(entry.getValue()),
                                      "/analyses/" + Nodes.escaped(entry.getKey())))));
    }
    return faults;
  }

  /** Path of the closed definition of a cell; empty when there is no such cell. */
  Optional<String> cell(String arrangement, String test) {
    return Optional.ofNullable(cellPaths.get(Schemas.design(arrangement, test)));
  }

  private Optional<String> cell(JsonNode arrangement, JsonNode test) {
    return arrangement.isString() && test.isString()
        ? cell(arrangement.asString(), test.asString())
        : Optional.empty();
  }

  /** What the validator says, as faults. */
  List<Fault> faults(List<Error> errors, String base) {
    return errors.stream().map(error -> fault(error, base)).toList();
  }

  private Fault fault(Error error, String base) {
    String location = error.getSchemaLocation().toString();
    int hash = location.indexOf('#');
    String path = location.substring(BASE.length(), hash);
    String pointer = location.substring(hash + 1);
    String owner = pointer.substring(0, pointer.lastIndexOf('/'));
    return new Fault(
        base + error.getInstanceLocation(),
        error.getKeyword(),
        error.getProperty(),
        error.getSchemaNode(),
        path,
        schemas.document(path).at(owner),
        owner);
  }

  private Schema compiled(String path) {
    return cells.computeIfAbsent(path, each -> registry.getSchema(SchemaLocation.of(BASE + each)));
  }

  /**
   * The published schema without its branches into the cells.
   *
   * @param branches is filled with what the branches lead to, by the name of the cell's file
   */
  private JsonNode withoutBranches(Map<String, String> branches) {
    JsonNode plan = schemas.document(Schemas.PLAN).deepCopy();
    ObjectNode analysis = (ObjectNode) plan.at("/definitions/analysis");
    ArrayNode frameOnly = analysis.arrayNode();
    for (JsonNode condition : analysis.path("allOf")) {
      JsonNode cell = condition.path("then").path("$ref");
      if (cell.isMissingNode()) {
        frameOnly.add(condition);
      } else {
        JsonNode when = condition.path("if").path("properties");
        branches.put(
            Schemas.design(
                when.at("/arrangement/const").asString(), when.at("/test/const").asString()),
            cell.asString());
        // Asks nothing, and leaves the other conditions at their places in the file.
        frameOnly.add(true);
      }
    }
    analysis.set("allOf", frameOnly);
    return plan;
  }

  private static InputStreamSource source(Schemas schemas, String iri) {
    if (!iri.startsWith(BASE)) {
      return null;
    }
    return schemas
        .text(iri.substring(BASE.length()))
        .<InputStreamSource>map(
            text -> () -> new ByteArrayInputStream(text.getBytes(StandardCharsets.UTF_8)))
        .orElse(null);
  }
}
