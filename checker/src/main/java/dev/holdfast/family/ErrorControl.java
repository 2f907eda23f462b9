package dev.holdfast.family;

import java.util.Optional;
import java.util.OptionalDouble;

/**
 * Procedures that hold an error rate over several tests, with the level that each guarantees to a
 * single test whatever becomes of the others.
 *
 * <p>Bonferroni and Holm (1979): alpha/m, at Holm's first step. Šidák (1967): 1 - (1 -
 * alpha)^(1/m). Fixed sequence and all-must-succeed (intersection-union; Berger 1982): alpha for
 * each. For the other procedures no guaranteed level is computed yet.
 */
public enum ErrorControl {
  NONE("none", Guarantee.FULL),
  BONFERRONI("bonferroni", Guarantee.EQUAL_SHARE),
  SIDAK("sidak", Guarantee.SIDAK),
  HOLM("holm", Guarantee.EQUAL_SHARE),
  HOCHBERG("hochberg", Guarantee.UNKNOWN),
  HOMMEL("hommel", Guarantee.UNKNOWN),
  FIXED_SEQUENCE("fixed-sequence", Guarantee.FULL),
  FALLBACK("fallback", Guarantee.UNKNOWN),
  GATEKEEPING("gatekeeping", Guarantee.UNKNOWN),
  GRAPH("graph", Guarantee.UNKNOWN),
  DUNNETT("dunnett", Guarantee.UNKNOWN),
  TUKEY("tukey", Guarantee.UNKNOWN),
  BENJAMINI_HOCHBERG("benjamini-hochberg", Guarantee.UNKNOWN),
  BENJAMINI_YEKUTIELI("benjamini-yekutieli", Guarantee.UNKNOWN),
  ALL_MUST_SUCCEED("all-must-succeed", Guarantee.FULL);

  private enum Guarantee {
    FULL,
    EQUAL_SHARE,
    SIDAK,
    UNKNOWN
  }

  private final String word;
  private final Guarantee guarantee;

  ErrorControl(String word, Guarantee guarantee) {
    this.word = word;
    this.guarantee = guarantee;
  }

  /** The word of the plan file. */
  public String word() {
    return word;
  }

  /** The procedure of a word. */
  public static Optional<ErrorControl> of(String word) {
    for (ErrorControl control : values()) {
      if (control.word.equals(word)) {
        return Optional.of(control);
      }
    }
    return Optional.empty();
  }

  /**
   * The level guaranteed to each test.
   *
   * @param alpha familywise level, in (0, 1)
   * @param tests number of tests, at least 1
   * @return empty where it is not computed yet
   */
  public OptionalDouble guaranteedLevel(double alpha, int tests) {
    return switch (guarantee) {
      case FULL -> OptionalDouble.of(alpha);
      case EQUAL_SHARE -> OptionalDouble.of(alpha / tests);
      case SIDAK -> OptionalDouble.of(-StrictMath.expm1(StrictMath.log1p(-alpha) / tests));
      case UNKNOWN -> OptionalDouble.empty();
    };
  }

  /** Whether the tests share alpha among them, so that their levels together must not exceed it. */
  public boolean sharesAlpha() {
    return guarantee == Guarantee.EQUAL_SHARE || guarantee == Guarantee.SIDAK;
  }

  /** Whether it holds the chance of any false rejection, so that primary outcomes are corrected. */
  public boolean corrects() {
    return this != NONE;
  }
}
