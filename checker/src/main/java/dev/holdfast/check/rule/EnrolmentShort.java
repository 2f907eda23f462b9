package dev.holdfast.check.rule;

import dev.holdfast.check.Finding;
import dev.holdfast.check.FindingKind;
import dev.holdfast.check.Losses;
import dev.holdfast.check.Numbers;
import dev.holdfast.check.Rule;
import dev.holdfast.check.StudyView;
import dev.holdfast.plan.Analysis;
import dev.holdfast.plan.Case;
import dev.holdfast.plan.Figure;
import dev.holdfast.plan.Place;
import dev.holdfast.plan.Recruitment;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;

/**
 * {@code enrolment-short}: after the loss that the plan expects, fewer remain than an analysis
 * needs. A plan that states {@code loss-by: multiplication} is held to that.
 */
final class EnrolmentShort implements Rule {
  @Override
  public List<Finding> look(StudyView view) {
    List<Shortage> found = new ArrayList<>();
    Recruitment recruitment = view.plan().recruitment().orElse(null);
    if (recruitment == null) {
      return List.of();
    }
    for (Analysis analysis : view.plan().analyses().values()) {
      double lost = Losses.of(view.plan(), analysis).map(Figure::value).orElse(0.0);
      if (!(lost >= 0 && lost < 1)) {
        continue;
      }
      for (Case each : analysis.cases()) {
        boolean multiplied =
            each.settings()
                .conventions()
                .of("loss-by")
                .filter("multiplication"::equals)
                .isPresent();
        double factor = multiplied ? 1 + lost : 1 / (1 - lost);
        if (recruitment.enrol().isPresent() && analysed(each) > 0) {
          compare(
              view, analysis, "", recruitment.enrol().get(), analysed(each), factor, lost, found);
        }
        recruitment
            .enrolByGroup()
            .forEach(
                (group, enrolled) -> {
                  Figure needed = each.sample().get(group);
                  if (needed != null) {
                    compare(
                        view,
                        analysis,
                        " in '" + group + "'",
                        enrolled,
                        needed.value(),
                        factor,
                        lost,
                        found);
                  }
                });
      }
    }
    return worst(found);
  }

  /** One finding for each number enrolled: that of the analysis that needs most. */
  private static List<Finding> worst(List<Shortage> all) {
    Map<Place, Shortage> most = new LinkedHashMap<>();
    for (Shortage each : all) {
      most.merge(
          each.finding().place(),
          each,
          (one, other) -> one.wanted() >= other.wanted() ? one : other);
    }
    return most.values().stream().map(Shortage::finding).toList();
  }

  private record Shortage(double wanted, Finding finding) {}

  private static double analysed(Case each) {
    return each.sample().values().stream().mapToDouble(Figure::value).sum();
  }

  private static void compare(
      StudyView view,
      Analysis analysis,
      String where,
      Figure enrolled,
      double needed,
      double factor,
      double lost,
      List<Shortage> found) {
    double wanted = needed * factor;
    if (enrolled.value() >= Math.floor(wanted + 1e-9)) {
      return;
    }
    Place place =
        enrolled
            .quantity()
            .map(name -> view.plan().quantities().get(name).figure().place())
            .orElse(enrolled.place());
    found.add(
        new Shortage(
            wanted,
            Finding.of(
                FindingKind.ENROLMENT_SHORT,
                "recruitment",
                place,
                "Enrolling "
                    + enrolled.written()
                    + where
                    + " with a loss of "
                    + Numbers.brief(lost)
                    + " leaves "
                    + Numbers.count(Math.floor(enrolled.value() / factor + 1e-9))
                    + "; "
                    + analysis.name()
                    + " analyses "
                    + Numbers.count(needed)
                    + ".",
                "enrol " + Numbers.count(Math.ceil(wanted - 1e-9)) + where)));
  }
}
