package dev.holdfast.cli;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import dev.holdfast.check.Plans;
import java.nio.file.Files;
import java.nio.file.Path;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

class ExplainCommandTest {
  @TempDir Path folder;

  private Ran explain(String... more) {
    String[] arguments = new String[more.length + 2];
    arguments[0] = "explain";
    arguments[1] = folder.toString();
    System.arraycopy(more, 0, arguments, 2, more.length);
    return new Terminal().run(arguments);
  }

  private void write(String name, String text) throws Exception {
    Files.writeString(folder.resolve(name), text);
  }

  @Test
  void theOnePlanOfAFolderIsExplained() throws Exception {
    write("study-plan.yaml", Plans.TWO_MEANS);
    Ran ran = explain("main");
    assertEquals(0, ran.status(), ran.err());
    assertTrue(ran.out().startsWith("Reading aloud\n\nmain\n"), ran.out());
  }

  @Test
  void ofSeveralPlansOneMustBeNamed() throws Exception {
    write("a.study-plan.yaml", Plans.TWO_MEANS);
    write("b.study-plan.yaml", Plans.TWO_MEANS);
    Ran ran = explain();
    assertEquals(2, ran.status());
    assertTrue(ran.err().contains("holds 2 plans; name one, such as "), ran.err());
  }

  @Test
  void anUnknownAnalysisIsSaidWithTheNearOne() throws Exception {
    write("study-plan.yaml", Plans.TWO_MEANS);
    Ran ran = explain("mian");
    assertEquals(2, ran.status());
    assertEquals("holdfast: the plan has no analysis 'mian'; did you mean 'main'?\n", ran.err());
    assertTrue(explain("nothing").err().endsWith("it has main\n"));
  }

  @Test
  void aFileThatIsNoPlanIsReportedAsCheckDoes() throws Exception {
    write("study-plan.yaml", "format: holdfast-plan/1\n");
    Ran ran = explain();
    assertEquals(1, ran.status());
    assertTrue(ran.out().contains("blocks plan-invalid: "), ran.out());
  }
}
