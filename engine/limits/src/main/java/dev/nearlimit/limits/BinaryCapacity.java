package dev.nearlimit.limits;

import java.util.function.DoubleUnaryOperator;
import org.apache.commons.math3.analysis.UnivariateFunction;

/** Inverts the capacity of a binary-input channel: which Es/N0 carries a rate. */
final class BinaryCapacity {
    /** Every binary-input channel here has lost less than 1e-40 bit at this Es/N0. */
    private static final double HIGHEST_ESN0 = 100;

    private BinaryCapacity() {}

    /**
     * The least Es/N0 at which capacity reaches the rate.
     *
     * <p>Below 1/2 the logarithm of the capacity is matched, above the logarithm of what is lost, so that the answer
     * keeps its relative accuracy at both ends.
     *
     * @param capacity of Es/N0, in bits, growing
     * @param loss one minus the capacity, computed without cancellation
     * @param lowSnrSlope an upper bound on capacity / (Es/N0)
     */
    static double esn0ForRate(DoubleUnaryOperator capacity, DoubleUnaryOperator loss, double lowSnrSlope, double rate) {
        // The margin makes room for rounding where the bound is all but met.
        double lowest = rate / lowSnrSlope * (1 - 1e-6);
        UnivariateFunction mismatch = rate < 0.5
                ? x -> Math.log(capacity.applyAsDouble(Math.exp(x)) / rate)
                : x -> Math.log(loss.applyAsDouble(Math.exp(x)) / (1 - rate));
        return Math.exp(RootSearch.between(mismatch, Math.log(lowest), Math.log(HIGHEST_ESN0)));
    }
}
