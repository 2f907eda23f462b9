package dev.holdfast.check;

/**
 * How far one quantity can move before a claim falls, or must move before it stands.
 *
 * @param quantity name of the quantity
 * @param now its value
 * @param limit the last value at which the claim stands
 * @param atMost whether values up to the limit are safe; otherwise values from it
 */
public record Headroom(String quantity, double now, double limit, boolean atMost) {}
