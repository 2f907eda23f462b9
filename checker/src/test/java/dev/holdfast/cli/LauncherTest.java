package dev.holdfast.cli;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import dev.holdfast.Tools;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.attribute.FileTime;
import java.time.Instant;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** Runs the launcher in trees of its own, with a JDK and a Maven that only pretend. */
class LauncherTest {
  private static final Path LAUNCHER = Path.of("holdfast").toAbsolutePath();

  /** The commands that the launcher may call, so that no JDK or Maven of the machine is seen. */
  private static final List<String> TOOLS =
      List.of(
          "dirname",
          "readlink",
          "sed",
          "cat",
          "mkdir",
          "rm",
          "mv",
          "touch",
          "find",
          "head",
          "tail",
          "sleep");

  private static final String MAVEN =
      """
      #!/bin/sh
      echo "$JAVA_HOME" >>"$CALLS"
      for argument; do
        case $argument in -Dholdfast.target=*) target=${argument#*=} ;; esac
      done
      if [ -n "${BUILD_FAILS:-}" ]; then echo 'no such symbol'; exit 1; fi
      sleep "${BUILD_TAKES:-0}"
      mkdir -p "$target" && echo built >"$target/holdfast-checker-9-standalone.jar"
      """;

  private static final String JAVA =
      """
      #!/bin/sh
      for argument; do
        case $argument in
          -XX:ArchiveClassesAtExit=*) echo archive >"${argument#*=}" ;;
        esac
      done
      echo "java $0"
      while [ "$1" != -jar ]; do shift; done
      shift 2
      for argument; do echo "<$argument>"; done
      echo "locale $LC_ALL"
      exit "${JAVA_ENDS:-0}"
      """;

  @TempDir Path folder;
  private Path tree;
  private Path calls;
  private Map<String, String> environment;

  @BeforeEach
  void makeATree() throws IOException {
    tree = folder.resolve("a tree");
    for (String file : List.of("checker/src/main/A.java", "checker/pom.xml", "pom.xml")) {
      write(tree.resolve(file));
    }
    write(tree.resolve("schema/plan.schema.json"));
    Files.copy(LAUNCHER, tree.resolve("checker/holdfast"));
    assertTrue(tree.resolve("checker/holdfast").toFile().setExecutable(true));
    Path tools = folder.resolve("tools");
    Files.createDirectories(tools);
    for (String tool : TOOLS) {
      Ran.script(
          tools.resolve(tool),
          "#!/bin/sh\nexec '%s' \"$@\"\n".formatted(onThePath(tool).orElseThrow()));
    }
    calls = folder.resolve("calls");
    environment = new HashMap<>();
    environment.put("PATH", tools + ":" + folder.resolve("maven"));
    environment.put("JAVA_HOME", jdk("jdk-17", "17.0.1", true).toString());
    environment.put("HOLDFAST_JDKS", "");
    environment.put("CALLS", calls.toString());
    Ran.script(folder.resolve("maven/mvn"), MAVEN);
  }

  private static void write(Path file) throws IOException {
    Files.createDirectories(file.getParent());
    Files.writeString(file, "as it was");
    Files.setLastModifiedTime(file, FileTime.from(Instant.now().minusSeconds(3600)));
    Files.setLastModifiedTime(file.getParent(), FileTime.from(Instant.now().minusSeconds(3600)));
  }

  private static Optional<Path> onThePath(String tool) {
    for (String each : System.getenv("PATH").split(":")) {
      Path file = Path.of(each, tool);
      if (Files.isExecutable(file)) {
        return Optional.of(file);
      }
    }
    return Optional.empty();
  }

  private Path jdk(String name, String version, boolean compiler) throws IOException {
    Path home = folder.resolve(name);
    Ran.script(home.resolve("bin/java"), JAVA);
    if (compiler) {
      Ran.script(home.resolve("bin/javac"), "#!/bin/sh\n");
    }
    Files.writeString(home.resolve("release"), "JAVA_VERSION=\"" + version + "\"\n");
    return home;
  }

  private Ran run(String... arguments) throws Exception {
    return running(arguments).end();
  }

  private Ran.Running running(String... arguments) throws IOException {
    List<String> command = new java.util.ArrayList<>();
    command.add(tree.resolve("checker/holdfast").toString());
    command.addAll(List.of(arguments));
    return Ran.start(folder, environment, command);
  }

  private int builds() throws IOException {
    return Files.exists(calls) ? Files.readAllLines(calls).size() : 0;
  }

  private Path cache() {
    return tree.resolve("checker/target/launcher");
  }

  @Test
  void theFirstRunBuildsAndSaysSoAndTheNextIsQuiet() throws Exception {
    Ran first = run("check", "a plan.yaml");
    assertEquals(0, first.status(), first.err());
    assertEquals("holdfast: building, which takes about a minute and is done once\n", first.err());
    assertTrue(first.out().contains("<check>\n<a plan.yaml>\n"), first.out());
    Ran second = run("check");
    assertEquals("", second.err());
    assertEquals(1, builds());
  }

  @Test
  void nothingButTheJarTheArchiveAndTheLogIsLeft() throws Exception {
    run("check");
    try (var files = Files.list(cache())) {
      assertEquals(
          List.of("build.log", "classes.jsa", "holdfast.jar"),
          files.map(file -> file.getFileName().toString()).sorted().toList());
    }
  }

  @Test
  void aSourceThatIsNewerBuildsAgain() throws Exception {
    for (String file :
        List.of(
            "checker/src/main/A.java", "checker/pom.xml", "pom.xml", "schema/plan.schema.json")) {
      run("check");
      int before = builds();
      Files.setLastModifiedTime(tree.resolve(file), FileTime.from(Instant.now().plusSeconds(2)));
      run("check");
      assertEquals(before + 1, builds(), file);
      Files.setLastModifiedTime(
          tree.resolve(file), FileTime.from(Instant.now().minusSeconds(3600)));
    }
  }

  @Test
  void aSourceThatWentAwayBuildsAgain() throws Exception {
    write(tree.resolve("checker/src/main/B.java"));
    run("check");
    Files.setLastModifiedTime(
        cache().resolve("holdfast.jar"), FileTime.from(Instant.now().minusSeconds(60)));
    Files.delete(tree.resolve("checker/src/main/B.java"));
    run("check");
    assertEquals(2, builds());
  }

  @Test
  void itIsFoundThroughLinksFromAnyFolder() throws Exception {
    Path links = Files.createDirectories(folder.resolve("far away/bin"));
    Files.createSymbolicLink(links.resolve("direct"), tree.resolve("checker/holdfast"));
    Files.createSymbolicLink(links.resolve("holdfast"), Path.of("direct"));
    Ran ran = Ran.run(links, environment, "./holdfast", "--version");
    assertEquals(0, ran.status(), ran.err());
    assertTrue(ran.out().contains("<--version>"), ran.out());
  }

  @Test
  void theStatusOfTheProgramIsHandedOn() throws Exception {
    environment.put("JAVA_ENDS", "1");
    assertEquals(1, run("check").status());
  }

  @Test
  void withoutAJdkItSaysWhatToInstall() throws Exception {
    environment.remove("JAVA_HOME");
    Ran ran = run("check");
    assertEquals(2, ran.status());
    assertTrue(ran.err().startsWith("holdfast: needs a JDK of version 17 or later"), ran.err());
    assertEquals(1, ran.err().lines().count());
  }

  @Test
  void anOldJdkIsPassedOver() throws Exception {
    environment.put("JAVA_HOME", jdk("jdk-11", "11.0.20", true).toString());
    assertEquals(2, run("check").status());
    Path later = jdk("jdk-21", "21", true);
    environment.put("HOLDFAST_JDKS", folder.resolve("jdk-11") + ":" + later);
    Ran ran = run("check");
    assertEquals(0, ran.status(), ran.err());
    assertTrue(ran.out().contains("java " + later), ran.out());
  }

  @Test
  void theVersionOfAJavaWithoutAReleaseFileIsAsked() throws Exception {
    Path bare = folder.resolve("bare");
    Ran.script(bare.resolve("bin/java"), "#!/bin/sh\necho 'openjdk version \"18.0.2\"' >&2\n");
    Ran.script(bare.resolve("bin/javac"), "#!/bin/sh\n");
    environment.put("JAVA_HOME", bare.toString());
    assertEquals(0, run("check").status());
    Ran.script(bare.resolve("bin/java"), "#!/bin/sh\necho 'java version \"1.8.0_392\"' >&2\n");
    assertEquals(2, run("check").status());
  }

  @Test
  void aRuntimeWithoutCompilerRunsButDoesNotBuild() throws Exception {
    Path full = folder.resolve("jdk-17");
    environment.put("JAVA_HOME", jdk("runtime", "17.0.9", false).toString());
    environment.put("HOLDFAST_JDKS", full.toString());
    run("check");
    assertEquals(full.toString(), Files.readString(calls).strip());
    assertTrue(run("check").out().contains("java " + folder.resolve("runtime")));
  }

  @Test
  void withoutMavenItSaysWhatToInstall() throws Exception {
    environment.put("PATH", folder.resolve("tools").toString());
    Ran ran = run("check");
    assertEquals(2, ran.status());
    assertTrue(ran.err().startsWith("holdfast: needs Maven to build itself"), ran.err());
    environment.put("MAVEN_HOME", folder.resolve("apart").toString());
    Ran.script(folder.resolve("apart/bin/mvn"), MAVEN);
    assertEquals(0, run("check").status());
  }

  @Test
  void aFailedBuildShowsItsEndAndLeavesNothingBehind() throws Exception {
    environment.put("BUILD_FAILS", "yes");
    Ran ran = run("check");
    assertEquals(2, ran.status());
    assertTrue(ran.err().contains("no such symbol\nholdfast: the build failed"), ran.err());
    assertFalse(Files.exists(cache().resolve("lock")));
    environment.remove("BUILD_FAILS");
    assertEquals(0, run("check").status());
  }

  @Test
  void twoThatStartAtOnceBuildOnce() throws Exception {
    environment.put("BUILD_TAKES", "2");
    Ran.Running one = running("check", "one");
    Ran.Running other = running("check", "other");
    assertEquals(0, one.end().status());
    assertEquals(0, other.end().status());
    assertEquals(1, builds());
  }

  @Test
  void aLockWhoseOwnerIsGoneIsBroken() throws Exception {
    Process gone = new ProcessBuilder("true").start();
    gone.waitFor();
    Files.createDirectories(cache().resolve("lock"));
    Files.writeString(cache().resolve("lock/owner"), gone.pid() + "\n");
    assertEquals(0, run("check").status());
    assertFalse(Files.exists(cache().resolve("lock")));
  }

  @Test
  void aLockWithoutAnOwnerIsBrokenAfterAWhile() throws Exception {
    Files.createDirectories(cache().resolve("lock"));
    assertEquals(0, run("check").status());
  }

  @Test
  void namesOutsideAsciiComeThroughInAnyLocale() throws Exception {
    assertTrue(run("check").out().contains("locale C.UTF-8"));
    environment.put("LANG", "C");
    assertTrue(run("check").out().contains("locale C.UTF-8"));
    environment.put("LC_ALL", "nb_NO.UTF-8");
    assertTrue(run("check").out().contains("locale nb_NO.UTF-8"));
  }

  @Test
  void theShellCheckerFindsNothing() throws Exception {
    Tools.need("shellcheck");
    Ran ran = Ran.run(folder, System.getenv(), "shellcheck", LAUNCHER.toString());
    assertEquals("", ran.out());
  }
}
