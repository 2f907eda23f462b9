package dev.holdfast.check;

import dev.holdfast.design.Step;
import java.util.List;

/**
 * How the figure of a claim comes about.
 *
 * @param claim the claim and its verdict
 * @param effectSteps from the inputs to the effect
 * @param powerSteps from the effect to the power at the sample
 * @param others what every other method makes of it
 * @param reference key of the bibliography for the method held to; empty where none was used
 */
public record Derivation(
    ClaimResult claim,
    List<Step> effectSteps,
    List<Step> powerSteps,
    List<MethodFigure> others,
    String reference) {

  /**
   * The same figure by another method.
   *
   * @param method the method, as it reads after "by"
   * @param figure what it gives, in the claim's own terms
   * @param exact whether it is exact
   */
  public record MethodFigure(String method, double figure, boolean exact) {}
}
