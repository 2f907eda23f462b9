package dev.holdfast.cli;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.OutputStream;
import java.io.PrintStream;
import java.nio.charset.StandardCharsets;
import java.util.Map;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

class MainTest {
  private final Terminal terminal = new Terminal();

  @Test
  void helpGoesToTheOutputWithExamplesAndStatuses() {
    Ran ran = terminal.run("--help");
    assertEquals(0, ran.status());
    assertEquals("", ran.err());
    assertTrue(ran.out().contains("holdfast start parallel-groups/student-t"), ran.out());
    assertTrue(ran.out().contains("  1   something blocks, an invalid plan included"), ran.out());
  }

  @ParameterizedTest
  @ValueSource(strings = {"check", "explain", "start", "catalogue", "findings", "schema"})
  void everyCommandExplainsItself(String command) {
    Ran ran = terminal.run(command, "--help");
    assertEquals(0, ran.status());
    for (String part : new String[] {"Usage: holdfast " + command, "Examples:", "Exit status:"}) {
      assertTrue(ran.out().contains(part), ran.out());
    }
    assertTrue(ran.out().lines().allMatch(line -> line.length() <= 96), ran.out());
    assertTrue(terminal.run("--help").out().contains("\n  " + command + " "));
  }

  @Test
  void withoutACommandTheHelpGoesToTheRemarks() {
    Ran ran = terminal.run();
    assertEquals(2, ran.status());
    assertEquals("", ran.out());
    assertTrue(ran.err().contains("Usage: holdfast"));
  }

  @Test
  void theVersionIsOneLine() {
    Ran ran = terminal.run("--version");
    assertEquals(0, ran.status());
    assertTrue(ran.out().matches("holdfast .*, Java \\d.*\n"), ran.out());
  }

  @ParameterizedTest
  @CsvSource({
    "'chek', there is no command 'chek'; did you mean 'check'?",
    "'frobnicate', there is no command 'frobnicate'",
    "'check --ouput=json', there is no option '--ouput=json'; did you mean '--output'?",
    "'check --output jsn', there is no output of kind 'jsn'; did you mean 'json'?",
    "'check --output', missing: KIND[=FILE] for --output",
    "'check --output json=', the output json= names no file",
    "'check --output text --output json', two outputs would mix; give one of them a file",
    "'check --threads 0', --threads is 0; it can be from 1 to 256",
    "'check --threads x', Invalid value for option '--threads'",
    "'check --colour red', --colour is 'red'; it can be always",
    "'check --quiet --verbose', --verbose and --quiet contradict each other",
    "'check --staged plans', --staged takes neither paths nor --since",
    "'explain', missing: PLAN",
    "'findings power-drft', there is no finding 'power-drft'; did you mean 'power-drift'?",
    "'findings a b', 'b' is one argument too many",
    "'catalogue parallel-groups/student', there is no cell 'parallel-groups/student'; did you mean",
    "'catalogue matched-pairs', there is no cell 'matched-pairs'; there are matched-pairs/",
    "'schema nothing', there is no schema 'nothing'; there are plan",
    "'start nowhere/t', there is no cell 'nowhere/t'; see 'holdfast catalogue'",
  })
  void wrongArgumentsAreOneSentenceWithARemedyAndStatusTwo(String arguments, String sentence) {
    Ran ran = terminal.run(arguments.split(" "));
    assertEquals(2, ran.status());
    assertEquals("", ran.out());
    assertTrue(ran.err().startsWith("holdfast: " + sentence), ran.err());
    assertTrue(ran.err().lines().count() <= 2, ran.err());
  }

  @Test
  void aNameThatIsNoPathIsSaidToBeNone() {
    Ran ran = terminal.run("check", "a\0b");
    assertEquals(2, ran.status());
    assertEquals("holdfast: 'a\\u0000b' is no path\n", ran.err());
  }

  @Test
  void aFaultIsOneLineAndItsTraceIsShownOnRequestOnly() {
    Ran plain = fault(Map.of());
    assertEquals(3, plain.status());
    assertEquals(1, plain.err().lines().count(), plain.err());
    assertTrue(plain.err().startsWith("holdfast: a fault of the program (IllegalStateException"));
    assertFalse(plain.err().contains("\tat "));
    Ran traced = fault(Map.of("HOLDFAST_TRACE", "1"));
    assertEquals(3, traced.status());
    assertTrue(traced.err().contains("at dev.holdfast.cli.MainTest"), traced.err());
  }

  private static Ran fault(Map<String, String> environment) {
    ByteArrayOutputStream err = new ByteArrayOutputStream();
    PrintStream broken =
        new PrintStream(OutputStream.nullOutputStream()) {
          @Override
          public void write(byte[] bytes, int from, int length) {
            throw new IllegalStateException("a fault");
          }
        };
    int status =
        Main.run(new Console(broken, new PrintStream(err), environment, false), "--version");
    return new Ran(status, "", err.toString(StandardCharsets.UTF_8));
  }

  @Test
  void anOutputThatNobodyTakesIsNoSuccess() {
    PrintStream full =
        new PrintStream(
            new OutputStream() {
              @Override
              public void write(int b) throws IOException {
                throw new IOException("no space left");
              }
            });
    ByteArrayOutputStream err = new ByteArrayOutputStream();
    int status = Main.run(new Console(full, new PrintStream(err), Map.of(), false), "--version");
    assertEquals(2, status);
    assertEquals("holdfast: the output could not be written\n", err.toString());
  }
}
