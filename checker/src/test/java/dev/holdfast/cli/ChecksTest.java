package dev.holdfast.cli;

import static org.junit.jupiter.api.Assertions.assertEquals;

import dev.holdfast.check.Plans;
import dev.holdfast.plan.PlanReader;
import dev.holdfast.plan.Schemas;
import java.nio.charset.StandardCharsets;
import java.nio.file.AccessDeniedException;
import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;

class ChecksTest {
  private static Job job(String path, Job.Content content) {
    return new Job(path, content, Optional.empty());
  }

  private static byte[] plan() {
    return Plans.TWO_MEANS.getBytes(StandardCharsets.UTF_8);
  }

  @Test
  void neitherAnUnreadableFileNorAFaultStopsTheOtherPlans() {
    Checks.Outcome outcome =
        new Checks(new PlanReader(new Schemas()), Plans.checker(false), 2)
            .of(
                List.of(
                    job("a", ChecksTest::plan),
                    job(
                        "b",
                        () -> {
                          throw new AccessDeniedException("b");
                        }),
                    job(
                        "c",
                        () -> {
                          throw new IllegalArgumentException("broken");
                        }),
                    job("d", ChecksTest::plan)));
    assertEquals(List.of("a", "d"), outcome.reports().stream().map(each -> each.path()).toList());
    assertEquals(List.of("b may not be read with the present rights"), outcome.failures());
    assertEquals(1, outcome.faults().size());
    assertEquals(
        "c: java.lang.IllegalArgumentException: broken", outcome.faults().get(0).getMessage());
  }

  @Test
  void noPlanIsNoReport() {
    Checks.Outcome outcome =
        new Checks(new PlanReader(new Schemas()), Plans.checker(false), 4).of(List.of());
    assertEquals(new Checks.Outcome(List.of(), List.of(), List.of()), outcome);
  }
}
