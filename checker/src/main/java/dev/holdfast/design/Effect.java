package dev.holdfast.design;

import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;

/**
 * An assumed effect, with the spread and whatever else the power depends on beside sizes and level.
 * Immutable.
 */
public interface Effect {
  /** The measure in which the effect is stated. */
  Metric metric();

  /** The value of the effect in that measure; empty when the plan assumes none. */
  OptionalDouble value();

  /** The same assumptions with another value of the effect, in the same measure. */
  Effect at(double value);

  /**
   * The same assumptions with the effect stated in another measure.
   *
   * @return empty when the effect cannot be stated so
   */
  default Optional<Effect> in(String metric) {
    return metric.equals(metric().name()) ? Optional.of(this) : Optional.empty();
  }

  /**
   * The power of the test.
   *
   * @param method one of the cell's methods
   * @param sizes numbers analysed, in the order of the groups; whole unless the method takes real
   *     sizes
   * @param level level of the test
   * @param ledger takes the steps of the computation
   * @return the chance to reject the null hypothesis, in [0, 1]
   * @throws IllegalStateException if the effect has no value
   */
  double power(Method method, double[] sizes, Level level, Ledger ledger);

  /** Writes down how the effect follows from the inputs. */
  default void derive(Ledger ledger) {}

  /**
   * The effect in every measure that the inputs allow, by key of the plan's effect section. A
   * measure that the plan states beside the one computed from must agree with it.
   */
  default Map<String, Double> measures() {
    return value().isPresent() ? Map.of(metric().name(), value().getAsDouble()) : Map.of();
  }

  /**
   * Whether a method can be asked for at these sizes: enumerations have their limits.
   *
   * @return empty if it can, otherwise why not
   */
  default Optional<String> beyondReach(Method method, double[] sizes) {
    return Optional.empty();
  }

  /** The chance that a participant has the event, for designs whose sizes count events. */
  default OptionalDouble eventShare() {
    return OptionalDouble.empty();
  }
}
