package dev.holdfast.design.continuous;

import dev.holdfast.design.Arms;
import dev.holdfast.design.Arrangement;
import dev.holdfast.design.BaseCell;
import dev.holdfast.design.CellKey;
import dev.holdfast.design.Convention;
import dev.holdfast.design.Effect;
import dev.holdfast.design.InputException;
import dev.holdfast.design.InputSpec;
import dev.holdfast.design.Inputs;
import dev.holdfast.design.Ledger;
import dev.holdfast.design.Method;
import dev.holdfast.design.Scale;
import dev.holdfast.design.Unit;
import dev.holdfast.design.continuous.GroupsEffect.Measure;
import java.util.Arrays;
import java.util.List;
import java.util.Map;
import java.util.OptionalDouble;
import java.util.Set;

/**
 * Means of several parallel groups by the F test of one-way analysis of variance. The noncentrality
 * is the total number times f squared, f being the SD of the group means, weighted by the sizes of
 * the groups, over the SD within groups.
 */
public final class GroupMeansAnova extends BaseCell {
  private static final Method NONCENTRAL_F =
      new Method(
          "noncentral-f",
          "the noncentral F distribution",
          "patnaik-1949",
          Map.of(Convention.REFERENCE, "exact"),
          true,
          true);

  /** The cell. */
  public GroupMeansAnova() {
    super(
        new CellKey(Arrangement.PARALLEL_GROUPS, "anova-f"),
        Set.of(Scale.CONTINUOUS),
        "parallel groups, analysis of variance",
        "Do the means of several groups differ?",
        new Arms(2, Integer.MAX_VALUE, 2, Unit.PARTICIPANTS),
        List.of(
            InputSpec.byGroup("means", "mean of each group"),
            InputSpec.number("sd", "SD within the groups"),
            InputSpec.number("f", "SD of the group means over the SD within groups"),
            InputSpec.number("partial-eta-squared", "f squared over one plus f squared"),
            InputSpec.number(
                "largest-difference",
                "difference of the outermost means, the others where they add least")),
        List.of(NONCENTRAL_F));
  }

  @Override
  public Effect assume(Inputs inputs) {
    Ledger ledger = Ledger.open();
    OptionalDouble f = standardised(inputs, ledger);
    OptionalDouble sd = inputs.positive("sd");
    OptionalDouble apart = inputs.positive("largest-difference");
    double[] means = inputs.byGroup("means").orElse(null);
    double[] planned = inputs.shares(means != null ? means.length : inputs.groups().size());
    if (means != null) {
      double range = Arrays.stream(means).max().orElse(0) - Arrays.stream(means).min().orElse(0);
      GroupPattern pattern = range > 0 ? GroupPattern.of(means) : GroupPattern.UNKNOWN;
      double between = range > 0 ? pattern.spread(planned) : 0;
      describe(means, planned, between, ledger);
      double assumed = over(between, sd, f, ledger);
      return new GroupsEffect(
          Measure.F,
          OptionalDouble.of(assumed),
          pattern,
          planned,
          range > 0 ? range / assumed : Double.NaN,
          ledger.steps());
    }
    if (apart.isPresent() && planned.length < 2) {
      throw InputException.missing("the groups that differ so (means, or f instead)", "means", "f");
    }
    if (apart.isPresent()) {
      double range = apart.getAsDouble();
      double between = range * GroupPattern.LEAST_FAVOURABLE.spread(planned);
      describe(range, planned, between, ledger);
      return new GroupsEffect(
          Measure.LARGEST_DIFFERENCE,
          apart,
          GroupPattern.LEAST_FAVOURABLE,
          planned,
          range / over(between, sd, f, ledger),
          ledger.steps());
    }
    double range =
        sd.isPresent() && planned.length > 1
            ? sd.getAsDouble() / GroupPattern.LEAST_FAVOURABLE.spread(planned)
            : Double.NaN;
    return new GroupsEffect(Measure.F, f, GroupPattern.UNKNOWN, planned, range, ledger.steps());
  }

  /** The effect as f, stated so or as partial eta squared. */
  private static OptionalDouble standardised(Inputs inputs, Ledger ledger) {
    OptionalDouble f = inputs.positive("f");
    OptionalDouble eta = inputs.share("partial-eta-squared");
    boolean raw = inputs.has("means") || inputs.has("largest-difference");
    if (f.isPresent() || eta.isEmpty()) {
      return f;
    }
    double square = eta.getAsDouble();
    double found = Math.sqrt(square / (1 - square));
    if (!raw) {
      ledger.step("effect", "f = sqrt(eta2/(1 - eta2))", found, "eta2", square);
    }
    return OptionalDouble.of(found);
  }

  /** SD of the means over the SD within groups; without the latter, f as it is stated. */
  private static double over(
      double between, OptionalDouble sd, OptionalDouble stated, Ledger ledger) {
    if (sd.isEmpty()) {
      return stated.orElseThrow(() -> InputException.missing("the SD within groups (sd)", "sd"));
    }
    double f = between / sd.getAsDouble();
    ledger.step("effect", "f = SM/SD", f, "SM", between, "SD", sd.getAsDouble());
    return f;
  }

  private static void describe(double[] means, double[] planned, double between, Ledger ledger) {
    StringBuilder centre = new StringBuilder("MW = ");
    StringBuilder square = new StringBuilder("SM = sqrt(");
    Object[] terms = new Object[4 * means.length + 2];
    double centred = 0;
    for (int i = 0; i < means.length; i++) {
      String mean = "m" + (i + 1);
      String share = "p" + (i + 1);
      String plus = i == 0 ? "" : " + ";
      centre.append(plus).append(share).append('*').append(mean);
      square.append(plus).append(share).append("*(").append(mean).append(" - MW)^2");
      terms[4 * i] = share;
      terms[4 * i + 1] = planned[i];
      terms[4 * i + 2] = mean;
      terms[4 * i + 3] = means[i];
      centred += planned[i] * means[i];
    }
    terms[terms.length - 2] = "MW";
    terms[terms.length - 1] = centred;
    ledger.step(
        "mean of the means, weighted by the shares of the groups",
        centre.toString(),
        centred,
        Arrays.copyOf(terms, terms.length - 2));
    ledger.step("SD of the means, weighted alike", square.append(')').toString(), between, terms);
  }

  private static void describe(double range, double[] planned, double between, Ledger ledger) {
    double[] sorted = planned.clone();
    Arrays.sort(sorted);
    ledger.step(
        "SD of the means, the groups with the two smallest shares outermost",
        "SM = D*sqrt(p1*p2/(p1 + p2))",
        between,
        "D",
        range,
        "p1",
        sorted[0],
        "p2",
        sorted[1]);
  }
}
