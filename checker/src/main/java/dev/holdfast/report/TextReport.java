package dev.holdfast.report;

import dev.holdfast.check.ClaimResult;
import dev.holdfast.check.Fall;
import dev.holdfast.check.Finding;
import dev.holdfast.check.FindingKind;
import dev.holdfast.check.Headroom;
import dev.holdfast.check.Numbers;
import dev.holdfast.check.PlanReport;
import dev.holdfast.check.Weight;
import java.util.ArrayList;
import java.util.EnumMap;
import java.util.List;
import java.util.Map;

/**
 * The report for people: what no longer holds, what moved, what would mend it; then one line for
 * the whole run. What holds is not mentioned unless asked for.
 */
public final class TextReport {
  /** Findings of one kind that are written out in a run. */
  private static final int MOST_OF_A_KIND = 25;

  /** How much is written. */
  public enum Extent {
    /** Findings that block. */
    WHAT_BLOCKS,
    /** Findings that block or warn. */
    WHAT_MATTERS,
    /** Every finding, and every claim with its headroom. */
    EVERYTHING
  }

  private final Paint paint;
  private final Extent extent;

  /** A report in colours, or none, and to an extent. */
  public TextReport(Paint paint, Extent extent) {
    this.paint = paint;
    this.extent = extent;
  }

  /** The report of a run, each line ended. */
  public String write(List<PlanReport> reports) {
    StringBuilder text = new StringBuilder();
    Map<FindingKind, Integer> written = new EnumMap<>(FindingKind.class);
    for (PlanReport report : reports) {
      if (extent == Extent.EVERYTHING) {
        claims(report, text);
      }
      for (Finding finding : report.findings()) {
        if (shown(finding) && written.merge(finding.kind(), 1, Integer::sum) <= MOST_OF_A_KIND) {
          finding(report, finding, text);
        }
      }
    }
    written.forEach(
        (kind, count) -> {
          if (count > MOST_OF_A_KIND) {
            text.append("and ")
                .append(count - MOST_OF_A_KIND)
                .append(" more of ")
                .append(kind.word())
                .append("; the JSON report has them all\n");
          }
        });
    Tally tally = Tally.of(reports);
    String sentence = tally.sentence();
    text.append(tally.blocks() == 0 ? paint.good(sentence) : paint.bad(sentence));
    if (tally.notes() > 0 && extent != Extent.EVERYTHING) {
      text.append(" --verbose lists the notes.");
    }
    return text.append('\n').toString();
  }

  private boolean shown(Finding finding) {
    return switch (finding.weight()) {
      case BLOCKS -> true;
      case WARNS -> extent != Extent.WHAT_BLOCKS;
      case NOTES -> extent == Extent.EVERYTHING;
    };
  }

  /** A line that editors and runners can take apart, and indented lines for the reader. */
  private void finding(PlanReport report, Finding finding, StringBuilder text) {
    List<String> sentences = sentences(finding.message());
    String place =
        Safe.line(report.path()) + ":" + finding.place().line() + ":" + finding.place().column();
    text.append(paint.strong(place + ":"))
        .append(' ')
        .append(paint.weight(finding.weight()))
        .append(' ')
        .append(paint.strong(finding.kind().word() + ":"))
        .append(' ')
        .append(Safe.line(sentences.get(0)))
        .append('\n');
    for (String sentence : sentences.subList(1, sentences.size())) {
      text.append("    ").append(Safe.line(sentence)).append('\n');
    }
    moved(report, finding, text);
    String lead = finding.weight() == Weight.NOTES ? "perhaps: " : "to mend: ";
    for (String remedy : finding.remedies()) {
      text.append("    ").append(lead).append(Safe.line(remedy)).append('\n');
      lead = "     or: ";
    }
  }

  /** Where several figures moved, what the claim would be had each alone stayed. */
  private static void moved(PlanReport report, Finding finding, StringBuilder text) {
    report.claims().stream()
        .filter(result -> result.claim().figure().place().equals(finding.place()))
        .filter(result -> result.subject().equals(finding.subject()))
        .forEach(
            result ->
                result
                    .fall()
                    .map(Fall::moved)
                    .filter(moves -> moves.size() > 1)
                    .ifPresent(moves -> moves.forEach(move -> alone(result, move, text))));
  }

  private static void alone(ClaimResult result, Fall.Move move, StringBuilder text) {
    if (move.restores().isPresent()) {
      text.append("    had ")
          .append(Safe.line(move.name()))
          .append(" alone stayed at ")
          .append(Safe.line(move.from()))
          .append(": ")
          .append(Numbers.fixed(move.restores().getAsDouble(), result.decimals()))
          .append('\n');
    }
  }

  /** Splits where a sentence ends and another begins. */
  private static List<String> sentences(String message) {
    List<String> sentences = new ArrayList<>();
    int from = 0;
    for (int i = 0; i + 2 < message.length(); i++) {
      boolean ends = message.charAt(i) == '.' && message.charAt(i + 1) == ' ';
      if (ends && Character.isUpperCase(message.charAt(i + 2))) {
        sentences.add(message.substring(from, i + 1));
        from = i + 2;
      }
    }
    sentences.add(message.substring(from));
    return sentences;
  }

  private void claims(PlanReport report, StringBuilder text) {
    text.append(paint.strong(Safe.line(report.path())))
        .append("  ")
        .append(report.standing().word())
        .append('\n');
    for (ClaimResult result : report.claims()) {
      text.append("    ").append(Safe.line(claim(result))).append('\n');
      for (Headroom room : result.headroom()) {
        text.append("        ").append(Safe.line(headroom(result, room))).append('\n');
      }
    }
  }

  /** One line on a claim, with what the best method gives beside it. */
  private static String claim(ClaimResult result) {
    return plainClaim(result)
        + (result.best().isPresent()
            ? "; " + figure(result, result.best().getAsDouble()) + " by " + result.bestMethod()
            : "");
  }

  /** One line on a claim. */
  static String plainClaim(ClaimResult result) {
    String name = result.subject().substring(result.subject().indexOf('.') + 1);
    String number =
        result.caseNumber().isPresent() ? " case " + result.caseNumber().getAsInt() : "";
    String group = result.claim().group().map(each -> "." + each).orElse("");
    String computed =
        result.computed().isPresent()
            ? ", computed "
                + figure(result, result.computed().getAsDouble())
                + " by "
                + result.method()
            : ": " + result.explanation();
    return result.verdict().word()
        + "  "
        + name
        + number
        + ": "
        + result.claim().kind()
        + group
        + " "
        + result.claim().figure().written()
        + computed;
  }

  private static String figure(ClaimResult result, double value) {
    return switch (result.claim().kind()) {
      case "power", "every", "any" -> Numbers.chance(value, result.decimals());
      default -> Numbers.fixed(value, result.decimals());
    };
  }

  /** How far a quantity can move before a claim falls, or must move before it stands. */
  static String headroom(ClaimResult result, Headroom room) {
    boolean stands = result.verdict().stands();
    return (stands ? "stands while " : "would stand with ")
        + room.quantity()
        + (stands ? " is" : "")
        + (room.atMost() ? " at most " : " at least ")
        + Numbers.brief(room.limit())
        + " (now "
        + Numbers.brief(room.now())
        + ")";
  }
}
