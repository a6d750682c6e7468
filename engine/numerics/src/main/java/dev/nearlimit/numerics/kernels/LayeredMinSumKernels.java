package dev.nearlimit.numerics.kernels;

/**
 * Layered min-sum on integers, 64 frames side by side (position-major: frame f of position i at 64*i + f). A check reads
 * t = posterior - its last message from each of its bits; returns to each the least min(|t|, M) of the others, corrected,
 * with the product of the others' signs (0 counts as positive); and sets the posterior to t plus the new message, limited
 * to -P .. P. A check of weight 1 returns M, corrected.
 */
public interface LayeredMinSumKernels {
    /** Rows of scratch memory beyond one for each edge. */
    int SCRATCH_ROWS = 4;

    /**
     * Does the checks of one run in 8-bit lanes.
     *
     * @param arithmetic one that {@linkplain MinSumArithmetic#fitsBytes() fits}
     * @param posterior of all bits; those of the run are updated
     * @param message of all edges; those of the run are updated
     * @param scratch {@link CheckRun#scratch()} values whose contents do not matter
     */
    void update(CheckRun run, MinSumArithmetic arithmetic, byte[] posterior, byte[] message, byte[] scratch);

    /** The same in 16-bit lanes, for any arithmetic. */
    void update(CheckRun run, MinSumArithmetic arithmetic, short[] posterior, short[] message, short[] scratch);
}
