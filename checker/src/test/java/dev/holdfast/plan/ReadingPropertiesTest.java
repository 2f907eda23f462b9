package dev.holdfast.plan;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Random;
import net.jqwik.api.Arbitraries;
import net.jqwik.api.Arbitrary;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.Provide;
import net.jqwik.api.constraints.IntRange;
import net.jqwik.api.constraints.Size;

class ReadingPropertiesTest {
  private final TreeReader trees = new TreeReader();

  /** A document is written out with notes of where everything was put, and read back. */
  @Property(tries = 400)
  void everyKeyAndValueIsFoundWhereItWasWritten(@ForAll long seed) {
    Written written = new Written(new Random(seed));
    written.mapping("", 0, 0);
    TreeReader.Tree tree = trees.read(written.out.toString().getBytes(StandardCharsets.UTF_8));
    assertEquals(List.of(), tree.problems(), written.out::toString);
    Node root = tree.root().orElseThrow();
    written.keys.forEach(
        (pointer, place) ->
            assertEquals(place, Nodes.keyPlace(root, pointer), written.out::toString));
    written.values.forEach(
        (pointer, place) ->
            assertEquals(place, Nodes.valuePlace(root, pointer), written.out::toString));
    written.texts.forEach(
        (pointer, text) ->
            assertEquals(
                text,
                ((Node.Scalar) Nodes.at(root, pointer).orElseThrow()).text(),
                written.out::toString));
  }

  @Property(tries = 1500)
  void damagedPlansAreReadOrToldButNeverThrow(
      @ForAll @IntRange(min = 0, max = 3) int plan,
      @ForAll @Size(min = 1, max = 6) List<@IntRange(min = 0, max = 9999) Integer> places,
      @ForAll long seed) {
    Random random = new Random(seed);
    byte[] bytes = Plans.text(Plans.NAMES.get(plan)).getBytes(StandardCharsets.UTF_8);
    for (int place : places) {
      bytes = damaged(bytes, place % bytes.length, random);
    }
    assertSound(Plans.read(bytes));
  }

  @Property(tries = 500)
  void anyBytesAreReadOrToldButNeverThrow(@ForAll @Size(max = 200) byte[] bytes) {
    assertSound(Plans.read(bytes));
  }

  @Property(tries = 1000)
  void anyTextFromTheMarksOfYamlIsReadOrToldButNeverThrows(@ForAll("marks") String text) {
    assertSound(Plans.read(text));
  }

  @Provide
  Arbitrary<String> marks() {
    return Arbitraries.strings()
        .withChars("{}[],:-?&*!|>'\"%@`#~<= \n\r\tab019.eé\uFEFF\u2028\u0085")
        .ofMaxLength(60);
  }

  private static void assertSound(PlanReading reading) {
    assertTrue(reading.plan().isPresent() == reading.problems().isEmpty());
    Place before = Place.START;
    for (PlanProblem problem : reading.problems()) {
      assertFalse(problem.message().isBlank());
      assertFalse(problem.remedy().isBlank(), problem::toString);
      assertTrue(problem.place().line() >= 1 && problem.place().column() >= 1, problem::toString);
      assertTrue(before.compareTo(problem.place()) <= 0, () -> reading.problems().toString());
      before = problem.place();
    }
  }

  private static byte[] damaged(byte[] bytes, int at, Random random) {
    String marks = "{}[],:-?&*!|>'\"%@`# \n\t.0e9~";
    byte mark = (byte) marks.charAt(random.nextInt(marks.length()));
    byte[] result;
    switch (random.nextInt(5)) {
      case 0 -> {
        result = bytes.clone();
        result[at] = mark;
      }
      case 1 -> {
        result = bytes.clone();
        result[at] = (byte) random.nextInt(256);
      }
      case 2 -> {
        result = new byte[bytes.length + 1];
        System.arraycopy(bytes, 0, result, 0, at);
        result[at] = mark;
        System.arraycopy(bytes, at, result, at + 1, bytes.length - at);
      }
      case 3 -> result = java.util.Arrays.copyOf(bytes, at + 1);
      default -> {
        int end = Math.min(bytes.length, at + 1 + random.nextInt(12));
        result = new byte[bytes.length - (end - at) + 1];
        System.arraycopy(bytes, 0, result, 0, at);
        System.arraycopy(bytes, end, result, at, bytes.length - end);
        result[result.length - 1] = '\n';
      }
    }
    return result;
  }

  /** Writes a document of random shape and notes the place of all it writes. */
  private static final class Written {
    private static final List<String> SCALARS =
        List.of(
            "0.90",
            "-12",
            "1e3",
            "true",
            "null",
            "\uD83D\uDE00",
            "é text",
            "'a: \uD83D\uDE00b'",
            "\"\\u00e9\\n\"",
            ".5");
    private static final Map<String, String> READ =
        Map.of("'a: \uD83D\uDE00b'", "a: \uD83D\uDE00b", "\"\\u00e9\\n\"", "é\n");

    private final StringBuilder out = new StringBuilder();
    private final Map<String, Place> keys = new LinkedHashMap<>();
    private final Map<String, Place> values = new LinkedHashMap<>();
    private final Map<String, String> texts = new LinkedHashMap<>();
    private final Random random;
    private final String lineEnd;
    private int line = 1;
    private int column = 1;

    Written(Random random) {
      this.random = random;
      lineEnd = List.of("\n", "\r\n", "\r").get(random.nextInt(3));
    }

    private void put(String text) {
      out.append(text);
      column += text.codePointCount(0, text.length());
    }

    private void endLine() {
      if (random.nextInt(4) == 0) {
        put(" # \uD83D\uDE00: [*x");
      }
      out.append(lineEnd);
      line++;
      column = 1;
    }

    /** Keys in block style; the first must be put where the writer stands. */
    void mapping(String pointer, int indent, int depth) {
      values.put(pointer, new Place(line, column, pointer));
      int count = 1 + random.nextInt(4);
      for (int i = 0; i < count; i++) {
        if (i > 0) {
          if (random.nextInt(5) == 0) {
            endLine();
          }
          put(" ".repeat(indent));
        }
        String key = key(i);
        String child = pointer + "/" + Nodes.escaped(key);
        keys.put(child, new Place(line, column, child));
        put(key + ":" + " ".repeat(1 + random.nextInt(2)));
        value(child, indent, depth);
      }
    }

    private String key(int i) {
      return List.of("k", "\uD83D\uDE00", "é/", "~").get(random.nextInt(4)) + i;
    }

    private void value(String pointer, int indent, int depth) {
      switch (depth > 3 ? 0 : random.nextInt(4)) {
        case 1 -> {
          endLine();
          put(" ".repeat(indent + 2));
          mapping(pointer, indent + 2, depth + 1);
        }
        case 2 -> {
          endLine();
          sequence(pointer, indent + 2, depth + 1);
        }
        case 3 -> {
          flow(pointer, depth + 1);
          endLine();
        }
        default -> {
          scalar(pointer);
          endLine();
        }
      }
    }

    private void sequence(String pointer, int indent, int depth) {
      int count = 1 + random.nextInt(3);
      for (int i = 0; i < count; i++) {
        put(" ".repeat(indent));
        if (i == 0) {
          values.put(pointer, new Place(line, column, pointer));
        }
        put("- ");
        String child = pointer + "/" + i;
        if (random.nextBoolean()) {
          mapping(child, indent + 2, depth + 1);
        } else {
          flow(child, depth + 1);
          endLine();
        }
      }
    }

    private void flow(String pointer, int depth) {
      int kind = depth > 4 ? 0 : random.nextInt(3);
      if (kind == 0) {
        scalar(pointer);
        return;
      }
      values.put(pointer, new Place(line, column, pointer));
      put(kind == 1 ? "[" : "{ ");
      int count = random.nextInt(3);
      List<String> children = new ArrayList<>();
      for (int i = 0; i < count; i++) {
        put(i > 0 ? ", " : "");
        String key = kind == 1 ? Integer.toString(i) : key(i);
        String child = pointer + "/" + Nodes.escaped(key);
        children.add(child);
        if (kind == 2) {
          keys.put(child, new Place(line, column, child));
          put(key + ": ");
        }
        flow(child, depth + 1);
      }
      put(kind == 1 ? "]" : " }");
    }

    private void scalar(String pointer) {
      String text = SCALARS.get(random.nextInt(SCALARS.size()));
      values.put(pointer, new Place(line, column, pointer));
      texts.put(pointer, READ.getOrDefault(text, text));
      put(text);
    }
  }
}
