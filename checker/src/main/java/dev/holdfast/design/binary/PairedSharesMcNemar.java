package dev.holdfast.design.binary;

import dev.holdfast.design.Arms;
import dev.holdfast.design.Arrangement;
import dev.holdfast.design.BaseCell;
import dev.holdfast.design.CellKey;
import dev.holdfast.design.Convention;
import dev.holdfast.design.Effect;
import dev.holdfast.design.InputSpec;
import dev.holdfast.design.Inputs;
import dev.holdfast.design.Ledger;
import dev.holdfast.design.Level;
import dev.holdfast.design.Method;
import dev.holdfast.design.Scale;
import dev.holdfast.design.Unit;
import dev.holdfast.design.ZPower;
import dev.holdfast.numeric.ExactTests;
import java.util.List;
import java.util.Map;
import java.util.Set;

/** Change within pairs of a yes-or-no outcome by McNemar's test. */
public final class PairedSharesMcNemar extends BaseCell {
  private static final Method CONNOR =
      new Method(
          "connor",
          "the normal formula of Connor",
          "connor-1987",
          Map.of(Convention.REFERENCE, "normal"),
          false,
          true);
  private static final Method MIETTINEN =
      new Method(
          "miettinen",
          "the normal formula of Miettinen",
          "miettinen-1968",
          Map.of(Convention.REFERENCE, "normal"),
          false,
          true);
  private static final Method SCHLESSELMAN =
      new Method(
          "schlesselman",
          "the normal formula for the discordant pairs expected",
          "schlesselman-1982",
          Map.of(Convention.REFERENCE, "normal"),
          false,
          true);
  private static final Method EXACT =
      new Method(
          "conditional-enumerated",
          "enumeration of the exact conditional test",
          "miettinen-1968",
          Map.of(Convention.REFERENCE, "exact"),
          true,
          false);

  /** The cell. */
  public PairedSharesMcNemar() {
    super(
        new CellKey(Arrangement.MATCHED_PAIRS, "mcnemar"),
        Set.of(Scale.BINARY),
        "matched pairs, McNemar's test",
        "Do pairs change more often in one direction than in the other?",
        Arms.one(1, Unit.PAIRS),
        List.of(
            InputSpec.byGroup("discordant", "share of pairs that change in each direction"),
            InputSpec.number("discordant-share", "share of pairs that change at all"),
            InputSpec.number("odds-ratio", "larger discordant share over the smaller"),
            InputSpec.number("difference", "difference of the two discordant shares")),
        List.of(CONNOR, MIETTINEN, SCHLESSELMAN, EXACT));
  }

  @Override
  public Effect assume(Inputs inputs) {
    return DiscordantEffect.of(inputs);
  }

  /**
   * Power of a method of this cell.
   *
   * @param discordant share of pairs that change
   * @param difference of the shares of the two directions, from 0
   * @param n number of pairs
   */
  static double power(
      Method method, double discordant, double difference, double n, Level level, Ledger ledger) {
    if (method.key().equals(EXACT.key())) {
      return exact(discordant, difference, Math.round(n), level, ledger);
    }
    double share = difference / discordant;
    double left =
        switch (method.key()) {
          case "connor" -> share * difference;
          case "miettinen" -> share * share * (3 + discordant) / 4;
          default -> share * share;
        };
    String formula =
        switch (method.key()) {
          case "connor" -> "ratio = sqrt(1 - difference^2/psi)";
          case "miettinen" -> "ratio = sqrt(1 - difference^2*(3 + psi)/(4*psi^2))";
          default -> "ratio = sqrt(1 - difference^2/psi^2)";
        };
    double spread = Math.sqrt(1 - left);
    double delta = difference * Math.sqrt(n / discordant);
    ledger.step(
        "noncentrality",
        "delta = difference*sqrt(n/psi)",
        delta,
        "difference",
        difference,
        "n",
        n,
        "psi",
        discordant);
    ledger.step(
        "SD under the alternative over that under the null hypothesis",
        formula,
        spread,
        "difference",
        difference,
        "psi",
        discordant);
    return ZPower.power(delta, spread, level, ledger);
  }

  private static double exact(
      double discordant, double difference, long n, Level level, Ledger ledger) {
    double first = (discordant + difference) / 2;
    double second = (discordant - difference) / 2;
    double even = discordant / 2;
    double attained = ExactTests.mcNemar(n, even, even, level.alpha(), level.twoSided());
    double power = ExactTests.mcNemar(n, first, second, level.alpha(), level.twoSided());
    ledger.step(
        "level attained",
        "attained = P(reject), both shares psi/2",
        attained,
        "n",
        n,
        "psi",
        discordant);
    ledger.step(
        "power",
        "power = mean over the number of discordant pairs of the binomial test's power",
        power,
        "n",
        n,
        "first",
        first,
        "second",
        second);
    return power;
  }
}
