package dev.nearlimit.numerics.kernels;

/**
 * From noise to what a decoder reads, for 64 frames side by side (position-major: frame f of position i at 64*i + f).
 * All arithmetic is single precision, in the order written, each operation rounded by itself. Positions are done a few
 * at a time, so that their values stay in the first-level cache from the noise to the quantiser.
 */
public interface ReceptionKernels {
    /**
     * Antipodal signals in noise, demapped: value = (s + sigma * value) * scale, with s = +1 where the bit is 0 and -1
     * where it is 1.
     *
     * @param bits bits of all positions, bit f of a word belonging to frame f
     * @param first the first position
     * @param positions how many
     * @param values noise of these positions from {@code at} on; receives LLRs
     */
    void demap(long[] bits, int first, int positions, float sigma, float scale, float[] values, int at);

    /**
     * A mid-tread quantiser: with y = min(|x / step|, rail), the level is the whole part of y, raised by 1 where the rest
     * is at least 1/2, with the sign of x. Each x becomes (float) level * step.
     *
     * @param values x from {@code at} on; receives what the levels stand for
     * @param count a multiple of 64
     * @param step above 0
     * @param rail the outermost level, 1 .. 127
     * @param levels receives the levels from {@code levelsAt} on
     */
    void midTread(float[] values, int at, int count, float step, int rail, byte[] levels, int levelsAt);

    /**
     * A mid-rise quantiser: with i the whole part of min(|x / step|, rail), the level is 2i + 1 with the sign of x (plus
     * for 0). Each x becomes (float) level * (step * 0.5f).
     *
     * @param values x from {@code at} on; receives what the levels stand for
     * @param count a multiple of 64
     * @param step above 0
     * @param rail 0 .. 63
     * @param levels receives the levels from {@code levelsAt} on
     */
    void midRise(float[] values, int at, int count, float step, int rail, byte[] levels, int levelsAt);
}
