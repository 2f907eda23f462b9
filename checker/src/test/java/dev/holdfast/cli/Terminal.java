package dev.holdfast.cli;

import java.io.ByteArrayOutputStream;
import java.io.PrintStream;
import java.nio.charset.StandardCharsets;
import java.util.Map;

/** Runs commands within the test and keeps what they print. */
final class Terminal {
  private final Map<String, String> environment;
  private final boolean interactive;

  Terminal() {
    this(Map.of(), false);
  }

  Terminal(Map<String, String> environment, boolean interactive) {
    this.environment = environment;
    this.interactive = interactive;
  }

  Ran run(String... arguments) {
    ByteArrayOutputStream out = new ByteArrayOutputStream();
    ByteArrayOutputStream err = new ByteArrayOutputStream();
    Console console =
        new Console(new PrintStream(out), new PrintStream(err), environment, interactive);
    int status = Main.run(console, arguments);
    return new Ran(
        status, out.toString(StandardCharsets.UTF_8), err.toString(StandardCharsets.UTF_8));
  }
}
