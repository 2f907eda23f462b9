package dev.holdfast.check.rule;

import dev.holdfast.check.Finding;
import dev.holdfast.check.FindingKind;
import dev.holdfast.check.Losses;
import dev.holdfast.check.Rule;
import dev.holdfast.check.StudyView;
import dev.holdfast.check.Weight;
import dev.holdfast.plan.Analysis;
import dev.holdfast.plan.Figure;
import dev.holdfast.plan.Input;
import dev.holdfast.plan.Place;
import dev.holdfast.plan.Quantity;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;

/**
 * {@code source-missing}: an effect or its spread is a bare number, or a quantity without a source.
 * A loss without a source warns.
 */
final class SourceMissing implements Rule {
  @Override
  public List<Finding> look(StudyView view) {
    Map<Place, Finding> found = new LinkedHashMap<>();
    Map<Place, Assumed.Assumption> bare = new LinkedHashMap<>();
    for (Assumed.Assumption assumption : Assumed.of(view)) {
      Figure figure = assumption.figure();
      if (figure.quantity().isEmpty()) {
        bare.putIfAbsent(section(view, assumption), assumption);
      } else {
        sourceless(view, figure, FindingKind.SOURCE_MISSING.weight(), found);
      }
    }
    bare.forEach(
        (place, assumption) ->
            found.put(
                place,
                Finding.of(
                    FindingKind.SOURCE_MISSING,
                    assumption.subject(),
                    place,
                    assumption.subject().substring(assumption.subject().indexOf('.') + 1)
                        + " assumes "
                        + assumption.key()
                        + " as a bare number, without a source.",
                    "make it a quantity with its source, and name the quantity here")));
    for (Analysis analysis : view.plan().analyses().values()) {
      Losses.of(view.plan(), analysis)
          .filter(figure -> figure.quantity().isPresent())
          .ifPresent(figure -> sourceless(view, figure, Weight.WARNS, found));
    }
    return new ArrayList<>(found.values());
  }

  /** One finding for all the bare numbers of one input. */
  private static Place section(StudyView view, Assumed.Assumption assumption) {
    return view.situations().stream()
        .filter(each -> each.subject().equals(assumption.subject()))
        .map(each -> each.situation().effect().get(assumption.key()))
        .filter(input -> input != null && holds(input, assumption.figure()))
        .map(Input::place)
        .findFirst()
        .orElse(assumption.figure().place());
  }

  private static boolean holds(Input input, Figure figure) {
    return figure.place().pointer().startsWith(input.place().pointer());
  }

  private static void sourceless(
      StudyView view, Figure figure, Weight weight, Map<Place, Finding> found) {
    Quantity quantity = view.plan().quantities().get(figure.quantity().orElseThrow());
    if (quantity.source().isEmpty()) {
      found.putIfAbsent(
          quantity.place(),
          new Finding(
              FindingKind.SOURCE_MISSING,
              weight,
              "quantities." + quantity.name(),
              "The quantity '" + quantity.name() + "' has no source.",
              List.of("say where it comes from, under source"),
              quantity.place()));
    }
  }
}
