package dev.holdfast.check.rule;

import dev.holdfast.check.Finding;
import dev.holdfast.check.FindingKind;
import dev.holdfast.check.Numbers;
import dev.holdfast.check.Rule;
import dev.holdfast.check.Situation;
import dev.holdfast.check.StudyView;
import dev.holdfast.plan.Claim;
import dev.holdfast.plan.Figure;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;

/**
 * {@code cases-contradict}: figures of the plan contradict each other whatever the method: sizes by
 * group that do not add up to the total claimed, sizes claimed that are not those of the sample, or
 * a grid of cases whose claimed powers go the other way than their assumptions.
 */
final class CasesContradict implements Rule {
  @Override
  public List<Finding> look(StudyView view) {
    List<Finding> found = new ArrayList<>();
    for (Situation situation : view.situations()) {
      sums(situation, found);
    }
    for (String name : view.plan().analyses().keySet()) {
      List<Situation> cases =
          view.situations().stream().filter(each -> each.analysis().name().equals(name)).toList();
      order(cases, found);
    }
    return found;
  }

  private static void sums(Situation situation, List<Finding> found) {
    Map<String, Figure> sample = situation.situation().sample();
    if (sample.isEmpty()) {
      return;
    }
    double sum = sample.values().stream().mapToDouble(Figure::value).sum();
    for (Claim claim : situation.situation().claims()) {
      if (claim.kind().equals("total")
          && claim.relation() == Claim.Relation.IS
          && claim.figure().value() != sum) {
        found.add(
            finding(
                situation,
                claim,
                situation.analysis().name()
                    + " claims a total of "
                    + claim.figure().written()
                    + "; its sample adds up to "
                    + Numbers.count(sum)
                    + "."));
      }
      Figure own = claim.group().map(sample::get).orElse(null);
      if (claim.kind().equals("sample") && own != null && claim.figure().value() != own.value()) {
        found.add(
            finding(
                situation,
                claim,
                situation.analysis().name()
                    + " claims "
                    + claim.figure().written()
                    + " in '"
                    + claim.group().orElseThrow()
                    + "'; its sample has "
                    + own.written()
                    + "."));
      }
    }
  }

  /** Of two cases, the one with more power by computation must not claim clearly less. */
  private static void order(List<Situation> cases, List<Finding> found) {
    for (int i = 0; i < cases.size(); i++) {
      for (int j = i + 1; j < cases.size(); j++) {
        Situation one = cases.get(i);
        Situation other = cases.get(j);
        if (one.hasPower() && other.hasPower()) {
          Claim first = power(one);
          Claim second = power(other);
          if (first != null
              && second != null
              && (one.power() - other.power()) * (first.figure().value() - second.figure().value())
                  < 0
              && differ(one.power(), other.power(), first, second)) {
            found.add(
                finding(
                    other,
                    second,
                    other.analysis().name()
                        + " claims power "
                        + first.figure().written()
                        + " in case "
                        + (i + 1)
                        + " and "
                        + second.figure().written()
                        + " in case "
                        + (j + 1)
                        + ", but their assumptions put the two in the other order."));
          }
        }
      }
    }
  }

  private static boolean differ(double one, double other, Claim first, Claim second) {
    int decimals = Math.min(first.figure().decimals(), second.figure().decimals());
    return Numbers.round(one, decimals) != Numbers.round(other, decimals);
  }

  private static Claim power(Situation situation) {
    return situation.situation().claims().stream()
        .filter(claim -> claim.kind().equals("power"))
        .filter(claim -> claim.relation() == Claim.Relation.IS)
        .findFirst()
        .orElse(null);
  }

  private static Finding finding(Situation situation, Claim claim, String message) {
    return Finding.of(
        FindingKind.CASES_CONTRADICT,
        situation.subject(),
        claim.figure().place(),
        message,
        "correct the figure that is wrong");
  }
}
