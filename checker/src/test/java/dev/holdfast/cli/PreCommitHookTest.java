package dev.holdfast.cli;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import dev.holdfast.Tools;
import dev.holdfast.history.Sandbox;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** Commits to a real repository with the hook installed. */
class PreCommitHookTest {
  private static final Path HOOK = Path.of("../ci-templates/git-hooks/pre-commit");

  private static final String PLAN =
      """
      format: holdfast-plan/1
      study: { title: Reading aloud to lambs, justification: power, participants: animals }
      defaults: { alpha: 0.05, sides: two, target-power: 0.80 }
      quantities:
        gain:
          value: 4.2
          unit: kg
          source: { kind: smallest-worthwhile, reason: agreed with the shepherds }
        weight-sd:
          value: 8.4
          unit: kg
          source: { kind: own-records, reason: weights of last spring }
      outcomes:
        weight: { role: primary, scale: continuous, unit: kg }
      analyses:
        heavier:
          outcome: weight
          arrangement: parallel-groups
          test: student-t
          effect: { difference: gain, sd: weight-sd }
          sample: { aloud: 64, silent: 64 }
          claims: { power: 0.80 }
      recruitment: { enrol: 128, no-loss-reason: all lambs stay on the farm }
      """;

  @TempDir Path folder;
  private Sandbox sandbox;

  @BeforeEach
  void installTheHook() throws Exception {
    Path program = folder.resolve("the program/holdfast");
    Ran.program(program);
    sandbox = Sandbox.in(folder.resolve("a study"));
    sandbox.environment().put("HOLDFAST", program.toString());
    Path hook = sandbox.root().resolve(".git/hooks/pre-commit");
    Files.createDirectories(hook.getParent());
    Files.copy(HOOK, hook);
    assertTrue(hook.toFile().setExecutable(true));
  }

  private Ran commit(String... more) throws Exception {
    List<String> command = new java.util.ArrayList<>(List.of("git", "commit", "-m", "a change"));
    command.addAll(List.of(more));
    return Ran.start(sandbox.root(), sandbox.environment(), command).end();
  }

  private String commits() throws Exception {
    return sandbox.git("rev-list", "--count", "--all");
  }

  private void edit() throws Exception {
    sandbox.write("study-plan.yaml", PLAN.replace("value: 8.4", "value: 9.3"));
  }

  @Test
  void anEditThatBreaksAClaimIsRefusedWithWhatMovedAndWhere() throws Exception {
    sandbox.stage("study-plan.yaml", PLAN);
    Ran first = commit();
    assertEquals(0, first.status(), first.err());
    edit();
    sandbox.git("add", "study-plan.yaml");
    Ran refused = commit();
    assertEquals(1, refused.status());
    assertEquals("1", commits());
    String said = refused.out() + refused.err();
    for (String part :
        List.of(
            "study-plan.yaml:22:22: blocks power-drift: heavier claims power 0.80;"
                + " its assumptions give 0.72",
            "At HEAD it was 0.80; since then weight-sd moved from 8.4 to 9.3 (line 10)",
            "weight-sd at most 8.469 (now 9.3)",
            "holdfast: commit refused: a staged study plan does not hold")) {
      assertTrue(said.contains(part), () -> part + " is not in\n" + said);
    }
  }

  @Test
  void whatIsStagedCountsAndNotWhatLiesInTheFolder() throws Exception {
    sandbox.stage("study-plan.yaml", PLAN);
    edit();
    assertEquals(0, commit().status());
  }

  @Test
  void aCommitOfASingleFileIsJudgedByItsOwnIndex() throws Exception {
    sandbox.stage("study-plan.yaml", PLAN);
    commit();
    edit();
    assertEquals(1, commit("study-plan.yaml").status());
    assertEquals(1, commit("--all").status());
    assertEquals("1", commits());
  }

  @Test
  void aCommitWithoutAPlanDoesNotNeedTheProgram() throws Exception {
    sandbox.environment().put("HOLDFAST", "/nowhere/holdfast");
    sandbox.stage("notes.md", "a note");
    assertEquals(0, commit().status());
  }

  @Test
  void withoutTheProgramAPlanIsNotCommittedAndTheRemedyIsSaid() throws Exception {
    sandbox.environment().put("HOLDFAST", "/nowhere/holdfast");
    sandbox.stage("below/x.study-plan.yml", PLAN);
    Ran ran = commit();
    assertEquals(1, ran.status());
    assertTrue(ran.err().contains("git config --global holdfast.path"), ran.err());
  }

  @Test
  void theProgramIsFoundByTheSettingOfGit() throws Exception {
    Map<String, String> plain = new HashMap<>(sandbox.environment());
    sandbox.git("config", "holdfast.path", plain.get("HOLDFAST"));
    sandbox.environment().remove("HOLDFAST");
    sandbox.stage("study-plan.yaml", PLAN);
    Ran ran = commit();
    assertEquals(0, ran.status(), ran.err());
    assertTrue((ran.out() + ran.err()).contains("1 plan holds."), ran.err());
  }

  @Test
  void theShellCheckerFindsNothing() throws Exception {
    Tools.need("shellcheck");
    assertEquals(
        "", Ran.run(folder, System.getenv(), "shellcheck", HOOK.toAbsolutePath().toString()).out());
  }
}
