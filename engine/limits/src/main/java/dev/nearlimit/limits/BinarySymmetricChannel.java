package dev.nearlimit.limits;

/**
 * The binary symmetric channel: capacity 1 - h(p) bits a use, h the binary entropy function (Shannon, Bell Syst. Tech. J.
 * 27, 1948). Closed form; relative error below 1e-12 of the capacity, also where p is close to 1/2.
 */
public final class BinarySymmetricChannel {
    private static final double LN2 = Math.log(2);
    private static final double CLOSE_TO_ZERO = 0.1;

    private BinarySymmetricChannel() {}

    /**
     * Capacity in bits a use.
     *
     * @param p crossover probability in [0, 1]
     */
    public static double capacity(double p) {
        if (!(p >= 0 && p <= 1)) {
            throw new InvalidLimitException("crossover probability is " + p + ", must be in [0, 1]");
        }
        double least = Math.min(p, 1 - p);
        return least < CLOSE_TO_ZERO ? 1 - entropy(least) : capacityOfBias(1 - 2 * least);
    }

    /** Capacity for a bias 1 - 2p of any size, without cancellation where the bias is small. */
    static double capacityOfBias(double bias) {
        // 1 - h(p) = (d atanh d + 1/2 ln(1 - d^2)) / ln 2 with d = 1 - 2p.
        double atanh = 0.5 * (Math.log1p(bias) - Math.log1p(-bias));
        return (bias * atanh + 0.5 * Math.log1p(-bias * bias)) / LN2;
    }

    /** The binary entropy function in bits, for p in (0, 1/2]. */
    static double entropy(double p) {
        return p == 0 ? 0 : -(p * Math.log(p) + (1 - p) * Math.log1p(-p)) / LN2;
    }

    /**
     * The largest crossover probability, in (0, 1/2), whose capacity still reaches a rate.
     *
     * @param rate in (0, 1), bits a use
     */
    public static double largestCrossover(double rate) {
        Checks.insideUnitInterval(rate, "rate");
        if (rate < 0.5) {
            // d^2/(2 ln 2) <= capacity <= d^2 for a bias d.
            double least = Math.sqrt(rate) * (1 - 1e-9);
            double most = Math.sqrt(2 * LN2 * rate) * (1 + 1e-9);
            double logBias = RootSearch.between(
                    x -> Math.log(capacityOfBias(Math.exp(x)) / rate), Math.log(least), Math.log(most));
            return 0.5 * (1 - Math.exp(logBias));
        }
        double lost = 1 - rate;
        double logP = RootSearch.between(x -> Math.log(entropy(Math.exp(x)) / lost), Math.log(1e-18), Math.log(0.25));
        return Math.exp(logP);
    }
}
