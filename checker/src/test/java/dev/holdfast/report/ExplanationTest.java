package dev.holdfast.report;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import dev.holdfast.check.Derivations;
import dev.holdfast.check.Plans;
import dev.holdfast.design.Bibliography;
import dev.holdfast.design.catalogue.Catalogue;
import dev.holdfast.plan.Plan;
import dev.holdfast.plan.PlanReading;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class ExplanationTest {
  private static String explain(String yaml) {
    PlanReading reading = Plans.read(yaml);
    Plan plan = reading.plan().orElseThrow(() -> new AssertionError(reading.problems()));
    return new Explanation(new Derivations(Catalogue.standard()), Bibliography.standard())
        .write(plan, Plans.checker(true).check(reading), List.copyOf(plan.analyses().keySet()));
  }

  @Test
  void theFigureIsDerivedStepByStepWithItsNumbersPutIn() {
    String text = explain(Plans.TWO_MEANS);
    for (String part :
        List.of(
            "two parallel groups, Student's t test (parallel-groups/student-t)",
            "alpha 0.05, two sides",
            "difference = 5 points  (gain, line 5; smallest-worthwhile: agreed)",
            "d = difference/SD\n        = 5/10  = 0.5\n",
            "delta = d*sqrt(n1*n2/(n1 + n2))\n        = 0.5*sqrt(64*64/(64 + 64))  = 2.82843\n",
            "= 64 + 64 - 2  = 126\n",
            "= 1.97897\n",
            "= 0.80146\n",
            "reference: Owen, D. B. (1965).",
            "least       for a power of 0.8: 64 + 64, 127.531 in all before rounding\n",
            "by the normal approximation: 0.8074\n",
            "stands while score-sd is at most 10.08 (now 10)")) {
      assertTrue(text.contains(part), () -> part + " is not in\n" + text);
    }
  }

  @Test
  void thePowerIsSaidInPlainFrequencies() {
    String text = explain(Plans.TWO_MEANS);
    assertTrue(
        text.contains(
            "Of 100 such studies, if the effect is as assumed, 80 find it and 20 miss it;\n"
                + "              if there is no effect, 5 in 100 claim one all the same.\n"),
        text);
  }

  @Test
  void aPowerNearOneIsNotSaidToBeCertain() {
    String high = explain(Plans.TWO_MEANS.replace("value: 5,", "value: 8.5,"));
    assertTrue(high.contains("Of 1000 such studies, if the effect is as assumed, 998 find"), high);
    assertTrue(high.contains("50 in 1000 claim one all the same"), high);
    String higher = explain(Plans.TWO_MEANS.replace("value: 5,", "value: 12,"));
    assertTrue(higher.contains("more than 999 find it and fewer than 1 miss it"), higher);
  }

  @ParameterizedTest
  @CsvSource({
    "humans, the ethics board and the regulator decide",
    "animals, the animal-welfare board decide",
  })
  void whereSomeoneCanBeHarmedItDefersToThoseWhoDecide(String participants, String who) {
    String text = explain(Plans.TWO_MEANS.replace("humans", participants));
    assertTrue(text.contains("no ethical or regulatory approval"), text);
    assertTrue(text.contains(who), text);
    assertTrue(text.contains("the responsible statistician"), text);
  }

  @Test
  void whereNobodyCanBeHarmedItDoesNotSaySo() {
    assertFalse(explain(Plans.TWO_MEANS.replace("humans", "simulated")).contains("approval"));
  }

  @Test
  void aClaimThatIsNotComputedSaysWhatIsMissing() {
    String text = explain(Plans.TWO_MEANS.replace(", sd: score-sd", ""));
    assertTrue(text.contains("not-computed  main: power 0.80"), text);
    assertTrue(text.contains("main: power 0.80: the SD (sd, or sds by group) is not given"), text);
  }

  @Test
  void hostileTextOfThePlanIsMadeHarmless() {
    String text =
        explain(
            Plans.TWO_MEANS.replace(
                "title: Reading aloud", "title: \"::error::a\\e[2J\\n##[group]b\""));
    assertTrue(
        text.lines().noneMatch(line -> line.strip().startsWith("::") || line.contains("##[")),
        text);
    assertTrue(text.chars().allMatch(c -> c == '\n' || c >= ' '), text);
  }

  @Test
  void theSameTextComesEveryTime() {
    assertEquals(explain(Plans.TWO_MEANS), explain(Plans.TWO_MEANS));
  }
}
