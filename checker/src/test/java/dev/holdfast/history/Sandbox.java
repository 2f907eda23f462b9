package dev.holdfast.history;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;

/** A git repository made by a test, which sees no setting of the machine or of its user. */
public record Sandbox(Path root, Map<String, String> environment) {
  /** A new repository in a folder. */
  public static Sandbox in(Path root) throws Exception {
    Files.createDirectories(root);
    Sandbox sandbox = new Sandbox(root, isolated(root));
    sandbox.git("init", "--quiet", "--initial-branch=main");
    return sandbox;
  }

  /** An environment for git with fixed people and no configuration. */
  public static Map<String, String> isolated(Path home) {
    Map<String, String> environment = new HashMap<>();
    environment.put("PATH", System.getenv("PATH"));
    environment.put("HOME", home.toString());
    environment.put("GIT_CONFIG_GLOBAL", "/dev/null");
    environment.put("GIT_CONFIG_NOSYSTEM", "1");
    environment.put("GIT_AUTHOR_NAME", "A");
    environment.put("GIT_AUTHOR_EMAIL", "a@example.org");
    environment.put("GIT_COMMITTER_NAME", "A");
    environment.put("GIT_COMMITTER_EMAIL", "a@example.org");
    return environment;
  }

  /** Runs git and returns what it printed. */
  public String git(String... arguments) throws Exception {
    List<String> command = new ArrayList<>(List.of("git"));
    command.addAll(List.of(arguments));
    ProcessBuilder builder =
        new ProcessBuilder(command).directory(root.toFile()).redirectErrorStream(true);
    builder.environment().clear();
    builder.environment().putAll(environment);
    Process process = builder.start();
    process.getOutputStream().close();
    String out = new String(process.getInputStream().readAllBytes(), StandardCharsets.UTF_8);
    if (process.waitFor() != 0) {
      throw new AssertionError(command + ": " + out);
    }
    return out.strip();
  }

  /** Writes a file and stages it. */
  public Sandbox stage(String path, String text) throws Exception {
    write(path, text);
    git("add", "--", path);
    return this;
  }

  /** Writes a file. */
  public Sandbox write(String path, String text) throws IOException {
    Path file = root.resolve(path);
    Files.createDirectories(file.getParent());
    Files.writeString(file, text);
    return this;
  }

  /** Commits what is staged. */
  public Sandbox commit() throws Exception {
    git("commit", "--quiet", "--message", "a change");
    return this;
  }
}
