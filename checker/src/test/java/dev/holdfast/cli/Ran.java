package dev.holdfast.cli;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Map;
import java.util.concurrent.TimeUnit;

/** What a process came to that a test ran. */
record Ran(int status, String out, String err) {
  /** A process on its way. */
  record Running(Process process, Path out, Path err) {
    Ran end() throws IOException, InterruptedException {
      if (!process.waitFor(120, TimeUnit.SECONDS)) {
        process.destroyForcibly();
        throw new AssertionError("still running after two minutes");
      }
      return new Ran(process.exitValue(), Files.readString(out), Files.readString(err));
    }
  }

  /** Starts a process with an environment of its own. */
  static Running start(Path folder, Map<String, String> environment, List<String> command)
      throws IOException {
    Path out = Files.createTempFile("ran", ".out");
    Path err = Files.createTempFile("ran", ".err");
    out.toFile().deleteOnExit();
    err.toFile().deleteOnExit();
    ProcessBuilder builder =
        new ProcessBuilder(command)
            .directory(folder.toFile())
            .redirectOutput(out.toFile())
            .redirectError(err.toFile());
    builder.environment().clear();
    builder.environment().putAll(environment);
    Process process = builder.start();
    process.getOutputStream().close();
    return new Running(process, out, err);
  }

  /** Runs a process to its end. */
  static Ran run(Path folder, Map<String, String> environment, String... command)
      throws IOException, InterruptedException {
    return start(folder, environment, List.of(command)).end();
  }

  /** Writes a script that runs holdfast as it was compiled for the tests. */
  static Path program(Path file) throws IOException {
    String classes =
        System.getProperty("surefire.test.class.path", System.getProperty("java.class.path"));
    Path java = Path.of(System.getProperty("java.home"), "bin", "java");
    return script(
        file,
        "#!/bin/sh\nexec '%s' -XX:TieredStopAtLevel=1 -cp '%s' dev.holdfast.cli.Main \"$@\"\n"
            .formatted(java, classes));
  }

  /** Writes an executable script. */
  static Path script(Path file, String text) throws IOException {
    Files.createDirectories(file.getParent());
    Files.write(file, text.getBytes(StandardCharsets.UTF_8));
    if (!file.toFile().setExecutable(true)) {
      throw new IOException("cannot make " + file + " executable");
    }
    return file;
  }
}
