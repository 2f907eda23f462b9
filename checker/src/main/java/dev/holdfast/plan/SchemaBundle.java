package dev.holdfast.plan;

import java.util.Map;
import java.util.TreeMap;
import tools.jackson.databind.JsonNode;
import tools.jackson.databind.SerializationFeature;
import tools.jackson.databind.json.JsonMapper;
import tools.jackson.databind.node.ArrayNode;
import tools.jackson.databind.node.JsonNodeFactory;
import tools.jackson.databind.node.ObjectNode;

/**
 * Puts a schema and all that it refers to into one document, so that it can be copied about: each
 * file that is referred to becomes a definition.
 */
public final class SchemaBundle {
  private static final String DEFINITIONS = "definitions";
  private static final String REFERENCE = "$ref";

  private final Schemas schemas;
  private final JsonMapper mapper =
      JsonMapper.builder().enable(SerializationFeature.INDENT_OUTPUT).build();

  /** Bundles of the schemas of the program. */
  public SchemaBundle(Schemas schemas) {
    this.schemas = schemas;
  }

  /**
   * A schema in one piece.
   *
   * @param path under {@code schema/}
   */
  public String of(String path) {
    Map<String, JsonNode> others = new TreeMap<>();
    ObjectNode whole = (ObjectNode) inlined(path, "", schemas.document(path), others);
    ObjectNode definitions = whole.withObject("/" + DEFINITIONS);
    others.forEach(definitions::set);
    if (definitions.isEmpty()) {
      whole.remove(DEFINITIONS);
    }
    return mapper.writeValueAsString(whole).replace("\r\n", "\n") + "\n";
  }

  /**
   * A copy of a part whose references point into the bundle.
   *
   * @param file the file in which the part stands
   * @param home where the file's root stands in the bundle, as a pointer
   * @param others takes the files referred to, by the name of their definition
   */
  private JsonNode inlined(String file, String home, JsonNode part, Map<String, JsonNode> others) {
    if (part.isArray()) {
      ArrayNode copy = JsonNodeFactory.instance.arrayNode();
      part.forEach(each -> copy.add(inlined(file, home, each, others)));
      return copy;
    }
    if (!part.isObject()) {
      return part;
    }
    ObjectNode copy = JsonNodeFactory.instance.objectNode();
    for (Map.Entry<String, JsonNode> entry : part.properties()) {
      boolean reference = entry.getKey().equals(REFERENCE) && entry.getValue().isString();
      boolean ownName = isName(entry.getKey(), home) && entry.getValue().isString();
      if (reference) {
        copy.put(REFERENCE, pointed(file, home, entry.getValue().asString(), others));
      } else if (!ownName) {
        copy.set(entry.getKey(), inlined(file, home, entry.getValue(), others));
      }
    }
    return copy;
  }

  /**
   * Whether a key names its document. The bundle has no name, since it may be put anywhere; that it
   * is a schema, and of which draft, is said once, at its root.
   */
  private static boolean isName(String key, String home) {
    return key.equals("$id") || key.equals("$schema") && !home.isEmpty();
  }

  private String pointed(String file, String home, String reference, Map<String, JsonNode> others) {
    int hash = reference.indexOf('#');
    String pointer = hash < 0 ? "" : reference.substring(hash + 1);
    if (hash == 0) {
      return "#" + home + pointer;
    }
    String target =
        schemas.follow(file, hash < 0 ? reference : reference.substring(0, hash)).path();
    String name = target.replace("/", "-").replaceFirst("\\.json$", "");
    String place = "/" + DEFINITIONS + "/" + name;
    if (!others.containsKey(name)) {
      // Entered before it is filled, since files refer to each other.
      others.put(name, JsonNodeFactory.instance.objectNode());
      others.put(name, inlined(target, place, schemas.document(target), others));
    }
    return "#" + place + pointer;
  }
}
