package dev.holdfast.plan;

import java.util.ArrayList;
import java.util.List;
import tools.jackson.databind.JsonNode;

/** Writes a value of the schema, such as an example, in the flow style of YAML. */
final class Flow {
  private Flow() {}

  static String text(JsonNode node) {
    List<String> parts = new ArrayList<>();
    if (node.isObject()) {
      node.properties().forEach(entry -> parts.add(entry.getKey() + ": " + text(entry.getValue())));
      return "{ " + String.join(", ", parts) + " }";
    }
    if (node.isArray()) {
      node.forEach(item -> parts.add(text(item)));
      return "[" + String.join(", ", parts) + "]";
    }
    return node.asString();
  }
}
