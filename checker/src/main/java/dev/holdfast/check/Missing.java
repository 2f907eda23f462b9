package dev.holdfast.check;

/**
 * Why something cannot be computed.
 *
 * @param what what is missing, as a phrase
 * @param remedy what would supply it, as a phrase
 */
public record Missing(String what, String remedy) {}
