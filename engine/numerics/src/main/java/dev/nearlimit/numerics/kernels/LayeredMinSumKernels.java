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

    /**
     * {@link #update} where some lanes have just started and their messages count as 0 whatever they are.
     *
     * @param keep all ones where a lane's messages count, 0 where it has just started; the row of 64 lanes repeated as
     *     often as any run has checks
     */
    void updateStarting(
            CheckRun run, MinSumArithmetic arithmetic, byte[] posterior, byte[] message, byte[] scratch, byte[] keep);

    /**
     * Takes into account which lanes leave a check of the run unsatisfied.
     *
     * @param found 64 values; those of such lanes become negative, others keep their sign
     */
    void addUnsatisfied(CheckRun run, byte[] posterior, byte[] found);

    /**
     * Starts lanes: their posteriors become the received levels, others stay.
     *
     * @param keep a row of 64 lanes, 0 for lanes that start, all ones for others
     */
    void start(byte[] posterior, byte[] received, byte[] keep);

    /** The same in 16-bit lanes, for any arithmetic. */
    void update(CheckRun run, MinSumArithmetic arithmetic, short[] posterior, short[] message, short[] scratch);

    /**
     * As in 8-bit lanes: an update where some lanes have just started and their messages count as 0 whatever they are.
     *
     * @param keep all ones where a lane's messages count, 0 where it has just started; the row of 64 lanes repeated as
     *     often as any run has checks
     */
    void updateStarting(
            CheckRun run,
            MinSumArithmetic arithmetic,
            short[] posterior,
            short[] message,
            short[] scratch,
            short[] keep);

    /**
     * As in 8-bit lanes: takes into account which lanes leave a check of the run unsatisfied.
     *
     * @param found 64 values; those of such lanes become negative, others keep their sign
     */
    void addUnsatisfied(CheckRun run, short[] posterior, short[] found);
}
