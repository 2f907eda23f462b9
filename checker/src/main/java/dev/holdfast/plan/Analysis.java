package dev.holdfast.plan;

import java.util.List;
import java.util.Map;
import java.util.Optional;

/**
 * One planned test.
 *
 * @param name its key
 * @param outcome the outcome it tests, by name; known to exist
 * @param question what it asks, in words
 * @param arrangement arrangement of the comparison
 * @param test the test, by its trade name
 * @param aim {@code superiority}, {@code noninferiority} or {@code equivalence}
 * @param margin the margin of a noninferiority or equivalence aim
 * @param oneSidedReason why a one-sided test is right, where it is
 * @param cases the situations computed: one, unless the plan gives a grid
 * @param beyond sections that change the computation and are not yet computed ({@code clusters},
 *     {@code looks}, {@code covariates}, {@code prior}, {@code finite-population}), by key
 * @param loss share lost before the analysis, where the analysis states its own
 * @param place where its key is written
 */
public record Analysis(
    String name,
    Word outcome,
    Optional<String> question,
    Word arrangement,
    Word test,
    Word aim,
    Optional<Input> margin,
    Optional<String> oneSidedReason,
    List<Case> cases,
    Map<String, Place> beyond,
    Optional<Figure> loss,
    Place place) {}
