package dev.nearlimit.numerics.functions;

/**
 * The exponential function of exactly rounded operations in a fixed order, so that it is the same on every JVM, and some
 * times faster than the library's strict one. x = k ln 2 + r with a whole k and |r| at most ln 2 / 2 (in two parts: W. J.
 * Cody, W. Waite, Software Manual for the Elementary Functions, 1980), the Taylor series of exp(r) to degree 13, whose
 * remainder is below 5e-18, and a scaling by 2^k.
 */
public final class Exponential {
    /** The least and greatest arguments: results are normal doubles between them. */
    private static final double MOST = 708;

    private static final double LOG2_E = 1.4426950408889634;
    /** ln 2, its last 32 bits zero, so that its product with k is exact. */
    private static final double LN2_HIGH = 6.93147180369123816490e-01;
    /** What that leaves of ln 2. */
    private static final double LN2_LOW = 1.90821492927058770002e-10;

    private static final int BIAS = 1023;
    private static final int MANTISSA_BITS = 52;

    private Exponential() {}

    /**
     * exp(x) with a relative error below 1e-15 for x from -708 to 708; 0 below. Not meant for larger or for NaN, which
     * give no defined result.
     */
    public static double of(double x) {
        if (x < -MOST) {
            return 0;
        }
        double k = Math.rint(x * LOG2_E);
        double r = x - k * LN2_HIGH - k * LN2_LOW;
        double series = 1.0 / 6227020800.0;
        series = series * r + 1.0 / 479001600.0;
        series = series * r + 1.0 / 39916800.0;
        series = series * r + 1.0 / 3628800.0;
        series = series * r + 1.0 / 362880.0;
        series = series * r + 1.0 / 40320.0;
        series = series * r + 1.0 / 5040.0;
        series = series * r + 1.0 / 720.0;
        series = series * r + 1.0 / 120.0;
        series = series * r + 1.0 / 24.0;
        series = series * r + 1.0 / 6.0;
        series = series * r + 0.5;
        series = series * r + 1;
        series = series * r + 1;
        return series * Double.longBitsToDouble(((long) k + BIAS) << MANTISSA_BITS);
    }
}
