package dev.nearlimit.algebra.distance;

import java.math.BigInteger;

/**
 * Upper bounds on the minimum distance of any binary linear (n, k) code. They say what cannot be reached, not what can.
 *
 * @param n length
 * @param k dimension, 1 .. n
 * @param singleton d <= n - k + 1 (R. C. Singleton, IEEE Trans. Inform. Theory 10 (1964))
 * @param hamming largest d whose spheres fit: sum of C(n, i) for i = 0 .. (d-1)/2 is at most 2^(n-k) (R. W. Hamming, Bell
 *     System Technical Journal 29 (1950)); an even d is held to the (n-1, k) code of distance d - 1 that puncturing leaves
 * @param griesmer largest d with sum of ceil(d / 2^i) for i = 0 .. k-1 at most n (J. H. Griesmer, IBM J. Res. Dev. 4
 *     (1960))
 */
public record DistanceBounds(int n, int k, int singleton, int hamming, int griesmer) {

    /**
     * The bounds for a length and dimension.
     *
     * @throws IllegalArgumentException unless 1 <= k <= n
     */
    public static DistanceBounds of(int n, int k) {
        if (k < 1 || n < k) {
            throw new IllegalArgumentException("(n,k) is (" + n + "," + k + "), needs 1 <= k <= n");
        }
        return new DistanceBounds(n, k, n - k + 1, hammingBound(n, k), griesmerBound(n, k));
    }

    /** The least of the bounds. */
    public int best() {
        return Math.min(singleton, Math.min(hamming, griesmer));
    }

    /** Name of the bound that is least: {@code Singleton}, {@code Hamming} or {@code Griesmer}. */
    public String nameOfBest() {
        if (griesmer == best()) {
            return "Griesmer";
        }
        return hamming == best() ? "Hamming" : "Singleton";
    }

    private static int hammingBound(int n, int k) {
        int odd = 2 * largestRadius(n, n - k) + 1;
        int even = n > k ? 2 * largestRadius(n - 1, n - 1 - k) + 2 : 0;
        return Math.min(n, Math.max(odd, even));
    }

    /** Largest t <= n with C(n,0) + .. + C(n,t) <= 2^r. */
    private static int largestRadius(int n, int r) {
        BigInteger room = BigInteger.ONE.shiftLeft(r);
        BigInteger binomial = BigInteger.ONE;
        BigInteger volume = BigInteger.ONE;
        for (int t = 0; t < n; t++) {
            binomial = binomial.multiply(BigInteger.valueOf(n - t)).divide(BigInteger.valueOf(t + 1L));
            volume = volume.add(binomial);
            if (volume.compareTo(room) > 0) {
                return t;
            }
        }
        return n;
    }

    private static int griesmerBound(int n, int k) {
        int low = 1;
        int high = n;
        while (low < high) {
            int middle = (low + high + 1) >>> 1;
            if (griesmerLength(k, middle) <= n) {
                low = middle;
            } else {
                high = middle - 1;
            }
        }
        return low;
    }

    /** Least length that the Griesmer bound leaves to a code of dimension k and distance d. */
    private static long griesmerLength(int k, int d) {
        long length = 0;
        int term = d;
        for (int i = 0; i < k; i++) {
            length += term;
            term = (term + 1) >>> 1;
        }
        return length;
    }
}
