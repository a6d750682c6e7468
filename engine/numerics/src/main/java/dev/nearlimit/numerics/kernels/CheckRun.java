package dev.nearlimit.numerics.kernels;

/**
 * Parity checks of the same weight that share no bit and may be done together, the i-th bits of all of them lying side
 * by side; a single check is a run, too.
 *
 * @param bits where the lanes of the i-th bits begin among the posteriors
 * @param messages where the messages begin: those of edge i at {@code messages + i * lanes}
 * @param lanes 64 times the number of checks
 */
public record CheckRun(int[] bits, int messages, int lanes) {
    /** Values of scratch memory that a kernel needs for this run. */
    public int scratch() {
        return (bits.length + LayeredMinSumKernels.SCRATCH_ROWS) * lanes;
    }
}
