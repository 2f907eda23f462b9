package dev.holdfast.cli;

import dev.holdfast.report.Safe;
import java.io.PrintStream;
import java.nio.charset.StandardCharsets;
import java.util.Map;

/**
 * Where a command writes: results to the one stream, remarks to the other, both as UTF-8 with line
 * feeds on every system.
 */
public final class Console {
  private final PrintStream results;
  private final PrintStream remarks;
  private final Map<String, String> environment;
  private final boolean terminal;

  /**
   * A console.
   *
   * @param results takes results
   * @param remarks takes remarks and complaints
   * @param environment the environment
   * @param terminal whether results go to a terminal
   */
  public Console(
      PrintStream results, PrintStream remarks, Map<String, String> environment, boolean terminal) {
    this.results = new PrintStream(results, false, StandardCharsets.UTF_8);
    this.remarks = new PrintStream(remarks, true, StandardCharsets.UTF_8);
    this.environment = Map.copyOf(environment);
    this.terminal = terminal;
  }

  /**
   * Writes results as they are.
   *
   * @throws UnusableException if nobody takes them, as on a full disk
   */
  void print(String text) {
    results.print(text);
    if (results.checkError()) {
      throw new UnusableException("the output could not be written");
    }
  }

  /** Writes a remark on a line of its own. */
  void remark(String sentence) {
    remarks.print("holdfast: " + Safe.line(sentence) + "\n");
    remarks.flush();
  }

  /** Writes help that was asked for in vain. */
  void advise(String text) {
    remarks.print(text);
    remarks.flush();
  }

  Map<String, String> environment() {
    return environment;
  }

  boolean isTerminal() {
    return terminal;
  }
}
