package dev.holdfast.history;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

class GitRepositoryTest {
  private static final int MOST = 1000;

  @TempDir Path folder;
  private Sandbox sandbox;

  @BeforeEach
  void makeARepository() throws Exception {
    sandbox = Sandbox.in(folder.resolve("a study"));
  }

  private GitRepository open() throws GitException {
    return GitRepository.around(sandbox.root(), sandbox.environment());
  }

  private String content(String blob) throws GitException {
    return new String(open().blobs(List.of(blob), MOST).get(blob), StandardCharsets.UTF_8);
  }

  private static String refusal(Path folder, Map<String, String> environment) {
    return assertThrows(GitException.class, () -> GitRepository.around(folder, environment))
        .getMessage();
  }

  @Test
  void itIsFoundFromAFolderWithinIt() throws Exception {
    Path within = Files.createDirectories(sandbox.root().resolve("a/b"));
    assertEquals(
        sandbox.root().toRealPath(),
        GitRepository.around(within, sandbox.environment()).root().toRealPath());
  }

  @Test
  void aFolderWithoutRepositoryIsRefusedWithARemedy() throws Exception {
    String why = refusal(folder, sandbox.environment());
    assertEquals(
        "there is no git repository around " + folder + "; run in a clone of the study", why);
  }

  @Test
  void aRepositoryWithoutWorkingTreeIsRefused() throws Exception {
    sandbox.git("init", "--quiet", "--bare", folder.resolve("bare").toString());
    String why = refusal(folder.resolve("bare"), sandbox.environment());
    assertTrue(why.contains("has no working tree"), why);
  }

  @Test
  void aFolderThatIsNotThereIsRefused() {
    assertTrue(refusal(folder.resolve("gone"), Map.of()).endsWith("gone is no folder"));
  }

  @Test
  void beforeTheFirstCommitAllThatIsStagedIsNew() throws Exception {
    sandbox.stage("a.yaml", "one");
    List<GitRepository.Staged> staged = open().staged();
    assertEquals(1, staged.size());
    assertEquals("a.yaml", staged.get(0).path());
    assertEquals(Optional.empty(), staged.get(0).before());
    assertEquals("one", content(staged.get(0).blob()));
  }

  @Test
  void aStagedFileHasItsStagedContentAndThatOfTheLastCommit() throws Exception {
    sandbox.stage("a.yaml", "one").commit().stage("a.yaml", "two").write("a.yaml", "three");
    GitRepository.Staged staged = open().staged().get(0);
    assertEquals("two", content(staged.blob()));
    assertEquals("one", content(staged.before().orElseThrow()));
  }

  @Test
  void whatIsNotStagedOrIsDeletedIsLeftOut() throws Exception {
    sandbox.stage("a.yaml", "one").stage("b.yaml", "one").commit().write("a.yaml", "two");
    sandbox.git("rm", "--quiet", "b.yaml");
    assertEquals(List.of(), open().staged());
  }

  @Test
  void aRenamedFileIsComparedWithWhatItWas() throws Exception {
    String text = "a line\n".repeat(20);
    sandbox.stage("a.yaml", text).commit();
    sandbox.git("mv", "a.yaml", "b.yaml");
    sandbox.stage("b.yaml", text + "one more\n");
    GitRepository.Staged staged = open().staged().get(0);
    assertEquals("b.yaml", staged.path());
    assertEquals(text, content(staged.before().orElseThrow()));
    assertTrue(open().filesAt(open().commit("HEAD")).containsKey("b.yaml"));
  }

  @Test
  void namesOfAnyKindComeThrough() throws Exception {
    String name = "Søvn og \"lys\"/\tplan\n.yaml";
    sandbox.stage(name, "one");
    assertEquals(name, open().staged().get(0).path());
    sandbox.commit();
    assertTrue(open().filesAt(open().commit("HEAD")).containsKey(name));
  }

  @Test
  void linksAreNoFiles() throws Exception {
    sandbox.write("secret", "elsewhere");
    Files.createSymbolicLink(sandbox.root().resolve("a.yaml"), Path.of("secret"));
    sandbox.git("add", "a.yaml");
    assertEquals(List.of(), open().staged());
    sandbox.commit();
    assertFalse(open().filesAt(open().commit("HEAD")).containsKey("a.yaml"));
  }

  @Test
  void theIndexOfAHookIsTheOneRead() throws Exception {
    sandbox.stage("a.yaml", "one").commit().write("a.yaml", "two");
    Map<String, String> hook = new HashMap<>(sandbox.environment());
    hook.put("GIT_INDEX_FILE", folder.resolve("other-index").toString());
    new Sandbox(sandbox.root(), hook).git("add", "a.yaml");
    assertEquals(List.of(), open().staged());
    assertEquals(1, GitRepository.around(sandbox.root(), hook).staged().size());
  }

  @Test
  void aLinkedWorkingTreeIsARepositoryToo() throws Exception {
    sandbox.stage("a.yaml", "one").commit();
    Path linked = folder.resolve("linked");
    sandbox.git("worktree", "add", "--quiet", linked.toString());
    new Sandbox(linked, sandbox.environment()).stage("a.yaml", "two");
    assertEquals(1, GitRepository.around(linked, sandbox.environment()).staged().size());
  }

  @Test
  void anUnknownRevisionIsRefusedWithARemedy() throws Exception {
    sandbox.stage("a.yaml", "one").commit();
    String why = assertThrows(GitException.class, () -> open().commit("nowhere")).getMessage();
    assertTrue(why.startsWith("no revision 'nowhere' in this repository; see 'git log'"), why);
    assertThrows(GitException.class, () -> open().commit("--all"));
    assertThrows(GitException.class, () -> open().commit(""));
  }

  @Test
  void aHistoryThatWasCutOffIsNamedAsTheCause() throws Exception {
    sandbox.stage("a.yaml", "one").commit().stage("a.yaml", "two").commit();
    Path shallow = folder.resolve("shallow");
    sandbox.git(
        "clone", "--quiet", "--depth=1", sandbox.root().toUri().toString(), shallow.toString());
    GitRepository repository = GitRepository.around(shallow, sandbox.environment());
    String why = assertThrows(GitException.class, () -> repository.commit("HEAD~1")).getMessage();
    assertTrue(why.contains("git fetch --unshallow"), why);
  }

  @Test
  void aMissingObjectIsAnErrorAndNoAbsence() throws Exception {
    sandbox.stage("a.yaml", "one").commit();
    String why =
        assertThrows(GitException.class, () -> open().blobs(List.of("0".repeat(40)), MOST))
            .getMessage();
    assertTrue(why.contains("is missing"), why);
  }

  @Test
  void ofALargeBlobNoMoreIsReadThanAskedFor() throws Exception {
    sandbox.stage("a.yaml", "x".repeat(5000)).stage("b.yaml", "one").commit();
    Map<String, String> files = open().filesAt(open().commit("HEAD"));
    Map<String, byte[]> contents = open().blobs(files.values(), MOST);
    assertEquals(MOST, contents.get(files.get("a.yaml")).length);
    assertArrayEquals("one".getBytes(StandardCharsets.UTF_8), contents.get(files.get("b.yaml")));
  }

  @Test
  void nothingOfTheRepositoryIsRun() throws Exception {
    Path mark = folder.resolve("mark");
    Path program = folder.resolve("program");
    Files.writeString(program, "#!/bin/sh\necho ran >'" + mark + "'\n");
    assertTrue(program.toFile().setExecutable(true));
    sandbox.stage(".gitattributes", "*.yaml diff=own filter=own\n").stage("a.yaml", "one").commit();
    for (String key : List.of("core.fsmonitor", "diff.external", "diff.own.command")) {
      sandbox.git("config", key, program.toString());
    }
    sandbox.stage("b.yaml", "two");
    for (String key : List.of("diff.own.textconv", "filter.own.smudge", "filter.own.clean")) {
      sandbox.git("config", key, program.toString());
    }
    Files.deleteIfExists(mark);
    Map<String, String> environment = new HashMap<>(sandbox.environment());
    environment.put("GIT_EXTERNAL_DIFF", program.toString());
    environment.put("GIT_PAGER", program.toString());
    GitRepository repository = GitRepository.around(sandbox.root(), environment);
    assertEquals(1, repository.staged().size());
    repository.blobs(repository.filesAt(repository.commit("HEAD")).values(), MOST);
    assertFalse(Files.exists(mark));
  }

  @Test
  void onlyPlacesAreTakenFromTheVariablesOfGit() {
    Map<String, String> clean =
        GitEnvironment.of(
            Map.of("GIT_TRACE", "1", "GIT_EXTERNAL_DIFF", "x", "GIT_INDEX_FILE", "i", "A", "b"));
    assertEquals("i", clean.get("GIT_INDEX_FILE"));
    assertEquals("b", clean.get("A"));
    assertFalse(clean.containsKey("GIT_TRACE"));
    assertFalse(clean.containsKey("GIT_EXTERNAL_DIFF"));
  }
}
