package dev.nearlimit.simulation.statistics;

/**
 * An interval of rates.
 *
 * @param low lower end, 0 .. high
 * @param high upper end, low .. 1
 */
public record Interval(double low, double high) {
    public Interval {
        if (!(low >= 0 && low <= high && high <= 1)) {
            throw new IllegalArgumentException("interval is [" + low + ", " + high + "], needs 0 <= low <= high <= 1");
        }
    }

    /** Whether a rate lies inside, ends included. */
    public boolean contains(double rate) {
        return low <= rate && rate <= high;
    }

    /** Whether two intervals have a rate in common. */
    public boolean overlaps(Interval other) {
        return low <= other.high && other.low <= high;
    }
}
