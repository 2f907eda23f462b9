package dev.holdfast.plan;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.charset.StandardCharsets;
import java.util.List;
import java.util.Optional;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.MethodSource;
import org.junit.jupiter.params.provider.ValueSource;

class TreeReaderTest {
  private final TreeReader reader = new TreeReader();

  @Test
  void keysAndValuesHaveTheirPlacesInCodePoints() {
    Node root = read("a: 1\n\uD83D\uDE00b: {\uD83D\uDE00: x, c: [1, y]}\n");
    assertEquals(new Place(2, 1, "/\uD83D\uDE00b"), Nodes.keyPlace(root, "/\uD83D\uDE00b"));
    assertEquals(new Place(2, 5, "/\uD83D\uDE00b"), Nodes.valuePlace(root, "/\uD83D\uDE00b"));
    assertEquals(new Place(2, 12, "/\uD83D\uDE00b/c"), Nodes.keyPlace(root, "/\uD83D\uDE00b/c"));
    assertEquals(
        new Place(2, 19, "/\uD83D\uDE00b/c/1"), Nodes.valuePlace(root, "/\uD83D\uDE00b/c/1"));
  }

  @ParameterizedTest
  @ValueSource(strings = {"a: 1\nb: 2\n", "a: 1\r\nb: 2\r\n", "a: 1\rb: 2\r", "\uFEFFa: 1\nb: 2"})
  void placesAreTheSameWithAnyLineEndAndAByteOrderMark(String text) {
    Node root = read(text);
    assertEquals(new Place(1, 1, "/a"), Nodes.keyPlace(root, "/a"));
    assertEquals(new Place(2, 1, "/b"), Nodes.keyPlace(root, "/b"));
    assertEquals(new Place(2, 4, "/b"), Nodes.valuePlace(root, "/b"));
  }

  @Test
  void pointersEscapeSlashAndTilde() {
    Node root = read("a/b: { c~d: 1 }\n");
    assertEquals("/a~1b/c~0d", Nodes.keyPlace(root, "/a~1b/c~0d").pointer());
    assertEquals("1", scalar(root, "/a~1b/c~0d").text());
  }

  @ParameterizedTest
  @CsvSource({
    "0.90,NUMBER",
    "0.9,NUMBER",
    "-0,NUMBER",
    "12,NUMBER",
    "1e3,NUMBER",
    "1.5E-3,NUMBER",
    "1.,NUMBER",
    "-2.50,NUMBER",
    "true,BOOLEAN",
    "false,BOOLEAN",
    "null,NULL",
    "no,TEXT",
    "yes,TEXT",
    "on,TEXT",
    "True,TEXT",
    "TRUE,TEXT",
    "Null,TEXT",
    "~,TEXT",
    ".5,TEXT",
    "+3,TEXT",
    "010,TEXT",
    "0x1F,TEXT",
    "0o17,TEXT",
    "1_000,TEXT",
    "1:30,TEXT",
    "2026-03-01,TEXT",
    "5%,TEXT",
    "1e,TEXT",
    ".NaN,TEXT"
  })
  void aScalarIsWhatTheJsonSchemaOfYamlMakesOfIt(String written, Node.Scalar.Kind kind) {
    Node.Scalar scalar = scalar(read("a: " + written + "\n"), "/a");
    assertEquals(kind, scalar.kind());
    assertEquals(written, scalar.text());
  }

  @Test
  void quotedNumbersAreTexts() {
    Node root = read("a: '0.5'\nb: \"0.5\"\nc: 'null'\n");
    for (String pointer : List.of("/a", "/b", "/c")) {
      assertEquals(Node.Scalar.Kind.TEXT, scalar(root, pointer).kind());
    }
  }

  @Test
  void theWrittenFormSurvivesANumberThatIsNone() {
    // In the parser's own tree, every float after an infinity loses its zeros.
    List<PlanProblem> problems = problems("a: .inf\nb: 0.80\n");
    assertEquals(1, problems.size());
    assertEquals("0.80", scalar(read("a: 1.5\nb: 0.80\n"), "/b").text());
  }

  static Stream<Arguments> refusals() {
    return Stream.of(
        Arguments.of("", 1, 1, "empty"),
        Arguments.of("# only a remark\n", 1, 1, "empty"),
        Arguments.of("a: 1\n---\nb: 2\n", 3, 1, "second document"),
        Arguments.of("a: 1\n---\n", 3, 1, "second document"),
        Arguments.of("a: 1\nb: 2\na: 3\n", 3, 1, "'a' stands here a second time"),
        Arguments.of("a: { b: 1, b: 2 }\n", 1, 12, "'b' stands here a second time"),
        Arguments.of("a: &v 1\n", 1, 4, "anchor"),
        Arguments.of("a: &v\n  b: 1\n", 1, 4, "anchor"),
        Arguments.of("&k a: 1\n", 1, 1, "anchor"),
        Arguments.of("a: *v\n", 1, 4, "alias"),
        Arguments.of("a: [1, *v]\n", 1, 8, "alias"),
        Arguments.of("<<: *v\na: 1\n", 1, 1, "merge key"),
        Arguments.of("<<: { b: 1 }\n", 1, 1, "merge key"),
        Arguments.of("a: !!str 5\n", 1, 4, "tag"),
        Arguments.of("a: !thing { b: 1 }\n", 1, 4, "tag"),
        Arguments.of("!t a: 1\n", 1, 1, "tag"),
        Arguments.of("a: .inf\n", 1, 4, ".inf"),
        Arguments.of("a: -.inf\n", 1, 4, "-.inf"),
        Arguments.of("a: 1e999999999\n", 1, 4, "1e999999999"),
        Arguments.of("a: 0e999999999\n", 1, 4, "0e999999999"),
        Arguments.of("a: 1e-999999999\n", 1, 4, "1e-999999999"),
        Arguments.of("a: 1e309\n", 1, 4, "1e309"),
        Arguments.of("a: 1e-330\n", 1, 4, "1e-330"),
        Arguments.of("a: " + "9".repeat(2000) + "\n", 1, 4, "999…"),
        Arguments.of("a: " + "[".repeat(70), 1, 67, "nested"),
        Arguments.of("[".repeat(100_000), 1, 65, "nested"),
        Arguments.of("a:\n\t- b\n", 2, 1, "tab"),
        Arguments.of("a: b: c\n", 1, 5, "': '"),
        Arguments.of("a: 'x\nb: 1\n", 1, 4, "never closed"),
        Arguments.of("a: [1, 2\nb: 3\n", 1, 4, "list that opens here"),
        Arguments.of("a: { b: 1\nc: 3\n", 1, 4, "section that opens here"),
        Arguments.of("a: 1\nb\nc: 2\n", 2, 1, "without ': '"),
        Arguments.of("a:\n  b: 1\n c: 2\n", 3, 2, "indentation"),
        Arguments.of("a: @x\n", 1, 4, "cannot begin a value"),
        Arguments.of("a: \"x\\qy\"\n", 1, 7, "backslash"),
        Arguments.of("? [a]\n: b\n", 1, 4, "key must be a plain word"),
        Arguments.of("%YAML 2.0\n---\na: 1\n", 1, 1, "version of YAML"),
        Arguments.of("a: b\nc: d\u0007\n", 2, 5, "U+0007"),
        Arguments.of("a: b\u0000\n", 1, 5, "U+0000"));
  }

  @ParameterizedTest
  @MethodSource("refusals")
  void whatYamlReadersUnderstandDifferentlyIsOneProblemAtItsPlace(
      String text, int line, int column, String words) {
    List<PlanProblem> problems = problems(text);
    assertEquals(1, problems.size(), problems::toString);
    PlanProblem problem = problems.get(0);
    assertTrue(problem.message().contains(words), problem.message());
    assertEquals(line + ":" + column, problem.place().line() + ":" + problem.place().column());
    assertTrue(problem.remedy().endsWith(".") || problem.remedy().endsWith("'."));
  }

  @Test
  void aDocumentMayEndWithItsMark() {
    assertEquals("1", scalar(read("---\na: 1\n...\n"), "/a").text());
  }

  @Test
  void bytesThatAreNotUtf8AreToldByByteAndPlace() {
    byte[] bytes = "a: é\nb: é\n".getBytes(StandardCharsets.ISO_8859_1);
    PlanProblem problem = reader.read(bytes).problems().get(0);
    assertEquals("Byte 4 of the file is not UTF-8.", problem.message());
    assertEquals(new Place(1, 4, ""), problem.place());
    byte[] cut = {'a', ':', '\n', ' ', (byte) 0xF0, (byte) 0x9F};
    assertEquals(new Place(2, 2, ""), reader.read(cut).problems().get(0).place());
  }

  @ParameterizedTest
  @ValueSource(strings = {"\n", "\r\n", "\r"})
  void placesOutsideTheParserCountLinesAsTheParserDoes(String lineEnd) {
    String start = "a: 1" + lineEnd + lineEnd + "\uD83D\uDE00: ";
    assertEquals(new Place(3, 4, ""), problems(start + "\u0007").get(0).place());
    PlanProblem alias = problems(start + "*x").get(0);
    assertTrue(alias.message().contains("alias"), alias.message());
    assertEquals(new Place(3, 4, "/\uD83D\uDE00"), alias.place());
    byte[] cut = (start + "\uD83D\uDE00").getBytes(StandardCharsets.UTF_8);
    byte[] malformed = java.util.Arrays.copyOf(cut, cut.length - 1);
    assertEquals(new Place(3, 4, ""), reader.read(malformed).problems().get(0).place());
  }

  @Test
  void utf16IsNamed() {
    PlanProblem problem = reader.read("a: 1".getBytes(StandardCharsets.UTF_16)).problems().get(0);
    assertEquals("The file is written in UTF-16.", problem.message());
  }

  @Test
  void theLargestFileIsReadAndOneByteMoreIsNot() {
    String fill = "#".repeat(TreeReader.LARGEST_FILE - 5);
    assertTrue(reader.read(("a: 1\n" + fill).getBytes(StandardCharsets.UTF_8)).root().isPresent());
    List<PlanProblem> problems = problems("a: 1\n" + fill + "#");
    assertEquals(1, problems.size());
    assertTrue(problems.get(0).message().contains("262144"), problems.get(0).message());
  }

  @Test
  void theDeepestNestingIsReadAndOneLevelMoreIsNot() {
    String brackets = "[".repeat(TreeReader.DEEPEST - 1) + "1" + "]".repeat(TreeReader.DEEPEST - 1);
    assertEquals(List.of(), problems(brackets));
    assertEquals(1, problems("[" + brackets + "]").size());
  }

  @Test
  void everyDuplicateAndAliasOfAFileIsTold() {
    List<PlanProblem> problems = problems("a: 1\na: 2\nb: *x\nc: { d: &y 1 }\n");
    assertEquals(List.of(2, 3, 4), problems.stream().map(p -> p.place().line()).toList());
  }

  private List<PlanProblem> problems(String text) {
    return reader.read(text.getBytes(StandardCharsets.UTF_8)).problems();
  }

  private Node read(String text) {
    TreeReader.Tree tree = reader.read(text.getBytes(StandardCharsets.UTF_8));
    assertEquals(List.of(), tree.problems());
    return tree.root().orElseThrow();
  }

  private static Node.Scalar scalar(Node root, String pointer) {
    Optional<Node> node = Nodes.at(root, pointer);
    return (Node.Scalar) node.orElseThrow();
  }
}
