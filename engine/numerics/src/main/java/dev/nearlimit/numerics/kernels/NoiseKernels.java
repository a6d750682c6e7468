package dev.nearlimit.numerics.kernels;

/**
 * The passes that turn random streams into Gaussian samples, each a small loop over buffers that fit in the first-level
 * cache. A row is 64 lanes. All arithmetic is single precision, in the order written, each operation rounded by itself.
 *
 * <p>A 64-bit draw gives two samples (Box and Muller 1958): its high half a radius, its low half an angle.
 */
public interface NoiseKernels {
    /** The name by which a report says what ran: {@code plain}, or {@code vector 256-bit} with the registers' width. */
    String name();

    /**
     * Steps 64 lanes of xoshiro256++ (D. Blackman, S. Vigna, "Scrambled linear pseudorandom number generators", ACM
     * TOMS 47, 2021).
     *
     * @param state word w of lane l at 64*w + l; is moved on
     * @param draws receives draw s of lane l at 64*s + l
     * @param steps rows to fill
     */
    void fill(long[] state, long[] draws, int steps);

    /**
     * Steps the lanes like {@link #fill} and parts the draws into halves. Lanes of even number stand first in the state,
     * so that halves of two neighbours lie side by side without moving anything across a register.
     *
     * @param state word w of lane l at 64*w + l/2 for even l, at 64*w + 32 + (l-1)/2 for odd l; is moved on
     * @param high receives bits 63..32 of draw s of lane l at 64*s + l
     * @param low receives bits 31..0
     * @param steps rows to fill
     */
    void halves(long[] state, int[] high, int[] low, int steps);

    /**
     * radius[i] = {@link Radius#ofDraw}(high[i]); count is a multiple of 64.
     *
     * @param scratch count values whose contents do not matter
     * @return whether any draw is below {@link Radius#REFINED_CELLS} cells: such draws are rare and are refined by the
     *     caller
     */
    boolean radius(int[] high, float[] radius, float[] scratch, int count);

    /**
     * Turns radii into pairs of samples.
     *
     * <p>With b = low[i]: t = (float) (b &lt;&lt; 2) * (float) (pi/2^33) lies in [-pi/4, pi/4]. Sine and cosine are odd
     * and even polynomials in t. Bit 31 of b is the sign of the cosine, bit 30 exchanges the two: the four quarter turns
     * around the circle.
     *
     * @param low angle draws, row-major
     * @param radius radii, row-major
     * @param samples receives pair j of lane l at {@code at} + 128*j + l and {@code at} + 128*j + 64 + l
     * @param at where the samples begin
     * @param count pairs, a multiple of 64
     */
    void rotate(int[] low, float[] radius, float[] samples, int at, int count);
}
