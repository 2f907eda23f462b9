package dev.holdfast.design.categories;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import dev.holdfast.design.Cell;
import dev.holdfast.design.Effect;
import dev.holdfast.design.Given;
import dev.holdfast.design.InputException;
import dev.holdfast.design.Ledger;
import dev.holdfast.design.Level;
import dev.holdfast.design.Sides;
import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.Test;

class TableEffectsTest {
  private static final Level LEVEL = Level.of(0.05, Sides.TWO);
  private final Cell fit = new CategoriesFit();
  private final Cell groups = new GroupsHomogeneity();
  private final Cell table = new TableIndependence();

  @Test
  void nullSharesAreMatchedByName() {
    Given given =
        new Given()
            .named("shares", "red", 0.5, "green", 0.3, "blue", 0.2)
            .named("null-shares", "blue", 0.2, "red", 0.4, "green", 0.4);
    double w = Math.sqrt(0.01 / 0.4 + 0.01 / 0.4);
    assertEquals(w, fit.assume(given.inputs()).value().orElseThrow(), 1e-12);
  }

  @Test
  void equalNullSharesAreTakenWhenNoneAreStated() {
    Given given = new Given().named("shares", "a", 0.6, "b", 0.4);
    assertEquals(0.2, fit.assume(given.inputs()).value().orElseThrow(), 1e-12);
  }

  @Test
  void printedThirdsAreScaledToOne() {
    Given given = new Given().named("shares", "a", 0.33, "b", 0.33, "c", 0.33);
    assertEquals(0, fit.assume(given.inputs()).value().orElseThrow(), 1e-12);
  }

  @Test
  void aTwoByTwoTableHasThePhiCoefficientForW() {
    Given given = new Given().table("cells", new double[] {0.3, 0.2}, new double[] {0.1, 0.4});
    double phi = (0.3 * 0.4 - 0.2 * 0.1) / Math.sqrt(0.5 * 0.5 * 0.4 * 0.6);
    Effect effect = table.assume(given.inputs());
    assertEquals(phi, effect.value().orElseThrow(), 1e-12);
    assertEquals(
        Map.of("rows", 2.0, "columns", 2.0, "w", effect.value().orElseThrow()), effect.measures());
  }

  @Test
  void groupsCountByTheirSize() {
    Given given =
        new Given()
            .table("cells", new double[] {0.5, 0.5}, new double[] {0.2, 0.8})
            .groups("a", "b")
            .weights(100.0, 200.0);
    double mean = (0.5 + 2 * 0.2) / 3;
    double square =
        (Math.pow(0.5 - mean, 2) + 2 * Math.pow(0.2 - mean, 2)) / 3 / (mean * (1 - mean));
    assertEquals(Math.sqrt(square), groups.assume(given.inputs()).value().orElseThrow(), 1e-12);
  }

  @Test
  void twoGroupsWithTwoCategoriesAreATwoByTwoTable() {
    double[] sizes = {120, 80};
    Given byGroup =
        new Given()
            .table("cells", new double[] {0.5, 0.5}, new double[] {0.3, 0.7})
            .groups("a", "b")
            .weights(120.0, 80.0);
    Given joint = new Given().table("cells", new double[] {0.3, 0.3}, new double[] {0.12, 0.28});
    assertEquals(
        table
            .assume(joint.inputs())
            .power(table.best(), new double[] {200}, LEVEL, Ledger.closed()),
        groups.assume(byGroup.inputs()).power(groups.best(), sizes, LEVEL, Ledger.closed()),
        1e-12);
  }

  @Test
  void theNumberOfGroupsGivesTheDegreesOfFreedomOfAStatedW() {
    Effect effect = groups.assume(new Given().number("w", 0.25).number("categories", 3).inputs());
    Effect same =
        table.assume(new Given().number("w", 0.25).number("rows", 4).number("columns", 3).inputs());
    assertEquals(
        same.power(table.best(), new double[] {200}, LEVEL, Ledger.closed()),
        effect.power(groups.best(), new double[] {50, 50, 50, 50}, LEVEL, Ledger.closed()),
        1e-15);
  }

  @Test
  void whatIsNoTableIsRefused() {
    refused(fit, "shares", new Given().named("shares", "a", 0.6, "b", 0.6));
    refused(fit, "shares", new Given().named("shares", "a", 1.0));
    refused(fit, "shares", new Given().named("shares", "a", -0.1, "b", 1.1));
    refused(
        fit,
        "null-shares",
        new Given().named("shares", "a", 0.6, "b", 0.4).named("null-shares", "a", 0.5, "c", 0.5));
    refused(
        fit,
        "null-shares",
        new Given().named("shares", "a", 0.6, "b", 0.4).named("null-shares", "a", 1, "b", 0));
    refused(fit, "categories", new Given().number("w", 0.2).number("categories", 1));
    refused(fit, "categories", new Given().number("w", 0.2).number("categories", 2.5));
    refused(
        groups, "cells", new Given().table("cells", new double[] {0.5, 0.5}, new double[] {1.0}));
    refused(groups, "cells", new Given().table("cells", new double[] {0.5, 0.5}));
    refused(
        groups,
        "cells",
        new Given()
            .table("cells", new double[] {0.5, 0.5}, new double[] {0.4, 0.6})
            .groups("a", "b", "c"));
    refused(groups, "cells", new Given().table("cells", new double[] {1, 0}, new double[] {1, 0}));
    refused(
        table, "cells", new Given().table("cells", new double[] {0.5, 0}, new double[] {0.5, 0}));
  }

  private static void refused(Cell cell, String key, Given given) {
    InputException problem = assertThrows(InputException.class, () -> cell.assume(given.inputs()));
    assertFalse(problem.isMissing());
    assertEquals(List.of(key), problem.inputs());
  }

  @Test
  void withoutShapesTheirKeysAreNamed() {
    InputException missing =
        assertThrows(
            InputException.class, () -> table.assume(new Given().number("w", 0.3).inputs()));
    assertTrue(missing.isMissing());
    assertEquals(List.of("rows", "cells"), missing.inputs());
  }
}
