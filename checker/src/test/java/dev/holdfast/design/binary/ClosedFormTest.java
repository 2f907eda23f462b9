package dev.holdfast.design.binary;

import static org.junit.jupiter.api.Assertions.assertEquals;

import dev.holdfast.design.Allocation;
import dev.holdfast.design.Cell;
import dev.holdfast.design.Given;
import dev.holdfast.design.Inputs;
import dev.holdfast.design.LeastSample;
import dev.holdfast.design.Level;
import dev.holdfast.design.Method;
import dev.holdfast.design.Sides;
import org.apache.commons.statistics.distribution.NormalDistribution;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/**
 * The least real sample of each normal method is the number that the formula in print gives; the
 * formulas are written out here as printed, from memory.
 */
class ClosedFormTest {
  private static final NormalDistribution NORMAL = NormalDistribution.of(0, 1);
  private static final Level LEVEL = Level.of(0.05, Sides.TWO);
  private static final double ZA = NORMAL.inverseSurvivalProbability(0.025);
  private static final double ZB = NORMAL.inverseSurvivalProbability(0.2);

  @ParameterizedTest(name = "{0} against {1}, second group {2} times the first")
  @CsvSource({"0.30, 0.45, 1", "0.45, 0.30, 1", "0.02, 0.05, 2", "0.6, 0.5, 0.5", "0.9, 0.7, 3"})
  void twoShares(double p1, double p2, double r) {
    double d = Math.abs(p1 - p2);
    double p = (p1 + r * p2) / (1 + r);
    // Fleiss, Tytun and Ury (1980), Biometrics 36: size m of the first group, r m of the second
    double under = (r + 1) * p * (1 - p);
    double own = r * p1 * (1 - p1) + p2 * (1 - p2);
    double pooled = square(ZA * Math.sqrt(under) + ZB * Math.sqrt(own)) / (r * d * d);
    double unpooled = square(ZA + ZB) * own / (r * d * d);
    double control = square(ZA + ZB) * (r + 1) * p2 * (1 - p2) / (r * d * d);
    double h = 2 * Math.asin(Math.sqrt(p1)) - 2 * Math.asin(Math.sqrt(p2));
    Inputs inputs = new Given().named("shares", "a", p1, "b", p2).inputs();
    Cell cell = new TwoSharesNormal();
    assertEquals(pooled, least(cell, "pooled", inputs, 1, r), 1e-7 * pooled);
    assertEquals(unpooled, least(cell, "unpooled", inputs, 1, r), 1e-7 * unpooled);
    assertEquals(control, least(cell, "control-variance", inputs, 1, r), 1e-7 * control);
    assertEquals(
        corrected(pooled, r, d), least(cell, "pooled-corrected", inputs, 1, r), 1e-7 * pooled);
    assertEquals(
        corrected(unpooled, r, d),
        least(cell, "unpooled-corrected", inputs, 1, r),
        1e-7 * unpooled);
    // Cohen (1988), section 6.4
    double arcsine = square((ZA + ZB) / h) * (r + 1) / r;
    assertEquals(arcsine, least(cell, "arcsine", inputs, 1, r), 1e-7 * arcsine);
  }

  private static double corrected(double m, double r, double d) {
    return m / 4 * square(1 + Math.sqrt(1 + 2 * (r + 1) / (m * r * d)));
  }

  @ParameterizedTest(name = "{1} against {0}")
  @CsvSource({"0.3, 0.45", "0.3, 0.2", "0.05, 0.02", "0.9, 0.97"})
  void oneShare(double p0, double p1) {
    double d = Math.abs(p1 - p0);
    double root0 = Math.sqrt(p0 * (1 - p0));
    double root1 = Math.sqrt(p1 * (1 - p1));
    double under = square((ZA * root0 + ZB * root1) / d);
    double own = square((ZA + ZB) * root1 / d);
    Inputs inputs = new Given().number("null-share", p0).number("share", p1).inputs();
    Cell cell = new OneShareNormal();
    assertEquals(under, least(cell, "null-variance", inputs, 1), 1e-7 * under);
    assertEquals(own, least(cell, "own-variance", inputs, 1), 1e-7 * own);
    // NIST/SEMATECH e-Handbook of Statistical Methods, section 7.2.4.2
    assertEquals(half(under, d), least(cell, "null-variance-corrected", inputs, 1), 1e-7 * under);
    assertEquals(half(own, d), least(cell, "own-variance-corrected", inputs, 1), 1e-7 * own);
  }

  private static double half(double n, double d) {
    return n / 4 * square(1 + Math.sqrt(1 + 2 / (n * d)));
  }

  @ParameterizedTest(name = "{0} and {1}")
  @CsvSource({"0.2, 0.1", "0.05, 0.15", "0.5, 0.3", "0.02, 0.001"})
  void discordantPairs(double a, double b) {
    double psi = a + b;
    double d = Math.abs(a - b);
    // Connor (1987), Biometrics 43; Miettinen (1968), Biometrics 24
    double connor = square((ZA * Math.sqrt(psi) + ZB * Math.sqrt(psi - d * d)) / d);
    double miettinen =
        square(ZA * psi + ZB * Math.sqrt(psi * psi - d * d * (3 + psi) / 4)) / (psi * d * d);
    // Schlesselman (1982), for matched pairs: m discordant pairs, m/psi pairs in all
    double share = Math.max(a, b) / psi;
    double schlesselman =
        square((ZA / 2 + ZB * Math.sqrt(share * (1 - share))) / (share - 0.5)) / psi;
    Inputs inputs = new Given().named("discordant", "a", a, "b", b).inputs();
    Cell cell = new PairedSharesMcNemar();
    assertEquals(connor, least(cell, "connor", inputs, 1), 1e-7 * connor);
    assertEquals(miettinen, least(cell, "miettinen", inputs, 1), 1e-7 * miettinen);
    assertEquals(schlesselman, least(cell, "schlesselman", inputs, 1), 1e-7 * schlesselman);
  }

  private static double least(Cell cell, String key, Inputs inputs, double... ratio) {
    Method method =
        cell.methods().stream().filter(each -> each.key().equals(key)).findFirst().orElseThrow();
    Allocation allocation = Allocation.of(java.util.Arrays.stream(ratio).boxed().toList());
    LeastSample.Found found =
        LeastSample.find(cell.assume(inputs), method, allocation, cell.arms(), LEVEL, 0.8)
            .orElseThrow();
    return allocation.sizes(found.real())[0];
  }

  private static double square(double value) {
    return value * value;
  }
}
