package dev.holdfast.plan;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import tools.jackson.databind.JsonNode;

/**
 * Finds the places of a plan where the name of a quantity stands for a number. The schema says
 * where that can be: wherever it refers to a definition of {@code parts/figure.json} or {@code
 * parts/claim.json}.
 */
final class FigurePlaces {
  private static final Set<String> FIGURES = Set.of("parts/figure.json", "parts/claim.json");

  private final Schemas schemas;
  private final SchemaCheck check;

  FigurePlaces(Schemas schemas, SchemaCheck check) {
    this.schemas = schemas;
    this.check = check;
  }

  /** Texts that stand where a number may, in the order of the file, whether names or not. */
  List<Node.Scalar> named(Node plan) {
    List<Node.Scalar> found = new ArrayList<>();
    walk(Schemas.PLAN, schemas.document(Schemas.PLAN), plan, found);
    found.sort((one, other) -> one.place().compareTo(other.place()));
    return found;
  }

  private void walk(String file, JsonNode schema, Node node, List<Node.Scalar> found) {
    if (schema.has("$ref")) {
      refer(file, schema.path("$ref").asString(), node, found);
      return;
    }
    schema.path("allOf").forEach(part -> walk(file, part, node, found));
    if (node instanceof Node.Mapping mapping) {
      JsonNode properties = schema.path("properties");
      JsonNode others = schema.path("additionalProperties");
      mapping
          .entries()
          .forEach(
              (key, entry) ->
                  walk(
                      file,
                      properties.has(key) ? properties.path(key) : others,
                      entry.value(),
                      found));
    } else if (node instanceof Node.Sequence sequence) {
      sequence.items().forEach(item -> walk(file, schema.path("items"), item, found));
    }
  }

  private void refer(String file, String reference, Node node, List<Node.Scalar> found) {
    Schemas.Part part = schemas.follow(file, reference);
    if (FIGURES.contains(part.path())
        && node instanceof Node.Scalar scalar
        && scalar.kind() == Node.Scalar.Kind.TEXT) {
      found.add(scalar);
      return;
    }
    walk(part.path(), part.schema(), node, found);
    if (reference.equals("#/definitions/analysis")) {
      cell(node).ifPresent(each -> walk(each, schemas.document(each), node, found));
    }
  }

  private Optional<String> cell(Node analysis) {
    return analysis instanceof Node.Mapping mapping
            && mapping.get("arrangement") instanceof Node.Scalar arrangement
            && mapping.get("test") instanceof Node.Scalar test
        ? check.cell(arrangement.text(), test.text())
        : Optional.empty();
  }
}
