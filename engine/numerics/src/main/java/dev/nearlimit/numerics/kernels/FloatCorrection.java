package dev.nearlimit.numerics.kernels;

/**
 * What single-precision min-sum does to a magnitude m before it sends it: min(m * factor - min(offset, m * factor),
 * largest), every operation rounded.
 *
 * @param factor above 0, 1 where there is none
 * @param offset at least 0, in LLR units
 * @param largest largest magnitude of a message
 */
public record FloatCorrection(float factor, float offset, float largest) {}
