package dev.nearlimit.decoders;

/**
 * Operations by kind. The counting rule: an addition, subtraction or negation of two soft values or a modulo-2 sum of
 * two bits or field elements is one addition; a comparison, minimum, maximum or selection is one comparison; a table
 * read, a field multiplication or an evaluation of a nonlinear function is one look-up. Moving data is free.
 *
 * @param additions additions
 * @param comparisons comparisons
 * @param lookups look-ups
 */
public record OperationCount(double additions, double comparisons, double lookups) {
    /** All kinds together. */
    public double total() {
        return additions + comparisons + lookups;
    }

    public OperationCount plus(OperationCount other) {
        return new OperationCount(
                additions + other.additions, comparisons + other.comparisons, lookups + other.lookups);
    }

    /** Every count times a factor, for instance 1/k for operations per information bit. */
    public OperationCount times(double factor) {
        return new OperationCount(additions * factor, comparisons * factor, lookups * factor);
    }
}
