package dev.nearlimit.simulation;

import java.util.Arrays;

/** How often each of the whole numbers 0, 1, 2, .. came up. Immutable. */
public final class Histogram {
    private final long[] counts;

    private Histogram(long[] counts) {
        this.counts = counts;
    }

    /**
     * A histogram of these counts.
     *
     * @param counts how often 0, 1, 2, .. came up; zeros at the end are dropped
     */
    public static Histogram of(long... counts) {
        int length = counts.length;
        while (length > 0 && counts[length - 1] == 0) {
            length--;
        }
        return new Histogram(Arrays.copyOf(counts, length));
    }

    /** How often anything came up. */
    public long total() {
        return Arrays.stream(counts).sum();
    }

    /** How often a number came up, for any number from 0 on. */
    public long count(int value) {
        return value < counts.length ? counts[value] : 0;
    }

    /** How often the numbers from {@code low} to {@code high} came up, both included. */
    public long count(int low, int high) {
        long sum = 0;
        for (int value = low; value <= Math.min(high, counts.length - 1); value++) {
            sum += counts[value];
        }
        return sum;
    }

    /** The largest number that came up; -1 where none did. */
    public int largest() {
        return counts.length - 1;
    }

    /** The mean; not a number where nothing came up. */
    public double mean() {
        double sum = 0;
        for (int value = 0; value < counts.length; value++) {
            sum += (double) value * counts[value];
        }
        return sum / total();
    }

    /**
     * The least number that at least this share of what came up does not exceed; -1 where nothing came up.
     *
     * @param share above 0, at most 1; 0.5 gives the lower median
     */
    public int quantile(double share) {
        double wanted = share * total();
        long sum = 0;
        for (int value = 0; value < counts.length; value++) {
            sum += counts[value];
            if (sum >= wanted) {
                return value;
            }
        }
        return largest();
    }

    @Override
    public boolean equals(Object other) {
        return other instanceof Histogram histogram && Arrays.equals(counts, histogram.counts);
    }

    @Override
    public int hashCode() {
        return Arrays.hashCode(counts);
    }

    @Override
    public String toString() {
        return Arrays.toString(counts);
    }

    /** Counts numbers as they come. Not shared by threads. */
    static final class Counter {
        private long[] counts = new long[16];

        void add(int value) {
            if (value >= counts.length) {
                counts = Arrays.copyOf(counts, Math.max(value + 1, 2 * counts.length));
            }
            counts[value]++;
        }

        Histogram toHistogram() {
            return of(counts);
        }
    }
}
