package dev.holdfast.check;

import dev.holdfast.plan.Case;
import dev.holdfast.plan.Figure;
import dev.holdfast.plan.Place;
import dev.holdfast.plan.Plan;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;

/**
 * Says of a claim that no longer stands what it was at an earlier revision of the plan, and which
 * figures moved. Each figure's share is told by what the claim would be had it alone not moved.
 */
final class Comparison {
  private final Plan now;
  private final Plan before;
  private final String revision;
  private final List<ClaimResult> resultsBefore;
  private final List<Situation> situationsBefore;
  private final Situations situations;
  private final Judge judge;

  Comparison(
      Plan now,
      Plan before,
      String revision,
      List<ClaimResult> resultsBefore,
      List<Situation> situationsBefore,
      Situations situations,
      Judge judge) {
    this.now = now;
    this.before = before;
    this.revision = revision;
    this.resultsBefore = resultsBefore;
    this.situationsBefore = situationsBefore;
    this.situations = situations;
    this.judge = judge;
  }

  Optional<Fall> fall(ClaimResult result, Situation situation) {
    if (result.verdict().stands()) {
      return Optional.empty();
    }
    Optional<ClaimResult> earlier =
        resultsBefore.stream().filter(other -> same(other, result)).findFirst();
    if (earlier.isEmpty()
        || !earlier.get().verdict().stands()
        || earlier.get().computed().isEmpty()) {
      return Optional.empty();
    }
    List<Fall.Move> moves = new ArrayList<>();
    situationsBefore.stream()
        .filter(
            other ->
                other.subject().equals(situation.subject())
                    && other.number().equals(situation.number()))
        .findFirst()
        .ifPresent(
            other -> {
              moves.addAll(figures(result, situation, other));
              moves.addAll(words(situation, other));
            });
    Figure claimedThen = earlier.get().claim().figure();
    Figure claimedNow = result.claim().figure();
    if (claimedThen.value() != claimedNow.value()) {
      moves.add(
          new Fall.Move(
              "the claim itself",
              claimedThen.written(),
              claimedNow.written(),
              OptionalDouble.empty(),
              claimedNow.place()));
    }
    double computedNow = result.computed().orElse(Double.NaN);
    moves.sort(
        Comparator.comparingDouble(
            (Fall.Move move) -> -Math.abs(move.restores().orElse(computedNow) - computedNow)));
    return Optional.of(new Fall(revision, earlier.get().computed().getAsDouble(), moves));
  }

  private static boolean same(ClaimResult one, ClaimResult other) {
    return one.subject().equals(other.subject())
        && one.caseNumber().equals(other.caseNumber())
        && one.claim().kind().equals(other.claim().kind())
        && one.claim().group().equals(other.claim().group());
  }

  private List<Fall.Move> figures(ClaimResult result, Situation situation, Situation other) {
    Map<String, Figure> then = Figures.of(before, other.analysis(), other.situation());
    Map<String, Figure> present = Figures.of(now, situation.analysis(), situation.situation());
    Map<String, Fall.Move> moves = new LinkedHashMap<>();
    present.forEach(
        (path, figure) -> {
          Figure old = then.get(path);
          if (old == null) {
            moves.put(path, move(path, "", figure, OptionalDouble.empty()));
          } else if (old.value() != figure.value()) {
            String name = figure.quantity().orElse(path);
            moves.computeIfAbsent(
                name,
                key -> move(key, old.written(), figure, restored(result, situation, figure, old)));
          }
        });
    then.forEach(
        (path, figure) -> {
          if (!present.containsKey(path)) {
            moves.put(
                path,
                new Fall.Move(
                    path,
                    figure.written(),
                    "",
                    OptionalDouble.empty(),
                    result.claim().figure().place()));
          }
        });
    return List.copyOf(moves.values());
  }

  private Fall.Move move(String name, String from, Figure figure, OptionalDouble restores) {
    return new Fall.Move(name, from, figure.written(), restores, definition(figure));
  }

  /** A quantity moved where it is defined, not where it is named. */
  private Place definition(Figure figure) {
    return figure
        .quantity()
        .map(name -> now.quantities().get(name))
        .map(quantity -> quantity.figure().place())
        .orElse(figure.place());
  }

  private OptionalDouble restored(
      ClaimResult result, Situation situation, Figure figure, Figure old) {
    Situation moved =
        situations.again(now, situation, Overrides.of(Overrides.key(figure), old.value()));
    return judge.judge(moved, result.claim()).computed();
  }

  private static List<Fall.Move> words(Situation situation, Situation other) {
    List<Fall.Move> moves = new ArrayList<>();
    Case present = situation.situation();
    Case then = other.situation();
    compare(
        moves,
        "test",
        other.analysis().test().text(),
        situation.analysis().test().text(),
        situation);
    compare(
        moves,
        "arrangement",
        other.analysis().arrangement().text(),
        situation.analysis().arrangement().text(),
        situation);
    compare(
        moves,
        "sides",
        then.settings().sides().map(Object::toString).orElse(""),
        present.settings().sides().map(Object::toString).orElse(""),
        situation);
    for (String key :
        List.of(
            "reference",
            "variance",
            "continuity",
            "events-by",
            "loss-by",
            "rounding",
            "z-rounded-to")) {
      compare(
          moves,
          "conventions." + key,
          then.settings().conventions().of(key).orElse(""),
          present.settings().conventions().of(key).orElse(""),
          situation);
    }
    return moves;
  }

  private static void compare(
      List<Fall.Move> moves, String name, String from, String to, Situation situation) {
    if (!from.equals(to)) {
      moves.add(
          new Fall.Move(name, from, to, OptionalDouble.empty(), situation.analysis().place()));
    }
  }
}
