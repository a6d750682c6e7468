package dev.nearlimit.numerics.kernels;

/**
 * Fixed-point arithmetic of a min-sum decoder. A magnitude m is sent as max(floor(eighths * m / 8) - offset, 0).
 *
 * @param largestMessage M, 1 .. 127
 * @param largestPosterior P, M .. 2^14 - 1
 * @param eighths 1 .. 8
 * @param offset 0 .. 100 levels
 */
public record MinSumArithmetic(int largestMessage, int largestPosterior, int eighths, int offset) {
    /**
     * Whether no intermediate value leaves a byte: an updated posterior is, before it is limited, P plus two messages at
     * most, one taken off and one put on.
     */
    public boolean fitsBytes() {
        return largestPosterior + 2 * largestMessage <= Byte.MAX_VALUE;
    }
}
