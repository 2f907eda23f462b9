package dev.holdfast.plan;

import java.util.Optional;

/**
 * A number as a plan gives it: its value, the form in which it was written, and where it came from.
 *
 * @param value the value, finite
 * @param written the characters of the file, such as {@code 0.90}; those of the quantity when the
 *     number was given by name
 * @param decimals digits written after the decimal point, exponent included; never negative
 * @param quantity the quantity that was named in place of a number, if one was; of the value of a
 *     quantity, its own name
 * @param place where the number, or the name that stands for it, is written
 */
public record Figure(
    double value, String written, int decimals, Optional<String> quantity, Place place) {}
