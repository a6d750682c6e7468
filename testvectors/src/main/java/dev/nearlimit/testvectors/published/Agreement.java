package dev.nearlimit.testvectors.published;

/**
 * What came of comparing a computed value with a published one.
 *
 * @param holds whether they agree within the tolerance
 * @param message one line with the row, both values, their difference and what is allowed
 */
public record Agreement(boolean holds, String message) {}
