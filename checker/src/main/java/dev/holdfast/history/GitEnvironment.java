package dev.holdfast.history;

import java.util.HashMap;
import java.util.Map;
import java.util.Set;

/** The environment that git is run in. */
final class GitEnvironment {
  /**
   * What git sets for a hook, and what says which repository, index and user configuration are
   * meant. A commit of single files has an index of its own, known to the hook by this alone.
   */
  private static final Set<String> KEPT =
      Set.of(
          "GIT_DIR",
          "GIT_WORK_TREE",
          "GIT_COMMON_DIR",
          "GIT_INDEX_FILE",
          "GIT_OBJECT_DIRECTORY",
          "GIT_ALTERNATE_OBJECT_DIRECTORIES",
          "GIT_QUARANTINE_PATH",
          "GIT_CEILING_DIRECTORIES",
          "GIT_DISCOVERY_ACROSS_FILESYSTEM",
          "GIT_CONFIG_GLOBAL",
          "GIT_CONFIG_SYSTEM",
          "GIT_CONFIG_NOSYSTEM",
          "GIT_EXEC_PATH");

  private GitEnvironment() {}

  /**
   * Of the variables of git only those that name a place; the others could trace into the output,
   * run a program or read paths as patterns.
   */
  static Map<String, String> of(Map<String, String> environment) {
    Map<String, String> clean = new HashMap<>();
    environment.forEach(
        (name, value) -> {
          if (!name.startsWith("GIT_") || KEPT.contains(name)) {
            clean.put(name, value);
          }
        });
    clean.put("GIT_OPTIONAL_LOCKS", "0");
    clean.put("GIT_NO_REPLACE_OBJECTS", "1");
    clean.put("GIT_NO_LAZY_FETCH", "1");
    clean.put("GIT_TERMINAL_PROMPT", "0");
    // Its complaints are read, so that their language matters.
    clean.put("LC_ALL", "C");
    return clean;
  }
}
