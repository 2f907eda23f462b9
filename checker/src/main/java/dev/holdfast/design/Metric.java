package dev.holdfast.design;

/**
 * A measure in which an effect can be stated, as the search for the smallest detectable effect
 * needs it.
 *
 * @param name the key of the plan's effect, such as {@code difference} or {@code d}
 * @param none the value that means no effect
 * @param far the end of its range on the side of the assumed effect; may be infinite
 */
public record Metric(String name, double none, double far) {}
