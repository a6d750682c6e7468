package dev.nearlimit.numerics.functions;

/**
 * The correction term of the box-plus operation and of max-star, f(x) = ln(1 + e^-x) for x >= 0, in single precision.
 *
 * <p>The value is u^8 with u a polynomial of degree 5 in min(x, 12), evaluated by Horner's rule from the highest degree
 * (each product and each sum rounded on its own) and squared three times. The coefficients are a minimax fit to
 * f^(1/8), weighted so that the absolute error of f is least (computed by iteratively reweighted least squares on
 * Chebyshev nodes).
 *
 * <p>The absolute error against ln(1 + e^-x) is below {@link #MAX_ERROR} for every x >= 0; beyond 12, where f is below
 * 6.2e-6, the value stays at 4.5e-7. The approximation never rises by more than 1.2e-7, one rounding of its largest
 * value, from one x to a larger one.
 */
public final class BoxPlusCorrection {
    /** Bound on the absolute error. */
    public static final float MAX_ERROR = 5e-5f;

    /** Beyond this x the value stays what it is there. */
    public static final float LIMIT = 12f;

    /** Coefficient of y^5, y = min(x, {@link #LIMIT}); the following ones are those of the lower powers. */
    public static final float C5 = 6.694848e-6f;

    public static final float C4 = -2.1222944e-4f;
    public static final float C3 = 2.2530386e-3f;
    public static final float C2 = -6.3993554e-3f;
    public static final float C1 = -8.592438e-2f;
    public static final float C0 = 0.95521116f;

    private BoxPlusCorrection() {}

    /**
     * The approximation of ln(1 + e^-x).
     *
     * @param x at least 0
     */
    public static float of(float x) {
        float y = Math.min(x, LIMIT);
        float u = ((((C5 * y + C4) * y + C3) * y + C2) * y + C1) * y + C0;
        u = u * u;
        u = u * u;
        return u * u;
    }

    /** Replaces the first {@code count} values, each at least 0, by their approximations; the JIT makes SIMD of it. */
    public static void replace(float[] values, int count) {
        for (int i = 0; i < count; i++) {
            values[i] = of(values[i]);
        }
    }
}
