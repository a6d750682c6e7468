package dev.nearlimit.numerics.kernels;

/**
 * The kernels of decoders.
 *
 * @param layeredMinSum layered min-sum on integers
 * @param layeredFloat layered sum-product and min-sum in single precision
 * @param bitSums what flooding needs beyond these
 */
public record DecoderKernels(
        LayeredMinSumKernels layeredMinSum, LayeredFloatKernels layeredFloat, BitSumKernels bitSums) {}
