package dev.holdfast.plan;

import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.Collection;
import java.util.LinkedHashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import tools.jackson.databind.JsonNode;

/** Says in the plan's own terms where it breaks the schema, and what to do about it. */
final class FaultWording {
  private static final int NAMED = 6;
  private static final String NAME_REMEDY =
      "A name begins with a letter and goes on with letters, digits, '-' and '_'.";

  private final Schemas schemas;
  private final Node written;
  private final Node resolved;

  /**
   * @param schemas where the schema can be read
   * @param written the plan as it is written
   * @param resolved the plan that was held against the schema: the same, or with the values of
   *     quantities in place of their names
   */
  FaultWording(Schemas schemas, Node written, Node resolved) {
    this.schemas = schemas;
    this.written = written;
    this.resolved = resolved;
  }

  /** One problem for each mistake; a misspelt key is one, though it is also a missing key. */
  List<PlanProblem> problems(List<Fault> faults) {
    Map<String, Set<String>> missing = new LinkedHashMap<>();
    for (Fault fault : faults) {
      if (fault.keyword().equals("required")) {
        missing
            .computeIfAbsent(fault.pointer(), pointer -> new LinkedHashSet<>())
            .add(fault.property());
      }
    }
    List<PlanProblem> problems = new ArrayList<>();
    for (Fault fault : faults) {
      if (fault.keyword().equals("additionalProperties")) {
        problems.add(unknownKey(fault, missing.getOrDefault(fault.pointer(), Set.of())));
      }
    }
    missing.forEach((pointer, keys) -> keys.forEach(key -> problems.add(missing(pointer, key))));
    for (Fault fault : faults) {
      switch (fault.keyword()) {
        case "required", "additionalProperties" -> {
          // Told above.
        }
        default -> problems.add(other(fault));
      }
    }
    return problems;
  }

  /** Words joined for a sentence, with the number of those left out. */
  static String listed(List<String> shown, Collection<String> all) {
    int more = all.size() - shown.size();
    return String.join(", ", shown) + (more > 0 ? " and " + more + " more" : "");
  }

  private PlanProblem unknownKey(Fault fault, Set<String> missing) {
    String key = fault.property();
    Place place = Nodes.keyPlace(written, fault.pointer() + "/" + Nodes.escaped(key));
    Set<String> known = new LinkedHashSet<>();
    fault.owner().path("properties").properties().forEach(entry -> known.add(entry.getKey()));
    if (Nodes.at(written, fault.pointer()).orElse(null) instanceof Node.Mapping mapping) {
      known.removeAll(mapping.entries().keySet());
    }
    Optional<String> meant = Nearest.to(key, missing);
    meant.ifPresent(missing::remove);
    String remedy =
        meant
            .or(() -> Nearest.to(key, known))
            .map(near -> "Did you mean " + Quoted.text(near) + "?")
            .or(() -> splitByComma(fault.pointer(), key))
            .or(() -> otherSection(fault, key))
            .orElseGet(
                () ->
                    known.isEmpty()
                        ? "Remove it."
                        : "Known here: " + listed(Nearest.first(NAMED, key, known), known) + ".");
    return new PlanProblem(
        "The key " + Quoted.text(key) + " is not known" + in(fault.pointer()) + ".", remedy, place);
  }

  /** In {@code { d: 1,5 }} the comma ends the entry, and 5 becomes a key without a value. */
  private Optional<String> splitByComma(String pointer, String key) {
    if (!key.matches("[0-9]+")
        || !(Nodes.at(written, pointer).orElse(null) instanceof Node.Mapping mapping)) {
      return Optional.empty();
    }
    String before = null;
    for (Map.Entry<String, Node.Entry> entry : mapping.entries().entrySet()) {
      if (entry.getKey().equals(key)) {
        break;
      }
      before =
          entry.getValue().value() instanceof Node.Scalar scalar
                  && scalar.kind() == Node.Scalar.Kind.NUMBER
              ? scalar.text()
              : null;
    }
    return Optional.ofNullable(before)
        .map(whole -> "A comma ends an entry here; write " + whole + "." + key + " with a point.");
  }

  /** A key that stands one section too high. */
  private Optional<String> otherSection(Fault fault, String key) {
    for (Map.Entry<String, JsonNode> section : fault.owner().path("properties").properties()) {
      Schemas.Part part = new Schemas.Part(fault.schema(), section.getValue());
      if (schemas.keys(part).contains(key)) {
        return Optional.of("It belongs under " + Quoted.text(section.getKey()) + ".");
      }
    }
    return Optional.empty();
  }

  private PlanProblem missing(String pointer, String key) {
    Place place = pointer.isEmpty() ? Place.START : Nodes.keyPlace(written, pointer);
    if (Nodes.at(written, pointer).orElse(null) instanceof Node.Mapping mapping) {
      Optional<String> slip = Nearest.to(key, mapping.entries().keySet());
      if (slip.isPresent() && pointer.matches("/analyses/[^/]+")) {
        // The closed definition is not reached, so nothing else accuses the misspelt key.
        return new PlanProblem(
            "The key " + Quoted.text(slip.get()) + " is not known" + in(pointer) + ".",
            "Did you mean " + Quoted.text(key) + "?",
            mapping.entries().get(slip.get()).keyPlace());
      }
    }
    return new PlanProblem(
        "The key " + Quoted.text(key) + " is missing" + in(pointer) + ".", "Add it.", place);
  }

  private PlanProblem other(Fault fault) {
    Place place = Nodes.valuePlace(written, fault.pointer());
    Node node = Nodes.at(resolved, fault.pointer()).orElse(resolved);
    String name = named(fault.pointer());
    if (node instanceof Node.Scalar scalar && scalar.kind() == Node.Scalar.Kind.NULL) {
      return new PlanProblem(
          "The key " + Quoted.text(Nodes.last(fault.pointer())) + " has no value.",
          splitByComma(Nodes.parent(fault.pointer()), Nodes.last(fault.pointer()))
              .orElse("Write one after it, or remove the key."),
          place);
    }
    String limit = fault.limit().isValueNode() ? fault.limit().asString() : "";
    return switch (fault.keyword()) {
      case "type" -> type(fault, node, place);
      case "pattern" -> pattern(fault, node, place);
      case "enum" -> oneOf(fault, node, place);
      case "const" ->
          new PlanProblem(name + " is " + shown(fault, node) + ".", "Write " + limit + ".", place);
      case "format" ->
          new PlanProblem(
              name + " is " + shown(fault, node) + ", which is no day of the calendar.",
              "Write year, month and day, such as 2026-05-02.",
              place);
      case "propertyNames" ->
          new PlanProblem(
              Quoted.text(fault.property()) + " cannot be a name.",
              NAME_REMEDY,
              Nodes.keyPlace(written, fault.pointer() + "/" + Nodes.escaped(fault.property())));
      case "minimum" -> bound(fault, node, place, "at least " + limit);
      case "exclusiveMinimum" -> bound(fault, node, place, "above " + limit);
      case "maximum" -> bound(fault, node, place, "at most " + limit);
      case "exclusiveMaximum" -> bound(fault, node, place, "below " + limit);
      case "minLength" -> new PlanProblem(name + " is empty.", "Fill it in, or remove it.", place);
      case "minItems", "minProperties" -> size(fault, node, place, "at least");
      case "maxItems", "maxProperties" -> size(fault, node, place, "at most");
      case "uniqueItems" ->
          new PlanProblem(name + " holds an entry twice.", "Remove one of the two.", place);
      default ->
          new PlanProblem(
              name + " breaks the schema's rule '" + fault.keyword() + "'.", form(fault), place);
    };
  }

  private PlanProblem type(Fault fault, Node node, Place place) {
    Set<String> types = new LinkedHashSet<>();
    if (fault.limit().isArray()) {
      fault.limit().forEach(type -> types.add(type.asString()));
    } else {
      types.add(fault.limit().asString());
    }
    String wanted = wanted(fault, types);
    String name = named(fault.pointer());
    if (node instanceof Node.Scalar scalar) {
      boolean number = scalar.kind() == Node.Scalar.Kind.NUMBER;
      String remedy = form(fault);
      if (scalar.kind() == Node.Scalar.Kind.TEXT
          && (types.contains("number") || types.contains("integer"))) {
        remedy = numberRemedy(scalar.text()).orElse(remedy);
      } else if (types.contains("string") && !isFigure(fault)) {
        remedy = "Put it in quotes to make it a text: \"" + Quoted.plain(scalar.text()) + "\".";
      } else if (number && types.contains("integer")) {
        remedy = "Round it to a whole number.";
      }
      return new PlanProblem(
          name + " is " + shown(fault, node) + ", but must be " + wanted + ".", remedy, place);
    }
    return new PlanProblem(
        name
            + " is "
            + (node instanceof Node.Mapping ? "a section of keys" : "a list")
            + ", but must be "
            + wanted
            + ".",
        form(fault),
        place);
  }

  private PlanProblem pattern(Fault fault, Node node, Place place) {
    String text = node instanceof Node.Scalar scalar ? scalar.text() : "";
    if (!isFigure(fault)) {
      return new PlanProblem(
          named(fault.pointer()) + " is not written as it must be: " + Quoted.text(text) + ".",
          form(fault),
          place);
    }
    return new PlanProblem(
        named(fault.pointer())
            + " must be a number or the name of a quantity; "
            + Quoted.text(text)
            + " is read as a text that is neither.",
        numberRemedy(text).orElse(NAME_REMEDY),
        place);
  }

  private static Optional<String> numberRemedy(String text) {
    if (text.matches("[-+]?\\.?(?i:nan|inf|infinity)")) {
      return Optional.of("Write a finite number.");
    }
    return WrittenNumber.meantBy(text).map(number -> "Write " + number + ".");
  }

  private PlanProblem oneOf(Fault fault, Node node, Place place) {
    List<String> words = new ArrayList<>();
    fault.limit().forEach(word -> words.add(word.asString()));
    String text = node instanceof Node.Scalar scalar ? scalar.text() : "";
    String remedy =
        Nearest.to(text, words)
            .map(near -> "Did you mean " + Quoted.text(near) + "?")
            .or(() -> yesNo(text, words))
            .orElseGet(() -> "Known: " + listed(Nearest.first(NAMED, text, words), words) + ".");
    Optional<Node> arrangement = Nodes.at(written, Nodes.parent(fault.pointer()) + "/arrangement");
    boolean misfit = fault.within().startsWith("/definitions/analysis/allOf/");
    if (misfit && arrangement.orElse(null) instanceof Node.Scalar with) {
      return new PlanProblem(
          "The test " + Quoted.text(text) + " does not go with " + Quoted.plain(with.text()) + ".",
          "Known there: " + String.join(", ", words) + ".",
          place);
    }
    return new PlanProblem(
        named(fault.pointer()) + " is " + shown(fault, node) + ", which is not one of its words.",
        remedy,
        place);
  }

  private static Optional<String> yesNo(String text, List<String> words) {
    if (!words.contains("yes")) {
      return Optional.empty();
    }
    return switch (text) {
      case "true" -> Optional.of("Write yes.");
      case "false" -> Optional.of("Write no.");
      default -> Optional.empty();
    };
  }

  private PlanProblem bound(Fault fault, Node node, Place place, String wanted) {
    String remedy = "Write a number that is " + wanted + ".";
    JsonNode most = fault.owner().path("maximum");
    JsonNode below = fault.owner().path("exclusiveMaximum");
    boolean chance = most.asInt(0) == 1 || below.asInt(0) == 1;
    if (chance && fault.keyword().endsWith("aximum") && node instanceof Node.Scalar scalar) {
      BigDecimal value = new BigDecimal(scalar.text());
      if (value.compareTo(BigDecimal.ONE) > 0 && value.compareTo(BigDecimal.valueOf(100)) <= 0) {
        remedy =
            "A percentage is written as a share: " + value.movePointLeft(2).toPlainString() + ".";
      }
    }
    return new PlanProblem(
        named(fault.pointer()) + " is " + shown(fault, node) + ", but must be " + wanted + ".",
        remedy,
        place);
  }

  private PlanProblem size(Fault fault, Node node, Place place, String relation) {
    int size =
        node instanceof Node.Mapping mapping
            ? mapping.entries().size()
            : node instanceof Node.Sequence sequence ? sequence.items().size() : 0;
    int limit = fault.limit().asInt();
    return new PlanProblem(
        named(fault.pointer())
            + " holds "
            + size
            + (size == 1 ? " entry" : " entries")
            + ", but must hold "
            + relation
            + " "
            + limit
            + ".",
        oneOfThree(fault, relation).orElseGet(() -> form(fault)),
        place);
  }

  /** A claim is marked as one of three kinds of figure, not as none and not as two. */
  private static Optional<String> oneOfThree(Fault fault, String relation) {
    if (!fault.schema().equals("parts/claim.json")) {
      return Optional.empty();
    }
    return Optional.of(
        relation.equals("at most")
            ? "Keep one of 'is', 'at-least' and 'about'."
            : "Give the figure after 'is', 'at-least' or 'about'.");
  }

  /** A value as it is written, with the quantity that it comes from. */
  private String shown(Fault fault, Node node) {
    if (!(node instanceof Node.Scalar scalar)) {
      return node instanceof Node.Mapping ? "a section of keys" : "a list";
    }
    String text =
        scalar.kind() == Node.Scalar.Kind.TEXT
            ? Quoted.text(scalar.text())
            : Quoted.plain(scalar.text());
    Node asWritten = Nodes.at(written, fault.pointer()).orElse(node);
    return asWritten instanceof Node.Scalar name
            && name.kind() == Node.Scalar.Kind.TEXT
            && scalar.kind() != Node.Scalar.Kind.TEXT
        ? text + ", the value of " + Quoted.text(name.text())
        : text;
  }

  private static boolean isFigure(Fault fault) {
    return fault.schema().equals("parts/figure.json") || fault.schema().equals("parts/claim.json");
  }

  private static String wanted(Fault fault, Set<String> types) {
    if (isFigure(fault) && types.contains("string")) {
      return (types.contains("integer") ? "a whole number" : "a number")
          + " or the name of a quantity";
    }
    return String.join(" or ", types.stream().map(FaultWording::kind).toList());
  }

  private static String kind(String type) {
    return switch (type) {
      case "number" -> "a number";
      case "integer" -> "a whole number";
      case "string" -> "a text";
      case "object" -> "a section of keys";
      case "array" -> "a list";
      case "boolean" -> "true or false";
      default -> type;
    };
  }

  /** How a value of the right form is written, from the schema's own example where it has one. */
  private static String form(Fault fault) {
    if (fault.pointer().isEmpty()) {
      return "Begin it with 'format: holdfast-plan/1', and put its sections after that.";
    }
    JsonNode examples = fault.owner().path("examples");
    if (!examples.isEmpty()) {
      return "Write it like " + Flow.text(examples.get(0)) + ".";
    }
    if (isFigure(fault)) {
      return "Write a number, or the name of a quantity.";
    }
    Set<String> keys = new LinkedHashSet<>();
    fault.owner().path("properties").properties().forEach(entry -> keys.add(entry.getKey()));
    return keys.isEmpty()
        ? "See the key's description in the schema."
        : "Give it keys such as " + String.join(", ", keys.stream().limit(NAMED).toList()) + ".";
  }

  private String named(String pointer) {
    if (pointer.isEmpty()) {
      return "The plan";
    }
    String last = Nodes.last(pointer);
    boolean listed = Nodes.at(written, Nodes.parent(pointer)).orElse(null) instanceof Node.Sequence;
    return listed
        ? "Entry " + (Integer.parseInt(last) + 1) + in(Nodes.parent(pointer))
        : "The value of " + Quoted.text(last);
  }

  private static String in(String pointer) {
    if (pointer.isEmpty()) {
      return "";
    }
    StringBuilder dotted = new StringBuilder();
    for (String part : pointer.substring(1).split("/", -1)) {
      dotted.append(dotted.length() == 0 ? "" : ".").append(Nodes.unescaped(part));
    }
    return " in " + Quoted.text(dotted.toString());
  }
}
