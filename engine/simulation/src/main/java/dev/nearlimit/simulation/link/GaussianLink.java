package dev.nearlimit.simulation.link;

import dev.nearlimit.numerics.kernels.Kernels;
import dev.nearlimit.numerics.noise.GaussianNoise;

/**
 * Antipodal signalling in white Gaussian noise: code bit i of a frame takes real dimension i, y = (1 - 2b) + sigma z
 * with z sample i of the frame's noise, and the LLR is 2 y / sigma^2. BPSK sends dimension i as symbol i; QPSK sends
 * dimensions 2j and 2j + 1 as the two axes of symbol j, the second axis of a last symbol staying empty when n is odd. So
 * both modulations meet the same noise bit by bit.
 *
 * <p>With E the energy of a dimension over N0 (E = R Eb/N0), sigma = (float) sqrt(1 / (2E)) and the LLR is
 * (float) (4E) * y; sums and products are single precision, each rounded. A receiver that is mistaken about noise or
 * amplitude multiplies y by another number, which is all that its mistakes do to antipodal signals.
 */
public final class GaussianLink implements Link {
    private final GaussianNoise noise;
    private final float sigma;
    private final float llrOfUnit;

    /**
     * A link for one point, to a receiver that knows noise and amplitude.
     *
     * @param noise the point's noise
     * @param energyOverN0 energy of a real dimension over N0, linear, above 0
     */
    public GaussianLink(GaussianNoise noise, double energyOverN0) {
        this(noise, energyOverN0, 1);
    }

    /**
     * A link for one point.
     *
     * @param noise the point's noise
     * @param energyOverN0 energy of a real dimension over N0, linear, above 0
     * @param llrFactor what the receiver's LLRs are of the true ones, linear, above 0: 1 where it knows noise and
     *     amplitude. The product 4E times this factor is formed in double precision and then rounded
     */
    public GaussianLink(GaussianNoise noise, double energyOverN0, double llrFactor) {
        this.noise = noise;
        this.sigma = sigma(energyOverN0);
        this.llrOfUnit = (float) (4 * energyOverN0 * llrFactor);
    }

    /** Standard deviation of the noise in a dimension whose signal is +-1. */
    static float sigma(double energyOverN0) {
        return (float) Math.sqrt(1 / (2 * energyOverN0));
    }

    @Override
    public void start(long firstFrame) {
        noise.start(firstFrame);
    }

    @Override
    public void carry(long[] codeword, int first, int count, float[] values, int at) {
        noise.next(values, at, count);
        Kernels.reception().demap(codeword, first, count, sigma, llrOfUnit, values, at);
    }
}
