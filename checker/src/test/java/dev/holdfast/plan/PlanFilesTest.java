package dev.holdfast.plan;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;
import static org.junit.jupiter.api.Assumptions.assumeTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.NoSuchFileException;
import java.nio.file.Path;
import java.nio.file.attribute.PosixFilePermissions;
import java.util.List;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

class PlanFilesTest {
  @TempDir private Path folder;

  @BeforeEach
  void layOutAFolder() throws IOException {
    for (String file :
        List.of(
            "study-plan.yaml",
            "b/study-plan.yml",
            "b/z/swifts.study-plan.yaml",
            "b-/study-plan.yaml",
            "é/study-plan.yaml",
            "B/x.study-plan.yml",
            ".git/study-plan.yaml",
            "b/.cache/study-plan.yaml",
            "b/.study-plan.yaml.swp",
            "b/plan.yaml",
            "b/my-study-plan.yaml",
            "none/readme.md")) {
      Path path = folder.resolve(file);
      Files.createDirectories(path.getParent());
      Files.writeString(path, file);
    }
  }

  @Test
  void plansAreFoundByNameInTheOrderOfTheBytesOfTheirPaths() {
    PlanFiles.Found found = PlanFiles.find(List.of(folder));
    assertEquals(List.of(), found.failures());
    assertEquals(
        List.of(
            "B/x.study-plan.yml",
            "b-/study-plan.yaml",
            "b/study-plan.yml",
            "b/z/swifts.study-plan.yaml",
            "study-plan.yaml",
            "é/study-plan.yaml"),
        shown(found));
  }

  @Test
  void aFileThatIsNamedIsTakenWhateverItsName() {
    PlanFiles.Found found =
        PlanFiles.find(
            List.of(folder.resolve("b/plan.yaml"), folder.resolve(".git/study-plan.yaml")));
    assertEquals(List.of(), found.failures());
    assertEquals(List.of(".git/study-plan.yaml", "b/plan.yaml"), shown(found));
  }

  @Test
  void aFileThatIsReachedTwiceIsTakenOnce() {
    Path roundabout = folder.resolve("none/../b/study-plan.yml");
    PlanFiles.Found found =
        PlanFiles.find(
            List.of(folder.resolve("b"), folder.resolve("b/study-plan.yml"), roundabout));
    assertEquals(List.of("b/study-plan.yml", "b/z/swifts.study-plan.yaml"), shown(found));
  }

  @Test
  void aFileThatIsNamedByTwoFormsOfItsPathIsTakenOnce() {
    Path absolute = folder.resolve("study-plan.yaml").toAbsolutePath();
    Path relative = Path.of("").toAbsolutePath().relativize(absolute);
    PlanFiles.Found found = PlanFiles.find(List.of(relative, absolute));
    assertEquals(List.of(relative), found.files());
  }

  @Test
  void aHiddenFolderThatIsNamedIsSearched() {
    assertEquals(
        List.of(".git/study-plan.yaml"), shown(PlanFiles.find(List.of(folder.resolve(".git")))));
  }

  @Test
  void aPathThatIsNotThereIsToldApartFromAFolderWithoutPlan() {
    PlanFiles.Found found =
        PlanFiles.find(List.of(folder.resolve("nowhere"), folder.resolve("none")));
    assertEquals(List.of(), found.files());
    assertEquals(
        List.of(PlanFiles.Cause.ABSENT, PlanFiles.Cause.WITHOUT_PLAN),
        found.failures().stream().map(PlanFiles.Failure::cause).toList());
    assertTrue(found.failures().get(0).message().endsWith("nowhere does not exist"));
    assertTrue(found.failures().get(1).message().contains("none holds no plan"));
  }

  @Test
  void aLinkToAFolderIsNotFollowedAndALinkToAFileIs() throws IOException {
    Path outside = Files.createDirectories(folder.resolve("none/outside"));
    Files.writeString(outside.resolve("study-plan.yaml"), "");
    Path inside = Files.createDirectories(folder.resolve("links"));
    Files.createSymbolicLink(inside.resolve("folder"), outside);
    Files.createSymbolicLink(inside.resolve("loop"), inside);
    Files.createSymbolicLink(
        inside.resolve("a.study-plan.yaml"), outside.resolve("study-plan.yaml"));
    Files.createSymbolicLink(inside.resolve("dead.study-plan.yaml"), folder.resolve("gone"));
    assertEquals(List.of("links/a.study-plan.yaml"), shown(PlanFiles.find(List.of(inside))));
  }

  @Test
  void aDeadLinkThatIsNamedIsUnreadable() throws IOException {
    Path link = Files.createSymbolicLink(folder.resolve("dead"), folder.resolve("gone"));
    assertEquals(
        PlanFiles.Cause.UNREADABLE, PlanFiles.find(List.of(link)).failures().get(0).cause());
  }

  @Test
  void aFolderThatMayNotBeReadIsUnreadable() throws IOException {
    Path closed = folder.resolve("b/z");
    Files.setPosixFilePermissions(closed, PosixFilePermissions.fromString("---------"));
    try {
      assumeTrue(!Files.isReadable(closed), "this user may read everything");
      PlanFiles.Found found = PlanFiles.find(List.of(folder.resolve("b")));
      assertEquals(List.of("b/study-plan.yml"), shown(found));
      assertEquals(PlanFiles.Cause.UNREADABLE, found.failures().get(0).cause());
    } finally {
      Files.setPosixFilePermissions(closed, PosixFilePermissions.fromString("rwx------"));
    }
  }

  @ParameterizedTest
  @ValueSource(
      strings = {"study-plan.yaml", "study-plan.yml", "a.study-plan.yaml", "a.b.study-plan.yml"})
  void theseAreNamesOfPlans(String name) {
    assertTrue(PlanFiles.isPlan(name));
  }

  @ParameterizedTest
  @ValueSource(
      strings = {"plan.yaml", "study-plan.json", "Study-Plan.yaml", "astudy-plan.yaml", ""})
  void theseAreNot(String name) {
    assertFalse(PlanFiles.isPlan(name));
  }

  @Test
  void ofAVeryLargeFileNoMoreIsReadThanShowsItsSize() throws IOException {
    Path large = folder.resolve("large.yaml");
    Files.write(large, new byte[TreeReader.LARGEST_FILE * 2]);
    byte[] bytes = PlanFiles.bytes(large);
    assertEquals(TreeReader.LARGEST_FILE + 1, bytes.length);
    assertTrue(Plans.read(bytes).problems().get(0).message().contains("larger than"));
  }

  @Test
  void aFileThatVanishedIsAbsent() {
    Path gone = folder.resolve("gone.yaml");
    IOException e = assertThrows(NoSuchFileException.class, () -> PlanFiles.bytes(gone));
    assertEquals(PlanFiles.Cause.ABSENT, PlanFiles.unreadable(gone, e).cause());
  }

  private List<String> shown(PlanFiles.Found found) {
    return found.files().stream()
        .map(file -> PlanFiles.shown(folder.relativize(file.normalize())))
        .toList();
  }
}
