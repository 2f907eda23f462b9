package dev.holdfast.report;

import dev.holdfast.check.PlanReport;
import dev.holdfast.check.Weight;
import java.util.ArrayList;
import java.util.List;

/**
 * Counts over a run.
 *
 * @param plans number of plans
 * @param hold number that hold
 * @param blocks number of findings that block
 * @param warns number that warn
 * @param notes number of notes
 */
public record Tally(long plans, long hold, long blocks, long warns, long notes) {
  /** Counts reports. */
  public static Tally of(List<PlanReport> reports) {
    return new Tally(
        reports.size(),
        reports.stream().filter(report -> report.standing() == PlanReport.Standing.HOLDS).count(),
        sum(reports, Weight.BLOCKS),
        sum(reports, Weight.WARNS),
        sum(reports, Weight.NOTES));
  }

  private static long sum(List<PlanReport> reports, Weight weight) {
    return reports.stream().mapToLong(report -> report.count(weight)).sum();
  }

  /** The closing sentence of a run; counts of nothing are left out. */
  public String sentence() {
    if (plans == 0) {
      return "No plan was checked.";
    }
    String findings = findings();
    if (plans == hold) {
      return count(plans, "plan holds", "plans hold")
          + (findings.isEmpty() ? "" : "; " + findings)
          + ".";
    }
    long not = plans - hold;
    String standing =
        plans == 1
            ? "1 plan, and it does not hold"
            : plans
                + " plans: "
                + count(hold, "holds", "hold")
                + ", "
                + count(not, "does", "do")
                + " not";
    return standing + (findings.isEmpty() ? "" : "; " + findings) + ".";
  }

  private String findings() {
    List<String> parts = new ArrayList<>();
    if (blocks > 0) {
      parts.add(count(blocks, "finding blocks", "findings block"));
    }
    if (warns > 0) {
      parts.add(
          blocks > 0
              ? count(warns, "warns", "warn")
              : count(warns, "finding warns", "findings warn"));
    }
    if (notes > 0) {
      parts.add(count(notes, "note", "notes"));
    }
    return String.join(", ", parts);
  }

  private static String count(long number, String one, String many) {
    return number + " " + (number == 1 ? one : many);
  }
}
