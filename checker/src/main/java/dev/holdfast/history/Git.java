package dev.holdfast.history;

import java.io.BufferedInputStream;
import java.io.IOException;
import java.io.InputStream;
import java.io.OutputStream;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.concurrent.CompletableFuture;
import java.util.concurrent.CompletionException;

/**
 * Runs the {@code git} executable in a folder: each argument apart, nothing through a shell, and
 * with what a repository could make git run (hooks, file monitors, external diffs) switched off.
 */
final class Git {
  private static final List<String> NOTHING_ELSE_RUNS =
      List.of("--no-pager", "-c", "core.fsmonitor=false", "-c", "core.hooksPath=/dev/null");

  private final Path folder;
  private final Map<String, String> environment;

  /**
   * Git in a folder.
   *
   * @param environment the environment of the run; a hook's index and repository are found by it
   */
  Git(Path folder, Map<String, String> environment) {
    this.folder = folder.toAbsolutePath();
    this.environment = environment;
  }

  /** The same git in another folder. */
  Git in(Path other) {
    return new Git(other, environment);
  }

  /** What a command came to. */
  record Result(int status, byte[] output, String errors) {
    String text() {
      return new String(output, StandardCharsets.UTF_8);
    }

    boolean failed() {
      return status != 0;
    }

    /** The fields of an output that was asked for with {@code -z}. */
    List<String> fields() {
      return output.length == 0 ? List.of() : List.of(text().split("\0"));
    }

    /** The first line that git complained with, its own prefix left out. */
    String complaint() {
      String line = errors.lines().findFirst().orElse("git ended with status " + status);
      return line.startsWith("fatal: ") ? line.substring("fatal: ".length()) : line;
    }
  }

  /** Takes the output of a command while it runs. */
  interface Reader<T> {
    T read(InputStream output) throws IOException;
  }

  /** Runs a command to its end. */
  Result run(String... arguments) throws GitException {
    Ran<byte[]> ran = run(List.of(), InputStream::readAllBytes, arguments);
    return new Result(ran.status(), ran.read(), ran.errors());
  }

  /** Runs a command that must not fail. */
  Result must(String... arguments) throws GitException {
    Result result = run(arguments);
    if (result.failed()) {
      throw failed(arguments[0], result);
    }
    return result;
  }

  /** Runs a command that must not fail, with lines for its input and a reader for its output. */
  <T> T feed(List<String> lines, Reader<T> reader, String... arguments) throws GitException {
    Ran<T> ran = run(lines, reader, arguments);
    if (ran.status() != 0) {
      throw failed(arguments[0], new Result(ran.status(), new byte[0], ran.errors()));
    }
    return ran.read();
  }

  private static GitException failed(String command, Result result) {
    return new GitException("git " + command + " failed: " + result.complaint());
  }

  private record Ran<T>(int status, T read, String errors) {}

  private <T> Ran<T> run(List<String> lines, Reader<T> reader, String... arguments)
      throws GitException {
    Process process = start(arguments);
    // Input, output and errors flow at once, so that no full pipe stops git.
    CompletableFuture<byte[]> errors = later(() -> process.getErrorStream().readAllBytes());
    CompletableFuture<byte[]> input = later(() -> write(process.getOutputStream(), lines));
    try (InputStream output = new BufferedInputStream(process.getInputStream())) {
      T read = reader.read(output);
      output.transferTo(OutputStream.nullOutputStream());
      int status = process.waitFor();
      String complaints = new String(errors.join(), StandardCharsets.UTF_8);
      if (status == 0) {
        input.join();
      }
      return new Ran<>(status, read, complaints);
    } catch (IOException | CompletionException e) {
      throw new GitException("git " + arguments[0] + " could not be read: " + e.getMessage());
    } catch (InterruptedException e) {
      Thread.currentThread().interrupt();
      throw new GitException("interrupted while git ran");
    } finally {
      process.destroy();
    }
  }

  private Process start(String... arguments) throws GitException {
    List<String> command = new ArrayList<>();
    command.add("git");
    command.addAll(NOTHING_ELSE_RUNS);
    command.addAll(List.of(arguments));
    if (!Files.isDirectory(folder)) {
      throw new GitException(folder + " is no folder");
    }
    ProcessBuilder builder = new ProcessBuilder(command).directory(folder.toFile());
    builder.environment().clear();
    builder.environment().putAll(GitEnvironment.of(environment));
    try {
      return builder.start();
    } catch (IOException e) {
      throw new GitException("git is not found; install it, or put it on the PATH");
    }
  }

  private interface Task {
    byte[] run() throws IOException;
  }

  private static CompletableFuture<byte[]> later(Task task) {
    return CompletableFuture.supplyAsync(
        () -> {
          try {
            return task.run();
          } catch (IOException e) {
            throw new UncheckedIOException(e);
          }
        });
  }

  private static byte[] write(OutputStream input, List<String> lines) throws IOException {
    try (input) {
      for (String line : lines) {
        input.write((line + "\n").getBytes(StandardCharsets.UTF_8));
      }
    }
    return new byte[0];
  }
}
