package dev.holdfast.plan;

import java.util.List;
import java.util.Map;
import java.util.Optional;

/**
 * Analyses that share one error rate.
 *
 * @param name its key
 * @param of its analyses, in order
 * @param control the procedure, such as {@code holm}
 * @param alpha the familywise level
 * @param correlation common correlation of the test statistics, when stated
 * @param independent whether the plan states that the tests are independent
 * @param levels the level given to each analysis by the plan, when it splits alpha itself
 * @param claims joint claims
 * @param place where its key is written
 */
public record Family(
    String name,
    List<Word> of,
    Word control,
    Optional<Figure> alpha,
    Optional<Figure> correlation,
    boolean independent,
    Map<String, Figure> levels,
    List<Claim> claims,
    Place place) {}
