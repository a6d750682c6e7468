package dev.nearlimit.limits;

import org.apache.commons.math3.special.Erf;

/**
 * The real AWGN channel with antipodal input whose receiver keeps only the sign: a binary symmetric channel with
 * crossover probability Q(sqrt(2 esn0)), esn0 being the energy per real dimension over N0. Closed forms; relative error
 * of capacities below 1e-11.
 */
public final class HardDecisionAwgn {
    private static final double LN2 = Math.log(2);
    private static final double CROSSOVER_SMALL = 0.1;

    private HardDecisionAwgn() {}

    /** Probability that a sign is wrong: Q(sqrt(2 esn0)). */
    public static double crossover(double esn0) {
        return GaussianTail.q(Math.sqrt(2 * Checks.energy(esn0)));
    }

    /** Capacity in bits per real dimension, in [0, 1]. */
    public static double capacity(double esn0) {
        double p = crossover(esn0);
        // 1 - 2 Q(sqrt(2g)) = erf(sqrt(g)), exact where p is close to 1/2.
        return p < CROSSOVER_SMALL
                ? 1 - BinarySymmetricChannel.entropy(p)
                : BinarySymmetricChannel.capacityOfBias(Erf.erf(Math.sqrt(esn0)));
    }

    /** One minus the capacity, with its relative accuracy kept where it is tiny. */
    private static double loss(double esn0) {
        return BinarySymmetricChannel.entropy(crossover(esn0));
    }

    /** The least Es/N0 (linear, per real dimension) at which the capacity reaches a rate in (0, 1). */
    public static double leastEsn0(double rate) {
        Checks.insideUnitInterval(rate, "rate");
        // Slope at the origin: 1 - h((1 - d)/2) ~ d^2/(2 ln 2) with d = erf(sqrt(g)) ~ 2 sqrt(g/pi).
        return BinaryCapacity.esn0ForRate(
                HardDecisionAwgn::capacity, HardDecisionAwgn::loss, 2 / (Math.PI * LN2), rate);
    }

    /**
     * The least Eb/N0 in dB at which reliable transmission at a rate is possible from hard decisions. Tends to
     * (pi/2) ln 2, 0.37 dB, as the rate tends to 0.
     *
     * @param rate in (0, 1), bits per real dimension
     */
    public static double leastEbn0Db(double rate) {
        return Decibels.fromLinear(leastEsn0(rate) / rate);
    }
}
