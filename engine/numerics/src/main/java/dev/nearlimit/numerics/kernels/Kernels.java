package dev.nearlimit.numerics.kernels;

/** The kernels in use, chosen once when first asked for; which ones never changes a result. */
public final class Kernels {
    private static final NoiseKernels NOISE = new PlainNoiseKernels();

    private Kernels() {}

    /** The kernels that make noise. */
    public static NoiseKernels noise() {
        return NOISE;
    }

    /** What runs, for reports: {@code plain}. */
    public static String name() {
        return NOISE.name();
    }
}
