package dev.nearlimit.numerics.kernels;

/**
 * The radius of the Box-Muller transform, sqrt(-2 ln u), from a draw of 31 bits.
 *
 * <p>A draw's upper 31 bits name a cell of width 2^-31 in (0, 1), and u is its middle. Where the logarithm is steep that
 * would be too coarse: below {@link #REFINED_CELLS} cells, which is beyond 5.88 sigma, 64 more bits place u inside the
 * cell, and radii reach 11.4.
 *
 * <p>The logarithm splits w = u * 2^31 into m * 2^e with m in [sqrt(1/2), sqrt(2)) and takes a polynomial of degree 9 in
 * m - 1; the coefficients are those of the Cephes library's single-precision logarithm (S. L. Moshier). Absolute error
 * of ln u is below 2e-7 + 2^-23 |ln u|; the tests hold it.
 */
public final class Radius {
    /** Draws whose upper 31 bits are below this are refined. */
    public static final int REFINED_CELLS = 64;

    private static final int SQRT_HALF_BITS = 0x3f3504f3;
    private static final float LN_2 = 0.69314718056f;
    private static final double TWO_TO_MINUS_63 = 0x1p-63;
    private static final double TWO_TO_MINUS_64 = 0x1p-64;

    private Radius() {}

    /** The cell that a draw names: its upper 31 bits. */
    public static int cell(int draw) {
        return draw >>> 1;
    }

    /** The radius for the middle of the draw's cell. */
    public static float ofDraw(int draw) {
        return ofScaled((float) (draw >>> 1) + 0.5f);
    }

    /**
     * The radius for a place inside a cell: w = (float) ((double) cell + v), where v = (double) (bits >>> 1) * 2^-63 +
     * 2^-64 is, before rounding to double precision, an odd multiple of 2^-64 in (0, 1).
     *
     * @param cell cell number, below {@link #REFINED_CELLS}
     * @param bits 64 random bits that are no part of the draw
     */
    public static float refined(int cell, long bits) {
        double v = (double) (bits >>> 1) * TWO_TO_MINUS_63 + TWO_TO_MINUS_64;
        return ofScaled((float) ((double) cell + v));
    }

    /** sqrt(-2 ln(w / 2^31)) for w in (0, 2^31]. */
    static float ofScaled(float w) {
        float ln = logarithmOfScaled(w);
        return (float) Math.sqrt(Math.max(ln * -2f, 0f));
    }

    /** ln(w / 2^31). */
    static float logarithmOfScaled(float w) {
        int bits = Float.floatToRawIntBits(w);
        int e = (bits - SQRT_HALF_BITS) >> 23;
        float m = Float.intBitsToFloat(bits - (e << 23)) - 1f;
        float p = m * 7.0376836292E-2f + -1.1514610310E-1f;
        p = p * m + 1.1676998740E-1f;
        p = p * m + -1.2420140846E-1f;
        p = p * m + 1.4249322787E-1f;
        p = p * m + -1.6668057665E-1f;
        p = p * m + 2.0000714765E-1f;
        p = p * m + -2.4999993993E-1f;
        p = p * m + 3.3333331174E-1f;
        float z = m * m;
        return p * m * z - z * 0.5f + m + ((float) e - 31f) * LN_2;
    }
}
