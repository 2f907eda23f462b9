package dev.holdfast.plan;

import java.util.Optional;

/** Finding one's way in a tree of {@linkplain Node nodes} by JSON Pointers (RFC 6901). */
final class Nodes {
  private Nodes() {}

  /** A key as it stands in a pointer. */
  static String escaped(String key) {
    return key.replace("~", "~0").replace("/", "~1");
  }

  /** A part of a pointer as the key that it stands for. */
  static String unescaped(String part) {
    return part.replace("~1", "/").replace("~0", "~");
  }

  /** The last key or index of a pointer; empty for the whole document. */
  static String last(String pointer) {
    return unescaped(pointer.substring(pointer.lastIndexOf('/') + 1));
  }

  /** The pointer of what holds this. */
  static String parent(String pointer) {
    return pointer.substring(0, Math.max(0, pointer.lastIndexOf('/')));
  }

  /** The value at a pointer. */
  static Optional<Node> at(Node root, String pointer) {
    Node node = root;
    String[] parts = pointer.split("/", -1);
    for (int i = 1; i < parts.length && node != null; i++) {
      node = child(node, unescaped(parts[i]));
    }
    return Optional.ofNullable(node);
  }

  private static Node child(Node node, String key) {
    if (node instanceof Node.Mapping mapping) {
      return mapping.get(key);
    }
    if (node instanceof Node.Sequence sequence && key.matches("[0-9]{1,9}")) {
      int index = Integer.parseInt(key);
      return index < sequence.items().size() ? sequence.items().get(index) : null;
    }
    return null;
  }

  /** Where the key of a value is written; of an entry of a list, and of the root, the value. */
  static Place keyPlace(Node root, String pointer) {
    if (!pointer.isEmpty()
        && at(root, parent(pointer)).orElse(null) instanceof Node.Mapping mapping) {
      Node.Entry entry = mapping.entries().get(last(pointer));
      if (entry != null) {
        return entry.keyPlace();
      }
    }
    return valuePlace(root, pointer);
  }

  /** Where a value is written. */
  static Place valuePlace(Node root, String pointer) {
    return at(root, pointer).map(Node::place).orElse(Place.START);
  }
}
