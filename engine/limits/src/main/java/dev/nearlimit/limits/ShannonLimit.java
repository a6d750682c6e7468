package dev.nearlimit.limits;

/**
 * The capacity of the real AWGN channel with free input under a power constraint, and the least Eb/N0 that follows
 * (Shannon, Bell Syst. Tech. J. 27, 1948, Theorem 17; Proc. IRE 37, 1949).
 *
 * <p>Rates and efficiencies are in bits per real dimension; {@code esn0} is the energy per real dimension over N0, so
 * that the signal-to-noise ratio in that dimension is 2 esn0. Closed forms; relative error below 1e-12.
 */
public final class ShannonLimit {
    private static final double LN2 = Math.log(2);
    /** Below this, exp does not overflow. */
    private static final double LARGEST_EXPONENT = 700;

    private ShannonLimit() {}

    /** 1/2 log2(1 + 2 esn0) in bits per real dimension. */
    public static double capacity(double esn0) {
        return 0.5 * Math.log1p(2 * Checks.energy(esn0)) / LN2;
    }

    /**
     * The least Eb/N0 in dB at which reliable transmission is possible: (2^(2 rate) - 1) / (2 rate). Tends to ln 2,
     * -1.59 dB, as the rate tends to 0.
     *
     * @param rate above 0, in bits per real dimension; may exceed 1
     */
    public static double leastEbn0Db(double rate) {
        double x = 2 * LN2 * Checks.positive(rate, "rate");
        return x < LARGEST_EXPONENT
                ? Decibels.fromLinear(Math.expm1(x) / (2 * rate))
                : Decibels.fromNaturalLog(Math.log(LN2) + logGrowth(x));
    }

    /** The largest number of bits per real dimension at an Eb/N0; 0 at and below ln 2, -1.59 dB. */
    public static double efficiencyAt(double ebn0Db) {
        double wanted = Checks.finite(ebn0Db, "Eb/N0 in dB") * Math.log(10) / 10 - Math.log(LN2);
        if (wanted <= 0) {
            return 0;
        }
        // x/2 <= ln((e^x - 1)/x) <= x for x >= 0.
        double lowest = wanted;
        double highest = 2 * wanted;
        if (!(logGrowth(lowest) < wanted && logGrowth(highest) > wanted)) {
            // So close to -1.59 dB that x/2 is exact to rounding.
            return highest / (2 * LN2);
        }
        double x =
                Math.exp(RootSearch.between(y -> logGrowth(Math.exp(y)) - wanted, Math.log(lowest), Math.log(highest)));
        return x / (2 * LN2);
    }

    /** ln((e^x - 1)/x), without overflow. */
    private static double logGrowth(double x) {
        return x > 1 ? x + Math.log(-Math.expm1(-x) / x) : Math.log(Math.expm1(x) / x);
    }
}
