package dev.holdfast.plan;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import tools.jackson.core.JacksonException;
import tools.jackson.core.JsonToken;
import tools.jackson.core.ObjectReadContext;
import tools.jackson.core.TokenStreamLocation;
import tools.jackson.dataformat.yaml.YAMLFactory;
import tools.jackson.dataformat.yaml.YAMLParser;

/**
 * Reads the bytes of one file into {@linkplain Node nodes}, from the tokens of the YAML parser and
 * not from its tree: the tree has no places of keys, loses the written form of numbers, takes an
 * alias for a text and the last of two equal keys for the only one.
 */
final class TreeReader {
  /** Largest file read, in bytes; a longer one could keep the parser busy for minutes. */
  static final int LARGEST_FILE = 256 * 1024;

  /** Deepest nesting read. */
  static final int DEEPEST = 64;

  private final YAMLFactory yaml = YAMLFactory.builder().build();

  /**
   * What came of reading: a tree, or problems.
   *
   * @param root the value of the document; empty when there is a problem
   * @param problems why there is none
   */
  record Tree(Optional<Node> root, List<PlanProblem> problems) {}

  /** Reads a file; throws nothing, whatever the bytes. */
  Tree read(byte[] bytes) {
    try {
      if (bytes.length > LARGEST_FILE) {
        throw new Malformed(
            "The file is larger than " + LARGEST_FILE + " bytes; no plan is.",
            "Keep data in files of their own, and name them in a quantity's source.",
            Place.START);
      }
      return new Document(SourceText.of(bytes)).read();
    } catch (Malformed malformed) {
      return new Tree(Optional.empty(), List.of(malformed.problem()));
    }
  }

  /** One reading of one text. */
  private final class Document {
    private final SourceText source;
    private final List<PlanProblem> problems = new ArrayList<>();
    private YAMLParser parser;

    Document(SourceText source) {
      this.source = source;
    }

    Tree read() throws Malformed {
      try (YAMLParser open =
          (YAMLParser)
              yaml.createParser(
                  ObjectReadContext.empty(), new WholeCharacterReader(source.text()))) {
        parser = open;
        Node root = document();
        problems.sort((one, other) -> one.place().compareTo(other.place()));
        return new Tree(
            problems.isEmpty() ? Optional.of(root) : Optional.empty(), List.copyOf(problems));
      } catch (JacksonException refusal) {
        throw new Malformed(YamlWording.of(refusal));
      }
    }

    private Node document() throws Malformed {
      JsonToken first = parser.nextToken();
      if (first == null) {
        throw new Malformed(
            "The file is empty.", "Begin it with 'format: holdfast-plan/1'.", Place.START);
      }
      Node root = value(first, "", 1);
      if (parser.nextToken() != null) {
        throw new Malformed(
            "A second document begins here; a plan file holds one.",
            "Move it into a file of its own and remove the line '---' before it.",
            here(""));
      }
      return root;
    }

    private Place here(String pointer) {
      TokenStreamLocation location = parser.currentTokenLocation();
      return new Place(location.getLineNr(), location.getColumnNr(), pointer);
    }

    private Node value(JsonToken token, String pointer, int depth) throws Malformed {
      Place place = here(pointer);
      if (depth > DEEPEST) {
        throw new Malformed(
            "The file is nested more than " + DEEPEST + " deep.",
            "No part of a plan is; look for brackets that are not closed.",
            new Place(place.line(), place.column(), ""));
      }
      refuseDecoration(place);
      return switch (token) {
        case START_OBJECT -> mapping(place, depth);
        case START_ARRAY -> sequence(place, depth);
        case VALUE_NULL -> new Node.Scalar(Node.Scalar.Kind.NULL, parser.getString(), place);
        case VALUE_TRUE -> new Node.Scalar(Node.Scalar.Kind.BOOLEAN, "true", place);
        case VALUE_FALSE -> new Node.Scalar(Node.Scalar.Kind.BOOLEAN, "false", place);
        case VALUE_NUMBER_INT, VALUE_NUMBER_FLOAT -> number(parser.getString(), place);
        default -> new Node.Scalar(Node.Scalar.Kind.TEXT, parser.getString(), place);
      };
    }

    private Node mapping(Place place, int depth) throws Malformed {
      Map<String, Node.Entry> entries = new LinkedHashMap<>();
      while (parser.nextToken() != JsonToken.END_OBJECT) {
        String key = parser.currentName();
        String pointer = place.pointer() + "/" + key.replace("~", "~0").replace("/", "~1");
        Place keyPlace = here(pointer);
        if (key.equals("<<")) {
          refuseMerge(keyPlace, pointer, depth);
          continue;
        }
        refuseDecoration(keyPlace);
        Node value = value(parser.nextToken(), pointer, depth + 1);
        Node.Entry earlier = entries.putIfAbsent(key, new Node.Entry(keyPlace, value));
        if (earlier != null) {
          problems.add(
              new PlanProblem(
                  "The key "
                      + Quoted.text(key)
                      + " stands here a second time; it was given in line "
                      + earlier.keyPlace().line()
                      + ".",
                  "Keep one of the two.",
                  keyPlace));
        }
      }
      return new Node.Mapping(entries, place);
    }

    private void refuseMerge(Place keyPlace, String pointer, int depth) throws Malformed {
      problems.add(
          new PlanProblem(
              "The merge key '<<' is not part of a plan.",
              "Write the keys out; a number used twice belongs under quantities.",
              keyPlace));
      int told = problems.size();
      value(parser.nextToken(), pointer, depth + 1);
      // What is merged would be refused a second time, as an alias.
      problems.subList(told, problems.size()).clear();
    }

    private Node sequence(Place place, int depth) throws Malformed {
      List<Node> items = new ArrayList<>();
      JsonToken token;
      while ((token = parser.nextToken()) != JsonToken.END_ARRAY) {
        items.add(value(token, place.pointer() + "/" + items.size(), depth + 1));
      }
      return new Node.Sequence(items, place);
    }

    /**
     * Refuses what YAML may hang on a value. The parser tells of an alias, but not dependably of
     * anchors and tags, so the character is looked at: no plain value can begin with these.
     */
    private void refuseDecoration(Place place) {
      switch (source.at(place)) {
        case '*' ->
            refuseOnce(
                "An alias stands here; a plan does not repeat values by alias.",
                "Put the number under quantities and write its name here.",
                place);
        case '&' ->
            refuseOnce(
                "An anchor stands here; a plan does not name values by anchor.",
                "Put the number under quantities; its name does that work.",
                place);
        case '!' ->
            refuseOnce(
                "A tag stands here; the schema alone says what a value is.",
                "Remove the tag.",
                place);
        default -> {
          // Nothing hangs on this value.
        }
      }
    }

    /** A section and its first key begin at the same place. */
    private void refuseOnce(String message, String remedy, Place place) {
      boolean told =
          problems.stream()
              .map(PlanProblem::place)
              .anyMatch(p -> p.line() == place.line() && p.column() == place.column());
      if (!told) {
        problems.add(new PlanProblem(message, remedy, place));
      }
    }

    private Node number(String written, Place place) {
      boolean usable = WrittenNumber.isUsable(written);
      if (!usable) {
        problems.add(
            new PlanProblem(
                "The number " + Quoted.plain(written) + " is not one that can be computed with.",
                "Write a finite number.",
                place));
      }
      return new Node.Scalar(Node.Scalar.Kind.NUMBER, usable ? written : "0", place);
    }
  }
}
