package dev.holdfast.check.rule;

import dev.holdfast.check.ClaimResult;
import dev.holdfast.check.Fall;
import dev.holdfast.check.Headroom;
import dev.holdfast.check.Numbers;
import dev.holdfast.check.Situation;
import dev.holdfast.check.StudyView;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/** Phrases that several rules use of claims. */
final class Wording {
  private Wording() {}

  /** The claim as the plan makes it: {@code power 0.90}, {@code at least 0.8}. */
  static String claimed(ClaimResult result) {
    String relation =
        switch (result.claim().relation()) {
          case IS -> "";
          case AT_LEAST -> "at least ";
          case ABOUT -> "about ";
        };
    return kind(result) + " " + relation + result.claim().figure().written();
  }

  /** What is claimed, without its figure. */
  static String kind(ClaimResult result) {
    String group = result.claim().group().map(name -> " of '" + name + "'").orElse("");
    return switch (result.claim().kind()) {
      case "power" -> "power";
      case "total" -> "a total of";
      case "sample" -> "a sample" + group + " of";
      case "enrol" -> "enrolment of";
      case "events" -> "a number of events of";
      case "detectable" -> "a detectable effect of";
      case "every" -> "a chance that every analysis succeeds of";
      case "any" -> "a chance that any analysis succeeds of";
      case "expected" -> "an expected number of successes of";
      default -> result.claim().kind();
    };
  }

  /** The name of what the claim belongs to, with the number of its case. */
  static String owner(ClaimResult result) {
    String name = result.subject().substring(result.subject().indexOf('.') + 1);
    return result.caseNumber().isPresent()
        ? name + " (case " + result.caseNumber().getAsInt() + ")"
        : name;
  }

  /** What was computed, as it is shown. */
  static String computed(ClaimResult result) {
    return number(result, result.computed().orElseThrow());
  }

  static String number(ClaimResult result, double value) {
    return switch (result.claim().kind()) {
      case "power", "every", "any" -> Numbers.chance(value, result.decimals());
      default -> Numbers.fixed(value, result.decimals());
    };
  }

  /** What the claim was at an earlier revision and what moved since; empty if nothing is known. */
  static String fall(ClaimResult result) {
    Optional<Fall> fall = result.fall();
    if (fall.isEmpty()) {
      return "";
    }
    StringBuilder text = new StringBuilder();
    text.append(" At ")
        .append(fall.get().revision())
        .append(" it was ")
        .append(number(result, fall.get().before()));
    List<String> moves = new ArrayList<>();
    for (Fall.Move move : fall.get().moved()) {
      String from = move.from().isEmpty() ? "nothing" : move.from();
      String to = move.to().isEmpty() ? "nothing" : move.to();
      moves.add(
          move.name()
              + " moved from "
              + from
              + " to "
              + to
              + " (line "
              + move.place().line()
              + ")");
    }
    if (!moves.isEmpty()) {
      text.append("; since then ").append(String.join(", ", moves));
    }
    return text.append(".").toString();
  }

  /** What would make a claim stand again. */
  static List<String> remedies(StudyView view, ClaimResult result) {
    List<String> remedies = new ArrayList<>();
    result
        .fall()
        .map(Fall::moved)
        .filter(moved -> moved.size() == 1 && !moved.get(0).from().isEmpty())
        .map(moved -> moved.get(0))
        .filter(move -> move.restores().isPresent())
        .ifPresent(move -> remedies.add("restore " + move.name() + " to " + move.from()));
    for (Headroom room : result.headroom()) {
      remedies.add(
          room.quantity()
              + (room.atMost() ? " at most " : " at least ")
              + Numbers.brief(room.limit())
              + " (now "
              + Numbers.brief(room.now())
              + ")");
    }
    if (result.claim().kind().equals("power")) {
      situation(view, result)
          .flatMap(each -> sample(each, result.claim().figure().value()))
          .ifPresent(remedies::add);
    }
    result
        .computed()
        .ifPresent(value -> remedies.add("claim " + number(result, value) + " instead"));
    return remedies;
  }

  private static Optional<String> sample(Situation situation, double power) {
    if (!(power > 0 && power < 1)) {
      return Optional.empty();
    }
    return situation
        .least(power)
        .map(
            found -> {
              List<String> sizes = new ArrayList<>();
              for (double size : found.ratioKept()) {
                sizes.add(Numbers.count(size));
              }
              return (situation.countsEvents() ? "events: " : "a sample of ")
                  + String.join(" + ", sizes);
            });
  }

  /** The case that a claim belongs to; empty for a family's. */
  static Optional<Situation> situation(StudyView view, ClaimResult result) {
    return view.situations().stream()
        .filter(each -> each.subject().equals(result.subject()))
        .filter(each -> each.number().equals(result.caseNumber()))
        .findFirst();
  }
}
