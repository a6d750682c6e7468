package dev.nearlimit.algebra.errorrate;

/**
 * An error rate that follows from a formula.
 *
 * @param naturalLog its natural logarithm; minus infinity for a rate of 0; above 0 where a union bound exceeds 1
 * @param basis whether it is exact, a bound or an estimate
 * @param method the formula, in words for the user
 */
public record ErrorRate(double naturalLog, Basis basis, String method) {
    public ErrorRate {
        if (Double.isNaN(naturalLog)) {
            throw new IllegalArgumentException("logarithm of an error rate is not a number");
        }
    }

    /** The rate; 0 where it is below the least double. */
    public double value() {
        return Math.exp(naturalLog);
    }

    /** Its decimal logarithm, finite also where {@link #value()} is too small for a double. */
    public double log10() {
        return naturalLog / Math.log(10);
    }
}
