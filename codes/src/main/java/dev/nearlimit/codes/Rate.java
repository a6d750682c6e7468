package dev.nearlimit.codes;

/**
 * An exact code rate: information bits over bits sent, kept as the two counts and never as a rounded nominal rate.
 *
 * @param k information bits, at least 1
 * @param n bits sent, at least k
 */
public record Rate(int k, int n) {
    public Rate {
        if (k < 1 || n < k) {
            throw new IllegalArgumentException("rate is " + k + "/" + n + ", needs 1 <= k <= n");
        }
    }

    /** The rate as a number in (0, 1]. */
    public double value() {
        return (double) k / n;
    }

    /** As {@code k/n}, not reduced, so that both counts stay visible. */
    @Override
    public String toString() {
        return k + "/" + n;
    }
}
