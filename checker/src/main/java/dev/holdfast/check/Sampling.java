package dev.holdfast.check;

import dev.holdfast.design.Allocation;
import dev.holdfast.design.Arms;
import dev.holdfast.design.Cell;
import dev.holdfast.design.Unit;
import dev.holdfast.plan.Case;
import dev.holdfast.plan.Claim;
import dev.holdfast.plan.Figure;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/**
 * The sample of a case: as given, or as claimed where the plan gives it only so.
 *
 * @param groups names of the groups, in the order of the file; empty when none is named
 * @param weights relative sizes of the groups, in the same order
 * @param allocation ratio of the groups, as the cell takes it
 * @param sizes numbers analysed by group, or the number of events; empty when not given, or when
 *     the test does not exist at them
 * @param missing what is wrong with the sample
 */
record Sampling(
    List<String> groups,
    List<Double> weights,
    Allocation allocation,
    Optional<double[]> sizes,
    List<Missing> missing) {

  /** The sample of a case without a cell: names and ratios only. */
  static Sampling bare(Case each, Overrides overrides) {
    return new Sampling(
        groups(each), weights(each, overrides), Allocation.equal(1), Optional.empty(), List.of());
  }

  /** The sample of a case as its cell takes it. */
  static Sampling of(Case each, Cell cell, Overrides overrides) {
    List<Double> weights = weights(each, overrides);
    List<Missing> missing = new ArrayList<>();
    Allocation allocation = Allocation.equal(1);
    Optional<double[]> sizes;
    Arms arms = cell.arms();
    if (arms.unit() == Unit.EVENTS) {
      sizes = events(each, overrides).map(value -> new double[] {value});
    } else {
      int count = weights.isEmpty() ? arms.least() : weights.size();
      if (weights.isEmpty() && arms.least() < arms.most()) {
        missing.add(
            new Missing(
                "how many groups are compared is not given",
                "name them under sample, or under allocation"));
      } else if (isOutside(cell, count)) {
        missing.add(
            new Missing(
                "the test takes " + armsWords(cell) + " and the sample has " + count,
                "name the groups compared, or choose a test for " + count));
      }
      allocation = weights.isEmpty() ? Allocation.equal(count) : Allocation.of(weights);
      sizes = sizes(each, allocation, overrides);
    }
    if (sizes.isPresent() && isTooSmall(sizes.get(), cell)) {
      missing.add(
          new Missing(
              "a group has fewer than " + arms.smallest() + " " + arms.unit().word(2),
              "enlarge it"));
      sizes = Optional.empty();
    }
    return new Sampling(groups(each), weights, allocation, sizes, missing);
  }

  private static boolean isOutside(Cell cell, int count) {
    return count < cell.arms().least() || count > cell.arms().most();
  }

  private static String armsWords(Cell cell) {
    int least = cell.arms().least();
    int most = cell.arms().most();
    if (least == most) {
      return least == 1 ? "one group" : least + " groups";
    }
    return most == Integer.MAX_VALUE
        ? least + " or more groups"
        : least + " to " + most + " groups";
  }

  private static boolean isTooSmall(double[] sizes, Cell cell) {
    for (double size : sizes) {
      if (size < cell.arms().smallest()) {
        return true;
      }
    }
    return false;
  }

  private static List<String> groups(Case each) {
    if (!each.sample().isEmpty()) {
      return List.copyOf(each.sample().keySet());
    }
    if (!each.allocation().isEmpty()) {
      return List.copyOf(each.allocation().keySet());
    }
    return each.claims().stream().flatMap(claim -> claim.group().stream()).toList();
  }

  private static List<Double> weights(Case each, Overrides overrides) {
    if (!each.sample().isEmpty()) {
      return values(each.sample(), overrides);
    }
    if (!each.allocation().isEmpty()) {
      return values(each.allocation(), overrides);
    }
    return each.claims().stream()
        .filter(claim -> claim.group().isPresent())
        .map(claim -> overrides.value(claim.figure()))
        .toList();
  }

  private static List<Double> values(Map<String, Figure> figures, Overrides overrides) {
    return figures.values().stream().map(overrides::value).toList();
  }

  /** Sizes as given, or as claimed where the plan gives them only so. */
  private static Optional<double[]> sizes(Case each, Allocation allocation, Overrides overrides) {
    if (!each.sample().isEmpty()) {
      return Optional.of(each.sample().values().stream().mapToDouble(overrides::value).toArray());
    }
    double[] claimed =
        each.claims().stream()
            .filter(claim -> claim.kind().equals("sample"))
            .mapToDouble(claim -> overrides.value(claim.figure()))
            .toArray();
    if (claimed.length > 0) {
      return Optional.of(claimed);
    }
    return claimedFigure(each, "total", overrides)
        .map(total -> allocation.split(Math.round(total)));
  }

  private static Optional<Double> events(Case each, Overrides overrides) {
    return each.events().isPresent()
        ? each.events().map(overrides::value)
        : claimedFigure(each, "events", overrides);
  }

  private static Optional<Double> claimedFigure(Case each, String kind, Overrides overrides) {
    return each.claims().stream()
        .filter(claim -> claim.kind().equals(kind))
        .map(Claim::figure)
        .map(overrides::value)
        .findFirst();
  }
}
