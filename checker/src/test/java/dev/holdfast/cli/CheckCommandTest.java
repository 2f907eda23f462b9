package dev.holdfast.cli;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import dev.holdfast.check.Plans;
import dev.holdfast.history.Sandbox;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.attribute.PosixFilePermissions;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

class CheckCommandTest {
  private static final String BROKEN = Plans.TWO_MEANS.replace("value: 10,", "value: 11.5,");

  @TempDir Path folder;

  private Path write(String path, String text) throws IOException {
    Path file = folder.resolve(path);
    Files.createDirectories(file.getParent());
    return Files.writeString(file, text);
  }

  private static Ran check(Object... arguments) {
    return check(new Terminal(), arguments);
  }

  private static Ran check(Terminal terminal, Object... arguments) {
    List<String> words = new ArrayList<>(List.of("check"));
    for (Object argument : arguments) {
      words.add(argument.toString());
    }
    return terminal.run(words.toArray(String[]::new));
  }

  @Test
  void whatHoldsIsOneLineAndStatusZero() throws Exception {
    write("a/study-plan.yaml", Plans.TWO_MEANS);
    write("b/x.study-plan.yml", Plans.TWO_MEANS);
    Ran ran = check(folder);
    assertEquals(new Ran(0, "2 plans hold.\n", ""), ran);
  }

  @Test
  void aClaimThatFellIsStatusOne() throws Exception {
    Ran ran = check(write("study-plan.yaml", BROKEN));
    assertEquals(1, ran.status());
    assertEquals("", ran.err());
    assertTrue(
        ran.out().contains(":19:22: blocks power-drift: main claims power 0.80;"), ran.out());
  }

  @Test
  void aFileThatIsNoPlanIsAFindingAndDoesNotStopTheOthers() throws Exception {
    write("a.study-plan.yaml", "format: [\n");
    write("b.study-plan.yaml", BROKEN);
    write("c.study-plan.yaml", Plans.TWO_MEANS);
    Ran ran = check(folder);
    assertEquals(1, ran.status());
    assertTrue(ran.out().contains("a.study-plan.yaml:"), ran.out());
    assertTrue(ran.out().contains("blocks plan-invalid"), ran.out());
    assertTrue(ran.out().contains("b.study-plan.yaml:19:22: blocks power-drift"), ran.out());
    assertTrue(ran.out().contains("3 plans: 1 holds, 2 do not"), ran.out());
  }

  @Test
  void aPathThatIsNotThereIsStatusTwoAndTheRestIsChecked() throws Exception {
    write("a/study-plan.yaml", BROKEN);
    Ran ran = check(folder.resolve("a"), folder.resolve("gone"));
    assertEquals(2, ran.status());
    assertTrue(ran.out().contains("blocks power-drift"), ran.out());
    assertTrue(ran.err().endsWith("gone does not exist\n"), ran.err());
  }

  @Test
  void aFolderWithoutAPlanIsStatusTwo() throws Exception {
    write("notes.md", "");
    Ran ran = check(folder);
    assertEquals(2, ran.status());
    assertTrue(ran.err().contains("holds no plan"), ran.err());
  }

  @Test
  void theOrderAndTheBytesAreTheSameOnAnyNumberOfThreads() throws Exception {
    for (int i = 0; i < 40; i++) {
      write("p" + (i * 7 % 40) + "/study-plan.yaml", i % 3 == 0 ? BROKEN : Plans.TWO_MEANS);
    }
    String one = check("--threads", 1, "--output", "json", folder).out();
    assertEquals(one, check("--threads", 8, "--output", "json", folder).out());
    assertTrue(one.indexOf("p0/study-plan") < one.indexOf("p1/study-plan"));
    assertTrue(one.indexOf("p10/study-plan") < one.indexOf("p2/study-plan"));
  }

  @Test
  void oneRunWritesSeveralOutputs() throws Exception {
    Path plan = write("study-plan.yaml", BROKEN);
    Path json = folder.resolve("report.json");
    Ran ran = check("--output", "text", "--output", "json=" + json, plan);
    assertEquals(1, ran.status());
    assertTrue(ran.out().contains("blocks power-drift"));
    assertTrue(Files.readString(json).contains("\"finding\" : \"power-drift\""));
  }

  @Test
  void aReportIsReadableByOthersAndLeavesNothingBeside() throws Exception {
    Path plan = write("plans/study-plan.yaml", Plans.TWO_MEANS);
    Path json = write("reports/report.json", "an older one");
    Files.delete(json);
    check("--output", "json=" + json, plan);
    Path other = write("reports/other", "");
    assertEquals(
        PosixFilePermissions.toString(Files.getPosixFilePermissions(other)),
        PosixFilePermissions.toString(Files.getPosixFilePermissions(json)));
    try (var files = Files.list(json.getParent())) {
      assertEquals(2, files.count());
    }
  }

  @Test
  void aReportBehindALinkReplacesTheFileAndKeepsTheLink() throws Exception {
    Path plan = write("study-plan.yaml", Plans.TWO_MEANS);
    Path real = write("real.json", "older");
    Path link = Files.createSymbolicLink(folder.resolve("link.json"), real);
    check("--output", "json=" + link, plan);
    assertTrue(Files.isSymbolicLink(link));
    assertTrue(Files.readString(real).startsWith("{"));
  }

  @Test
  void aReportThatCannotBeWrittenIsStatusTwoAndTheOthersAreWritten() throws Exception {
    Path plan = write("study-plan.yaml", Plans.TWO_MEANS);
    Ran ran = check("--output", "json=" + folder.resolve("gone/r.json"), "--output", "text", plan);
    assertEquals(2, ran.status());
    assertEquals("1 plan holds.\n", ran.out());
    assertTrue(ran.err().endsWith("could not be written (its folder does not exist)\n"), ran.err());
  }

  @Test
  void quietListsWhatBlocksAndVerboseListsEveryClaim() throws Exception {
    Path plan = write("study-plan.yaml", Plans.TWO_MEANS.replaceAll("(?m)^recruitment.*$", ""));
    assertTrue(check(plan).out().contains("warns loss-ignored"));
    String quiet = check("--quiet", plan).out();
    assertFalse(quiet.contains("loss-ignored"), quiet);
    String verbose = check("--verbose", plan).out();
    assertTrue(verbose.contains("stands while score-sd is at most"), verbose);
  }

  @Test
  void colourIsForTerminalsUnlessForbiddenOrAskedFor() throws Exception {
    Path plan = write("study-plan.yaml", BROKEN);
    assertFalse(check(plan).out().contains("\u001B"));
    assertTrue(check("--colour", "always", plan).out().contains("\u001B[38;5;166mblocks"));
    assertTrue(check(new Terminal(Map.of(), true), plan).out().contains("\u001B"));
    assertFalse(check(new Terminal(Map.of("NO_COLOR", "1"), true), plan).out().contains("\u001B"));
    assertFalse(
        check("--colour", "always", "--output", "text=" + folder.resolve("t.txt"), plan)
            .out()
            .contains("\u001B"));
    assertFalse(Files.readString(folder.resolve("t.txt")).contains("\u001B"));
  }

  @Test
  void sinceARevisionWhatMovedIsTold() throws Exception {
    Sandbox sandbox = Sandbox.in(folder.resolve("study"));
    sandbox.stage("a/study-plan.yaml", Plans.TWO_MEANS).commit();
    sandbox.git("tag", "registered");
    sandbox.write("a/study-plan.yaml", BROKEN);
    sandbox.write("b/study-plan.yaml", BROKEN);
    Ran ran = since(sandbox, "registered", sandbox.root());
    assertEquals(1, ran.status(), ran.err());
    assertTrue(
        ran.out().contains("At registered it was 0.80; since then score-sd moved from 10 to 11.5"),
        ran.out());
    assertEquals(1, ran.out().split("At registered it was 0.80", -1).length - 1, "b is new");
  }

  @Test
  void sinceAnUnknownRevisionOrOutsideARepositoryIsStatusTwo() throws Exception {
    Sandbox sandbox = Sandbox.in(folder.resolve("study"));
    sandbox.stage("study-plan.yaml", Plans.TWO_MEANS).commit();
    Ran unknown = since(sandbox, "nowhere", sandbox.root());
    assertEquals(2, unknown.status());
    assertTrue(unknown.err().startsWith("holdfast: no revision 'nowhere'"), unknown.err());
    Path outside = write("elsewhere/study-plan.yaml", Plans.TWO_MEANS);
    Ran none = since(sandbox, "HEAD", outside);
    assertEquals(2, none.status());
    assertTrue(none.err().contains("there is no git repository around"), none.err());
    Ran mixed = since(sandbox, "HEAD", sandbox.root(), outside);
    assertEquals(2, mixed.status());
    assertTrue(mixed.err().contains("outside the repository of the first path"), mixed.err());
    assertTrue(mixed.out().contains("2 plans hold."), mixed.out());
  }

  @Test
  void withoutGitItSaysWhatToInstall() throws Exception {
    Path plan = write("study-plan.yaml", Plans.TWO_MEANS);
    Path program = Ran.program(folder.resolve("holdfast"));
    Map<String, String> environment = Map.of("PATH", folder.toString());
    Ran ran =
        Ran.run(
            folder, environment, program.toString(), "check", "--since", "HEAD", plan.toString());
    assertEquals(2, ran.status());
    assertEquals("holdfast: git is not found; install it, or put it on the PATH\n", ran.err());
  }

  private static Ran since(Sandbox sandbox, String revision, Path... paths) {
    List<Object> arguments = new ArrayList<>(List.of("--since", revision));
    arguments.addAll(List.of(paths));
    return check(new Terminal(sandbox.environment(), false), arguments.toArray());
  }
}
