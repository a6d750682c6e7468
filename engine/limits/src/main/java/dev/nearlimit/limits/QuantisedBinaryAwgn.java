package dev.nearlimit.limits;

import org.apache.commons.math3.analysis.UnivariateFunction;

/**
 * The real AWGN channel with equiprobable antipodal input whose decoder sees LLRs through a uniform quantiser.
 *
 * <p>With g = esn0, the energy per real dimension over N0, the LLR given the sent bit is normal with mean 4g and variance
 * 8g. A cell between two thresholds and its mirror image form a binary symmetric channel that is in use with the
 * probability of either, so that
 *
 * <pre>
 *     C = sum over pairs of cells of (p + q) (1 - h(q / (p + q)))
 * 1 - C = P(zero cell) + sum over pairs of cells of (p + q) h(q / (p + q))
 * </pre>
 *
 * <p>with p and q the probabilities of the cell and of its image given that 0 was sent, h the binary entropy function, and
 * the zero cell there for mid-tread only. Cell probabilities are differences of Gaussian tails, taken on the side where
 * the tail is small. Relative error of both forms below 1e-9 for rates from 1e-6 to 1 - 1e-9.
 *
 * <p>The thresholds are fixed LLRs. So they move against the noise when Es/N0 changes, as in a receiver that computes true
 * LLRs and quantises them with a step that is fixed in hardware.
 */
public final class QuantisedBinaryAwgn {
    private static final double CROSSOVER_SMALL = 0.1;
    /** The search ends here: a step of 10000 needs no more. */
    private static final double HIGHEST_ESN0 = 1e7;

    private final UniformLlrQuantiser quantiser;

    /** The channel with a quantiser. */
    public QuantisedBinaryAwgn(UniformLlrQuantiser quantiser) {
        this.quantiser = quantiser;
    }

    /** Capacity in bits per real dimension, in [0, 1]. */
    public double capacity(double esn0) {
        if (Checks.energy(esn0) == 0) {
            return 0;
        }
        double[] total = {0};
        overPairs(esn0, (right, wrong) -> total[0] += (right + wrong) * capacityOfPair(right, wrong));
        return Math.min(1, total[0]);
    }

    /** One minus the capacity, in bits, with its relative accuracy kept where it is tiny. */
    double loss(double esn0) {
        if (Checks.energy(esn0) == 0) {
            return 1;
        }
        double[] total = {zeroCell(esn0)};
        overPairs(
                esn0,
                (right, wrong) -> total[0] +=
                        (right + wrong) * BinarySymmetricChannel.entropy(Math.min(right, wrong) / (right + wrong)));
        return Math.min(1, total[0]);
    }

    /** The least Es/N0 (linear, per real dimension) at which the capacity reaches a rate in (0, 1). */
    public double leastEsn0(double rate) {
        // No quantiser adds information.
        double low = BinaryInputAwgn.leastEsn0(rate) * (1 - 1e-6);
        double high = 2 * low;
        while (!reaches(high, rate)) {
            low = high;
            high *= 2;
            if (high > HIGHEST_ESN0) {
                throw new InvalidLimitException(
                        "rate " + rate + " is out of reach behind a quantiser of step " + quantiser.step());
            }
        }
        UnivariateFunction mismatch = rate < 0.5
                ? x -> Math.log(Math.max(Double.MIN_NORMAL, capacity(Math.exp(x))) / rate)
                : x -> Math.log(Math.max(Double.MIN_NORMAL, loss(Math.exp(x))) / (1 - rate));
        return Math.exp(RootSearch.between(mismatch, Math.log(low), Math.log(high)));
    }

    /**
     * The least Eb/N0 in dB at which reliable transmission at a rate is possible behind the quantiser.
     *
     * @param rate in (0, 1), bits per real dimension
     */
    public double leastEbn0Db(double rate) {
        return Decibels.fromLinear(leastEsn0(rate) / rate);
    }

    /** What the quantiser costs at a rate in (0, 1): its least Eb/N0 less that of unquantised LLRs, in dB. */
    public double lossDb(double rate) {
        return Decibels.fromLinear(leastEsn0(rate) / BinaryInputAwgn.leastEsn0(rate));
    }

    private boolean reaches(double esn0, double rate) {
        return rate < 0.5 ? capacity(esn0) > rate : loss(esn0) < 1 - rate;
    }

    private static double capacityOfPair(double right, double wrong) {
        double p = Math.min(right, wrong) / (right + wrong);
        return p < CROSSOVER_SMALL
                ? 1 - BinarySymmetricChannel.entropy(p)
                : BinarySymmetricChannel.capacityOfBias(Math.abs(right - wrong) / (right + wrong));
    }

    private interface PairVisitor {
        void visit(double right, double wrong);
    }

    /** Every cell above 0, outwards, with its probability and that of its mirror image given that 0 was sent. */
    private void overPairs(double esn0, PairVisitor visitor) {
        double mean = Math.sqrt(2 * esn0);
        double perUnit = 1 / Math.sqrt(8 * esn0);
        int thresholds = quantiser.positiveThresholds();
        int first = quantiser.rise() == QuantiserRise.MID_TREAD ? 1 : 0;
        for (int number = first; number <= thresholds; number++) {
            double inner = number == 0 ? 0 : quantiser.threshold(number) * perUnit;
            double outer = number == thresholds ? Double.POSITIVE_INFINITY : quantiser.threshold(number + 1) * perUnit;
            double right = between(inner - mean, outer - mean);
            double wrong = between(inner + mean, outer + mean);
            if (right + wrong > 0) {
                visitor.visit(right, wrong);
            }
        }
    }

    private double zeroCell(double esn0) {
        if (quantiser.rise() == QuantiserRise.MID_RISE) {
            return 0;
        }
        double mean = Math.sqrt(2 * esn0);
        double edge = quantiser.threshold(1) / Math.sqrt(8 * esn0);
        return between(-edge - mean, edge - mean);
    }

    /** P(a &lt; Z &lt; b) of a standard normal Z. */
    private static double between(double a, double b) {
        return a < 0 && b <= 0 ? GaussianTail.q(-b) - GaussianTail.q(-a) : GaussianTail.q(a) - GaussianTail.q(b);
    }
}
