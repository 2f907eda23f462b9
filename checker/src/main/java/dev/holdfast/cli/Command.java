package dev.holdfast.cli;

import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.ParseResult;

/** One command of the program. */
interface Command {
  /** Its name. */
  String name();

  /** Its options and parameters, with their help. */
  CommandSpec spec();

  /**
   * Runs it.
   *
   * @param parsed options and parameters as given
   * @param console where it writes
   * @return the exit status
   * @throws UnusableException if it cannot do what it was asked
   */
  int run(ParseResult parsed, Console console);
}
