package dev.nearlimit.algebra.weight;

import java.math.BigInteger;
import java.util.Arrays;

/**
 * The MacWilliams identity for binary linear codes in exact integers: with B_j words of weight j in a code of dimension
 * r, its dual has A_w = 2^-r sum_j B_j K_w(j) words of weight w, where K_w(j) is the Krawtchouk polynomial, the
 * coefficient of z^w in (1-z)^j (1+z)^(n-j).
 *
 * <p>Source: F. J. MacWilliams, "A theorem on the distribution of weights in a systematic code", Bell System Technical
 * Journal 42 (1963); MacWilliams and Sloane, The Theory of Error-Correcting Codes (1977), ch. 5.
 */
public final class MacWilliams {
    private MacWilliams() {}

    /**
     * The enumerator of the dual code.
     *
     * @param code enumerator of a code
     * @param k dimension of that code; stated so that a wrong enumerator is noticed
     * @return enumerator of the (n, n-k) dual
     * @throws IllegalArgumentException if the counts do not add up to 2^k, or belong to no linear code
     */
    public static WeightEnumerator dual(WeightEnumerator code, int k) {
        if (code.k() != k) {
            throw new IllegalArgumentException("the counts add up to 2^" + code.k() + ", the code has dimension " + k);
        }
        BigInteger[] weighted = new BigInteger[code.n() + 1];
        for (int j = 0; j < weighted.length; j++) {
            weighted[j] = code.count(j);
        }
        return WeightEnumerator.of(transform(weighted, k));
    }

    /** As {@link #dual(WeightEnumerator, int)} with the dimension that the counts add up to. */
    public static WeightEnumerator dual(WeightEnumerator code) {
        return dual(code, code.k());
    }

    /**
     * 2^-r sum_j values_j K_w(j) for w = 0 .. n. The transform is linear, so that it serves sums over several codes of
     * one length too.
     *
     * <p>Work: n multiplications of an n-bit number by a small one for each value that is not 0.
     *
     * @param values n + 1 numbers
     * @param r the power of two to divide by
     * @throws IllegalArgumentException if a sum is no multiple of 2^r
     */
    static BigInteger[] transform(BigInteger[] values, int r) {
        int n = values.length - 1;
        BigInteger[] sums = new BigInteger[n + 1];
        Arrays.fill(sums, BigInteger.ZERO);
        for (int j = 0; j <= n; j++) {
            if (values[j].signum() != 0) {
                addKrawtchouk(sums, j, values[j]);
            }
        }
        for (int w = 0; w <= n; w++) {
            if (sums[w].signum() != 0 && sums[w].getLowestSetBit() < r) {
                throw new IllegalArgumentException("the transform at weight " + w + " is no multiple of 2^" + r
                        + ": no linear code has these counts");
            }
            sums[w] = sums[w].shiftRight(r);
        }
        return sums;
    }

    /**
     * Adds factor * K_w(j) to each sum, by the recurrence (w+1) K_(w+1)(j) = (n-2j) K_w(j) - (n-w+1) K_(w-1)(j)
     * (MacWilliams and Sloane 1977, ch. 5, theorem 19), whose division leaves no remainder. The factor rides along, since
     * the recurrence is linear.
     */
    private static void addKrawtchouk(BigInteger[] sums, int j, BigInteger factor) {
        int n = sums.length - 1;
        BigInteger before = BigInteger.ZERO;
        BigInteger current = factor;
        for (int w = 0; w <= n; w++) {
            sums[w] = sums[w].add(current);
            BigInteger next = current.multiply(BigInteger.valueOf(n - 2L * j))
                    .subtract(before.multiply(BigInteger.valueOf(n - w + 1L)))
                    .divide(BigInteger.valueOf(w + 1L));
            before = current;
            current = next;
        }
    }
}
