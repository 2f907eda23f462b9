package dev.holdfast.check;

import static org.junit.jupiter.api.Assertions.assertEquals;

import org.junit.jupiter.api.Test;

/** A test of several groups is not computed for a number of groups that the plan does not state. */
class GroupCountTest {
  private static Verdict verdict(String groups) {
    return Plans.claim(
            Plans.check(
                Plans.analysis(
                    "continuous",
                    """
                    arrangement: parallel-groups
                    test: anova-f
                    target-power: 0.80
                    effect: { f: 0.25 }
                    %s
                    claims: { total: 159 }
                    """
                        .formatted(groups))),
            "total")
        .verdict();
  }

  @Test
  void withoutGroupsTheTotalIsNotComputed() {
    assertEquals(Verdict.NOT_COMPUTED, verdict("question: Do the means differ?"));
  }

  @Test
  void withTheGroupsOfAnAllocationItIs() {
    // Cohen (1988), Table 8.4: 52 a group at f = 0.25 and three groups; the least total is 159.
    assertEquals(Verdict.HOLDS, verdict("allocation: { dawn: 1, noon: 1, dusk: 1 }"));
  }
}
