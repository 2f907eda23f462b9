package dev.holdfast.check;

import dev.holdfast.plan.Claim;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.OptionalInt;

/**
 * A claim and what the plan's assumptions give for it.
 *
 * @param subject dotted path of the analysis or family, such as {@code analyses.latency-shorter}
 * @param caseNumber which case of the analysis, from 1, where it has several
 * @param claim the claim
 * @param verdict what became of it
 * @param computed by the stated method, or the plain one of the test; empty if it could not be
 * @param method that method, as it reads after "by"
 * @param best by the best method there is, where that is another one and within reach
 * @param bestMethod that method
 * @param decimals decimals at which figures of this claim are compared and shown
 * @param explanation why the verdict is no plain {@code holds}: the convention that fits, the
 *     slack, what is missing; empty otherwise
 * @param headroom how far quantities can move
 * @param fall what it was before an edit, when a revision is compared
 */
public record ClaimResult(
    String subject,
    OptionalInt caseNumber,
    Claim claim,
    Verdict verdict,
    OptionalDouble computed,
    String method,
    OptionalDouble best,
    String bestMethod,
    int decimals,
    String explanation,
    List<Headroom> headroom,
    Optional<Fall> fall) {}
