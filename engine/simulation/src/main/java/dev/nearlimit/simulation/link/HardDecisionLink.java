package dev.nearlimit.simulation.link;

import dev.nearlimit.codes.batch.FrameBatch;
import dev.nearlimit.numerics.kernels.Kernels;
import dev.nearlimit.numerics.noise.GaussianNoise;
import org.apache.commons.math3.special.Erf;

/**
 * The Gaussian link of which only the hard decision is kept: the same y of the same noise, decided 1 where y &lt; 0. The
 * receiver knows the crossover probability p = Q(sqrt(2E)), so that every LLR is +-ln((1 - p)/p).
 */
public final class HardDecisionLink implements Link {
    private final GaussianNoise noise;
    private final float sigma;
    private final float llr;

    /**
     * A link for one point.
     *
     * @param noise the point's noise
     * @param energyOverN0 energy of a real dimension over N0, linear, above 0
     */
    public HardDecisionLink(GaussianNoise noise, double energyOverN0) {
        this.noise = noise;
        this.sigma = GaussianLink.sigma(energyOverN0);
        this.llr = llrOfCrossover(crossover(energyOverN0));
    }

    /**
     * Q(sqrt(2E)) = erfc(sqrt(E))/2, at least the least normal double. Computed here and not with the limits room's tail,
     * because it enters decoders' input and so may use only arithmetic that is the same on every JVM: the library's error
     * function is made of such, the JVM's own exponential is not.
     */
    static double crossover(double energyOverN0) {
        return Math.max(Double.MIN_NORMAL, 0.5 * Erf.erfc(Math.sqrt(energyOverN0)));
    }

    /** ln((1 - p)/p), in double precision and then rounded to single. */
    static float llrOfCrossover(double p) {
        return (float) (StrictMath.log1p(-p) - StrictMath.log(p));
    }

    @Override
    public void start(long firstFrame) {
        noise.start(firstFrame);
    }

    @Override
    public void carry(long[] codeword, int first, int count, float[] values, int at) {
        noise.next(values, at, count);
        Kernels.reception().demap(codeword, first, count, sigma, 1f, values, at);
        decide(values, at, count * FrameBatch.FRAMES);
    }

    private void decide(float[] values, int at, int count) {
        for (int i = at; i < at + count; i++) {
            values[i] = values[i] < 0f ? -llr : llr;
        }
    }
}
