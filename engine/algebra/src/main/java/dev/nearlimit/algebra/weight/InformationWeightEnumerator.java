package dev.nearlimit.algebra.weight;

import java.math.BigInteger;
import java.util.Objects;
import java.util.Optional;

/**
 * A weight enumerator together with the total information weight W_w of the words of each weight: the number of ones
 * that those words carry at the code's information positions, all added up. A bit error rate needs it: a decoder that
 * takes a word of weight w for the zero word makes W_w / A_w information bit errors on average.
 *
 * <p>The totals depend on which positions are information positions. Where they are not known, the approximation
 * W_w = k A_w w / n serves (common practice; exact for cyclic codes, and for every code with a transitive automorphism
 * group), and {@link #exact()} is false.
 */
public final class InformationWeightEnumerator {
    private final WeightEnumerator weights;
    private final BigInteger[] totals;

    private InformationWeightEnumerator(WeightEnumerator weights, BigInteger[] totals) {
        this.weights = weights;
        this.totals = totals;
    }

    /**
     * An enumerator with exact totals.
     *
     * @param totals n + 1 numbers, W_w at index w
     * @throws IllegalArgumentException if their number is wrong or one lies outside 0 .. A_w min(w, k)
     */
    public static InformationWeightEnumerator exact(WeightEnumerator weights, BigInteger... totals) {
        if (totals.length != weights.n() + 1) {
            throw new IllegalArgumentException("there are " + totals.length + " totals, a code of length " + weights.n()
                    + " has " + (weights.n() + 1));
        }
        for (int w = 0; w < totals.length; w++) {
            BigInteger most = weights.count(w).multiply(BigInteger.valueOf(Math.min(w, weights.k())));
            if (totals[w].signum() < 0 || totals[w].compareTo(most) > 0) {
                throw new IllegalArgumentException(
                        "total information weight at weight " + w + " is " + totals[w] + ", must be 0 .. " + most);
            }
        }
        return new InformationWeightEnumerator(weights, totals.clone());
    }

    /** The approximation that spreads the ones of a word evenly over its n positions. */
    public static InformationWeightEnumerator proportional(WeightEnumerator weights) {
        return new InformationWeightEnumerator(weights, null);
    }

    public WeightEnumerator weights() {
        return weights;
    }

    /** Whether the information weights are counted; otherwise they are the approximation w / n. */
    public boolean exact() {
        return totals != null;
    }

    /** W_w, where it was counted. */
    public Optional<BigInteger> total(int weight) {
        Objects.checkIndex(weight, weights.n() + 1);
        return exact() ? Optional.of(totals[weight]) : Optional.empty();
    }

    /**
     * Fraction of the k information bits that are 1, averaged over the words of a weight: W_w / (k A_w), in [0, 1], or
     * w / n where only the approximation is known. 0 for a weight that does not occur.
     */
    public double meanInformationFraction(int weight) {
        BigInteger count = weights.count(weight);
        if (count.signum() == 0) {
            return 0;
        }
        if (!exact()) {
            return (double) weight / weights.n();
        }
        return ratio(totals[weight], count.multiply(BigInteger.valueOf(weights.k())));
    }

    /** The quotient of two numbers that may both be far beyond a double's range, to 1e-15 or so; at most 1. */
    private static double ratio(BigInteger part, BigInteger whole) {
        int excess = Math.max(0, whole.bitLength() - 512);
        return part.shiftRight(excess).doubleValue() / whole.shiftRight(excess).doubleValue();
    }
}
