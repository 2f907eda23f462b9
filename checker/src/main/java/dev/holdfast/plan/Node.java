package dev.holdfast.plan;

import java.util.List;
import java.util.Map;
import tools.jackson.databind.JsonNode;
import tools.jackson.databind.node.ArrayNode;
import tools.jackson.databind.node.JsonNodeFactory;
import tools.jackson.databind.node.ObjectNode;

/** A value of a plan file with its place; the file as it is written, before it means anything. */
sealed interface Node {
  /** Where the value starts; its pointer leads to it. */
  Place place();

  /** The value as the schema validator takes it, without places and written forms. */
  JsonNode json();

  /** Keys with values, in the order of the file. */
  record Mapping(Map<String, Entry> entries, Place place) implements Node {
    /** The value of a key, or null. */
    Node get(String key) {
      Entry entry = entries.get(key);
      return entry == null ? null : entry.value();
    }

    @Override
    public JsonNode json() {
      ObjectNode object = JsonNodeFactory.instance.objectNode();
      entries.forEach((key, entry) -> object.set(key, entry.value().json()));
      return object;
    }
  }

  /**
   * A value and where its key is written.
   *
   * @param keyPlace place of the key; its pointer leads to the value
   * @param value the value
   */
  record Entry(Place keyPlace, Node value) {}

  /** Values in a row. */
  record Sequence(List<Node> items, Place place) implements Node {
    @Override
    public JsonNode json() {
      ArrayNode array = JsonNodeFactory.instance.arrayNode(items.size());
      items.forEach(item -> array.add(item.json()));
      return array;
    }
  }

  /**
   * A single value.
   *
   * @param kind what it is by the JSON schema of YAML 1.2
   * @param text the characters; of a number as they are written
   * @param place where it starts
   */
  record Scalar(Kind kind, String text, Place place) implements Node {
    /** What a scalar is. */
    enum Kind {
      /** Nothing. */
      NULL,
      /** {@code true} or {@code false}. */
      BOOLEAN,
      /** A number, finite as a double. */
      NUMBER,
      /** Anything else. */
      TEXT
    }

    @Override
    public JsonNode json() {
      JsonNodeFactory nodes = JsonNodeFactory.instance;
      return switch (kind) {
        case NULL -> nodes.nullNode();
        case BOOLEAN -> nodes.booleanNode(text.equals("true"));
        case NUMBER -> numberNode(nodes);
        case TEXT -> nodes.stringNode(text);
      };
    }

    private JsonNode numberNode(JsonNodeFactory nodes) {
      double value = Double.parseDouble(text);
      // The validator asks for whole numbers by kind of node, and 12.0 is whole.
      return value == StrictMath.rint(value) && Math.abs(value) < 0x1p53
          ? nodes.numberNode((long) value)
          : nodes.numberNode(value);
    }
  }
}
