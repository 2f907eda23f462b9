package dev.holdfast.design.catalogue;

import dev.holdfast.design.Cell;
import dev.holdfast.design.association.LinearRegression;
import dev.holdfast.design.association.PearsonCorrelation;
import dev.holdfast.design.binary.OneShareExact;
import dev.holdfast.design.binary.OneShareNormal;
import dev.holdfast.design.binary.PairedSharesMcNemar;
import dev.holdfast.design.binary.TwoSharesArcsine;
import dev.holdfast.design.binary.TwoSharesChiSquare;
import dev.holdfast.design.binary.TwoSharesFisher;
import dev.holdfast.design.binary.TwoSharesNormal;
import dev.holdfast.design.categories.CategoriesFit;
import dev.holdfast.design.categories.GroupsHomogeneity;
import dev.holdfast.design.categories.TableIndependence;
import dev.holdfast.design.continuous.GroupMeansAnova;
import dev.holdfast.design.continuous.OneMeanNormal;
import dev.holdfast.design.continuous.OneMeanStudent;
import dev.holdfast.design.continuous.PairedMeansNormal;
import dev.holdfast.design.continuous.PairedMeansStudent;
import dev.holdfast.design.continuous.ParallelMeansNormal;
import dev.holdfast.design.continuous.ParallelMeansStudent;
import dev.holdfast.design.continuous.ParallelMeansWelch;
import dev.holdfast.design.times.ParallelTimesLogRank;
import java.util.List;
import java.util.Optional;

/** The grid: every cell there is, in the order in which it is printed. */
public final class Catalogue {
  private final List<Cell> cells;

  private Catalogue(List<Cell> cells) {
    this.cells = cells;
  }

  /** All cells of the program. A new cell is entered here. */
  public static Catalogue standard() {
    return new Catalogue(
        List.of(
            new OneMeanStudent(),
            new OneMeanNormal(),
            new PairedMeansStudent(),
            new PairedMeansNormal(),
            new ParallelMeansStudent(),
            new ParallelMeansWelch(),
            new ParallelMeansNormal(),
            new GroupMeansAnova(),
            new OneShareExact(),
            new OneShareNormal(),
            new TwoSharesChiSquare(),
            new TwoSharesNormal(),
            new TwoSharesFisher(),
            new TwoSharesArcsine(),
            new PairedSharesMcNemar(),
            new CategoriesFit(),
            new GroupsHomogeneity(),
            new TableIndependence(),
            new ParallelTimesLogRank(),
            new PearsonCorrelation(),
            new LinearRegression()));
  }

  /** The cells, in order. */
  public List<Cell> cells() {
    return cells;
  }

  /**
   * The cell at two coordinates.
   *
   * @param arrangement word of the plan file
   * @param test word of the plan file
   */
  public Optional<Cell> find(String arrangement, String test) {
    return cells.stream()
        .filter(
            cell ->
                cell.key().arrangement().word().equals(arrangement)
                    && cell.key().test().equals(test))
        .findFirst();
  }
}
