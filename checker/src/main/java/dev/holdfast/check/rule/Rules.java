package dev.holdfast.check.rule;

import dev.holdfast.check.Rule;
import java.util.List;

/** The rules of the program. A new rule is entered here. */
public final class Rules {
  private Rules() {}

  /** All rules, by the name of their finding. */
  public static List<Rule> standard() {
    return List.of(
        new AlphaOverspent(),
        new CasesContradict(),
        new ClaimNotComputed(),
        new ConventionUnstated(),
        new Drift(),
        new EffectInconsistent(),
        new EnrolmentShort(),
        new FamilyIncomplete(),
        new LossIgnored(),
        new MethodOptimistic(),
        new NotWhole(),
        new OneSidedUnexplained(),
        new OutcomesUncorrected(),
        new PrimaryUntested(),
        new QuantityUnused(),
        new SourceIncomplete(),
        new SourceMissing(),
        new TestUnfit(),
        new UnderTarget(),
        new UnitMismatch());
  }
}
