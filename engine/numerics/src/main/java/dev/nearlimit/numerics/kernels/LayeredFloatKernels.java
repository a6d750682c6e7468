package dev.nearlimit.numerics.kernels;

/**
 * Layered belief propagation in single precision, 64 frames side by side (position-major: frame f of position i at
 * 64*i + f). A check reads t = posterior - its last message from each of its bits; makes a message to each of them out of
 * the others' t, limited to -L .. L with L the largest message; and sets the posterior to t plus the new message. A check
 * of weight 1 sends L, corrected as any message.
 *
 * <p>No posterior may be NaN or -0; then none ever becomes so, and the sign of a message of zero makes no difference.
 */
public interface LayeredFloatKernels {
    /**
     * Does the checks of one run by the box-plus operation on pairs,
     *
     * <pre>a (+) b = sign(a) sign(b) min(|a|, |b|) + (f(|a + b|) - f(|a - b|))</pre>
     *
     * with f of {@link dev.nearlimit.numerics.functions.BoxPlusCorrection}, forward and backward along the row: with (+)
     * applied from left to right, and t_0 .. t_(d-1) the values read,
     *
     * <pre>
     * F_0 = t_0,                F_i = F_(i-1) (+) t_i       for i = 1 .. d-2
     * B_(d-1) = t_(d-1),        B_i = B_(i+1) (+) t_i       for i = d-2 .. 1
     * m_0 = B_1,  m_i = F_(i-1) (+) B_(i+1),  m_(d-1) = F_(d-2)
     * </pre>
     *
     * @param largest L
     * @param posterior of all bits; those of the run are updated
     * @param message of all edges; those of the run are updated
     * @param scratch {@link #scratch(CheckRun)} values whose contents do not matter
     */
    void sumProduct(CheckRun run, float largest, float[] posterior, float[] message, float[] scratch);

    /**
     * Does the checks of one run by min-sum: the least magnitude of the others with the product of their signs, its
     * magnitude m corrected to m * factor - min(offset, m * factor) before it is limited.
     *
     * @param correction with L
     */
    void minSum(CheckRun run, FloatCorrection correction, float[] posterior, float[] message, float[] scratch);

    /**
     * Takes into account which lanes leave a check of the run unsatisfied.
     *
     * @param found 64 values; those of such lanes become -0, which are +0 at first
     */
    void addUnsatisfied(CheckRun run, float[] posterior, float[] found);

    /** Values of scratch memory that the kernels need for a run. */
    static int scratch(CheckRun run) {
        int blocks = Math.min(run.lanes(), MOST_LANES);
        return (2 * run.bits().length + 4) * blocks;
    }

    /** Lanes that are done together at most, so that their values stay in the first-level cache; a multiple of 64. */
    int MOST_LANES = 128;
}
