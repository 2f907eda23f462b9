package dev.holdfast.check.rule;

import dev.holdfast.check.Finding;
import dev.holdfast.check.FindingKind;
import dev.holdfast.check.Rule;
import dev.holdfast.check.Situation;
import dev.holdfast.check.StudyView;
import dev.holdfast.design.Arms;
import dev.holdfast.design.Cell;
import dev.holdfast.design.Scale;
import dev.holdfast.plan.Analysis;
import dev.holdfast.plan.Outcome;
import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Set;
import java.util.stream.Collectors;

/**
 * {@code test-unfit}: the test does not serve the outcome's scale, or not as many groups as the
 * sample has.
 */
final class TestUnfit implements Rule {
  @Override
  public List<Finding> look(StudyView view) {
    List<Finding> found = new ArrayList<>();
    Set<String> seen = new HashSet<>();
    for (Situation situation : view.situations()) {
      if (situation.cell().isEmpty()) {
        continue;
      }
      Analysis analysis = situation.analysis();
      Cell cell = situation.cell().get();
      Outcome outcome = view.plan().outcomes().get(analysis.outcome().text());
      boolean fits = cell.scales().stream().map(Scale::word).anyMatch(outcome.scale()::equals);
      if (!fits && seen.add(analysis.name())) {
        found.add(
            Finding.of(
                FindingKind.TEST_UNFIT,
                situation.subject(),
                analysis.test().place(),
                "The test "
                    + analysis.test()
                    + " is for outcomes that are "
                    + cell.scales().stream()
                        .map(Scale::word)
                        .sorted()
                        .collect(Collectors.joining(" or "))
                    + "; '"
                    + outcome.name()
                    + "' is "
                    + outcome.scale()
                    + ".",
                "choose a test for a " + outcome.scale() + " outcome: see 'holdfast catalogue'"));
      }
      groups(situation, cell, found);
    }
    return found;
  }

  private static void groups(Situation situation, Cell cell, List<Finding> found) {
    int count = situation.situation().sample().size();
    Arms arms = cell.arms();
    if (!situation.countsEvents() && count > 0 && (count < arms.least() || count > arms.most())) {
      String takes =
          arms.least() == arms.most()
              ? arms.least() + (arms.least() == 1 ? " entry" : " groups")
              : "from " + arms.least() + " groups on";
      found.add(
          Finding.of(
              FindingKind.TEST_UNFIT,
              situation.subject(),
              situation.analysis().test().place(),
              "The test "
                  + situation.analysis().test()
                  + " takes "
                  + takes
                  + "; the sample has "
                  + count
                  + ".",
              "name the groups compared under sample",
              "choose a test for " + count + " groups"));
    }
  }
}
