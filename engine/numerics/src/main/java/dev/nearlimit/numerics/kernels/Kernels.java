package dev.nearlimit.numerics.kernels;

import java.util.Optional;

/**
 * The kernels in use, chosen once when first asked for; which ones never changes a result. They are those of the Vector
 * API where the JVM was started with module {@code jdk.incubator.vector}, and plain Java where it was not or where the
 * system property {@value #CHOICE} is {@value #PLAIN}.
 */
public final class Kernels {
    /** System property that forces the plain kernels; any other value leaves the choice to the JVM. */
    public static final String CHOICE = "nearlimit.kernels";

    static final String PLAIN = "plain";

    private static final KernelSet SET = choose(
            System.getProperty(CHOICE),
            ModuleLayer.boot().findModule("jdk.incubator.vector").isPresent());

    private Kernels() {}

    /** The kernels that make noise. */
    public static NoiseKernels noise() {
        return SET.noise();
    }

    /** The kernels that turn noise into what a decoder reads. */
    public static ReceptionKernels reception() {
        return SET.reception();
    }

    /**
     * The kernels of layered fixed-point min-sum; empty in plain Java, where narrow lanes gain nothing and the decoder's
     * own loops, with lanes of 32 bits, are what the JIT makes SIMD of.
     */
    public static Optional<LayeredMinSumKernels> layeredMinSum() {
        return SET.layeredMinSum();
    }

    /** What runs, for reports: {@code plain}, or {@code vector 256-bit} with the width of the registers in use. */
    public static String name() {
        return SET.noise().name();
    }

    static KernelSet choose(String choice, boolean vectorsPresent) {
        // Nothing here may name a vector class: without the module it could not be linked.
        return vectorsPresent && !PLAIN.equals(choice) ? vector() : plain();
    }

    static KernelSet plain() {
        return new KernelSet(new PlainNoiseKernels(), new PlainReceptionKernels(), Optional.empty());
    }

    private static KernelSet vector() {
        return VectorKernels.all();
    }
}
