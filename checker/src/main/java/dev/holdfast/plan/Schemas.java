package dev.holdfast.plan;

import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.LinkedHashSet;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.concurrent.ConcurrentHashMap;
import java.util.regex.Pattern;
import tools.jackson.databind.JsonNode;
import tools.jackson.databind.json.JsonMapper;

/** The schemas that are packed into the program, by their path under {@code schema/}. */
public final class Schemas {
  /** The schema of plan files. */
  public static final String PLAN = "plan.schema.json";

  /** The schema of the JSON report. */
  public static final String REPORT = "report.schema.json";

  private static final String FOLDER = "/dev/holdfast/schema/";

  /** No folder but one, and no way upward. */
  private static final Pattern PATH = Pattern.compile("(?:[a-z0-9-]+/)?[a-z0-9.-]+\\.json");

  private final JsonMapper mapper = new JsonMapper();
  private final Map<String, JsonNode> documents = new ConcurrentHashMap<>();

  /** The path of a design's schema. */
  public static String design(String arrangement, String test) {
    return "designs/" + arrangement + "." + test + ".json";
  }

  /**
   * The text of a schema.
   *
   * @param path under {@code schema/}, such as {@code designs/parallel-groups.student-t.json}
   * @return the text, or nothing when the program holds no schema of that path
   */
  public Optional<String> text(String path) {
    if (!PATH.matcher(path).matches()) {
      return Optional.empty();
    }
    try (InputStream in = Schemas.class.getResourceAsStream(FOLDER + path)) {
      return in == null
          ? Optional.empty()
          : Optional.of(new String(in.readAllBytes(), StandardCharsets.UTF_8));
    } catch (IOException e) {
      throw new UncheckedIOException("the schema " + path + " cannot be read", e);
    }
  }

  /**
   * A part of a schema.
   *
   * @param path path of the file
   * @param schema the part
   */
  record Part(String path, JsonNode schema) {}

  /** What a {@code $ref} leads to, from the file in which it stands. */
  Part follow(String from, String reference) {
    int hash = reference.indexOf('#');
    String file = hash < 0 ? reference : reference.substring(0, hash);
    String pointer = hash < 0 ? "" : reference.substring(hash + 1);
    String folder = from.substring(0, from.lastIndexOf('/') + 1);
    String path =
        file.isEmpty() ? from : file.startsWith("../") ? file.substring(3) : folder + file;
    return new Part(path, document(path).at(pointer));
  }

  /** The keys that a part of a schema knows, through what it refers to. */
  Set<String> keys(Part part) {
    Set<String> keys = new LinkedHashSet<>();
    JsonNode schema = part.schema();
    if (schema.has("$ref")) {
      return keys(follow(part.path(), schema.path("$ref").asString()));
    }
    schema.path("properties").properties().forEach(entry -> keys.add(entry.getKey()));
    schema.path("allOf").forEach(each -> keys.addAll(keys(new Part(part.path(), each))));
    return keys;
  }

  /** A schema as a document, which nobody may change. */
  JsonNode document(String path) {
    return documents.computeIfAbsent(
        path,
        each ->
            mapper.readTree(
                text(each)
                    .orElseThrow(() -> new IllegalArgumentException("no schema named " + each))));
  }
}
