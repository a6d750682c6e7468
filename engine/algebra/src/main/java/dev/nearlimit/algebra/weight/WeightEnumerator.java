package dev.nearlimit.algebra.weight;

import java.math.BigInteger;
import java.util.Arrays;
import java.util.Objects;
import java.util.stream.IntStream;

/**
 * The numbers A_0 .. A_n of words of each Hamming weight of a binary linear code of length n and dimension k, exact and
 * complete. Immutable; A_0 is 1 and the counts add up to 2^k.
 */
public final class WeightEnumerator {
    private final BigInteger[] counts;
    private final int k;

    private WeightEnumerator(BigInteger[] counts, int k) {
        this.counts = counts;
        this.k = k;
    }

    /**
     * An enumerator from the counts A_0 .. A_n.
     *
     * @param counts n + 1 numbers, n at least 1
     * @throws IllegalArgumentException if A_0 is not 1, a count is negative, or the total is no power of two up to 2^n
     */
    public static WeightEnumerator of(BigInteger... counts) {
        if (counts.length < 2) {
            throw new IllegalArgumentException("there are " + counts.length + " counts, must be at least 2 (n = 1)");
        }
        if (!counts[0].equals(BigInteger.ONE)) {
            throw new IllegalArgumentException(
                    "A_0 is " + counts[0] + ", a linear code has exactly one word of weight 0");
        }
        BigInteger total = BigInteger.ZERO;
        for (int w = 0; w < counts.length; w++) {
            if (counts[w].signum() < 0) {
                throw new IllegalArgumentException("A_" + w + " is " + counts[w] + ", must not be negative");
            }
            total = total.add(counts[w]);
        }
        int k = total.bitLength() - 1;
        if (total.bitCount() != 1 || k >= counts.length) {
            throw new IllegalArgumentException("the counts of a code of length " + (counts.length - 1) + " add up to "
                    + total + ", must be a power of two up to 2^n");
        }
        return new WeightEnumerator(counts.clone(), k);
    }

    /** As {@link #of(BigInteger...)}, for counts that fit a long. */
    public static WeightEnumerator of(long... counts) {
        return of(Arrays.stream(counts).mapToObj(BigInteger::valueOf).toArray(BigInteger[]::new));
    }

    /** Length. */
    public int n() {
        return counts.length - 1;
    }

    /** Dimension: the counts add up to 2^k. */
    public int k() {
        return k;
    }

    /** A_w, the number of words of weight w. */
    public BigInteger count(int weight) {
        Objects.checkIndex(weight, counts.length);
        return counts[weight];
    }

    /** The weights that occur, ascending, 0 among them. */
    public int[] weights() {
        return IntStream.range(0, counts.length)
                .filter(w -> counts[w].signum() != 0)
                .toArray();
    }

    /** 2^k, the number of words. */
    public BigInteger total() {
        return BigInteger.ONE.shiftLeft(k);
    }

    /**
     * The least weight above 0 that occurs, which is the minimum distance of a linear code.
     *
     * @throws IllegalStateException if the code has only the zero word
     */
    public int minimumDistance() {
        for (int w = 1; w < counts.length; w++) {
            if (counts[w].signum() != 0) {
                return w;
            }
        }
        throw new IllegalStateException("a code with only the zero word has no minimum distance");
    }

    @Override
    public boolean equals(Object other) {
        return other instanceof WeightEnumerator that && Arrays.equals(counts, that.counts);
    }

    @Override
    public int hashCode() {
        return Arrays.hashCode(counts);
    }

    /** The counts that are not 0, as {@code (7,4): A_0=1 A_3=7 A_4=7 A_7=1}. */
    @Override
    public String toString() {
        StringBuilder text = new StringBuilder("(" + n() + "," + k + "):");
        for (int w : weights()) {
            text.append(" A_").append(w).append('=').append(counts[w]);
        }
        return text.toString();
    }
}
