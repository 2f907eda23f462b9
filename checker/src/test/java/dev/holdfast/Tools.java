package dev.holdfast;

import static org.junit.jupiter.api.Assertions.fail;
import static org.junit.jupiter.api.Assumptions.assumeTrue;

import java.io.File;
import java.util.Arrays;

/** Programs beside the JDK that some tests need. */
public final class Tools {
  private Tools() {}

  /** Skips the test where a program is not installed; fails it where {@code CI} is set. */
  public static void need(String program) {
    boolean installed =
        Arrays.stream(System.getenv("PATH").split(File.pathSeparator))
            .anyMatch(folder -> new File(folder, program).canExecute());
    if (!installed && System.getenv("CI") != null) {
      fail(program + " is not installed; .ci/run should have installed it");
    }
    assumeTrue(installed, program + " is not installed");
  }
}
