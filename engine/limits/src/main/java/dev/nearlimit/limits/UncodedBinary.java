package dev.nearlimit.limits;

/**
 * Uncoded coherent BPSK, or Gray-labelled QPSK, on the AWGN channel: bit error rate Q(sqrt(2 Eb/N0)) (e.g. Proakis,
 * Digital Communications, 4th ed. 2001, chapter 5). Exact to a relative 1e-12 while the rate is a normal double.
 */
public final class UncodedBinary {
    private UncodedBinary() {}

    /** Bit error rate at an Eb/N0; 0 where it is below the least double. */
    public static double bitErrorRate(double ebn0Db) {
        return GaussianTail.q(Math.sqrt(2 * Decibels.toLinear(Checks.finite(ebn0Db, "Eb/N0 in dB"))));
    }

    /**
     * The Eb/N0 in dB at which the bit error rate is {@code ber}.
     *
     * @param ber in (0, 1/2)
     */
    public static double ebn0DbForBitErrorRate(double ber) {
        if (!(ber > 0 && ber < 0.5)) {
            throw new InvalidLimitException("bit error rate is " + ber + ", must lie between 0 and 0.5, both excluded");
        }
        double x = GaussianTail.inverse(ber);
        return Decibels.fromLinear(0.5 * x * x);
    }
}
