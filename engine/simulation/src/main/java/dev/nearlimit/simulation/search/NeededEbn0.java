package dev.nearlimit.simulation.search;

import java.util.List;

/**
 * The Eb/N0 at which a frame error rate meets its target.
 *
 * @param ebn0Db estimate [dB]
 * @param lowDb lower end of the 95 % interval [dB]; -infinity if the target was met wherever it was tried
 * @param highDb upper end of the 95 % interval [dB]; +infinity if the target was never met
 * @param bracketLow the measured point below, null if the target was met wherever it was tried
 * @param bracketHigh the measured point above, null if the target was never met
 * @param points every point measured so far, by ascending Eb/N0
 * @param complete false if the search was cut short
 */
public record NeededEbn0(
        double ebn0Db,
        double lowDb,
        double highDb,
        MeasuredPoint bracketLow,
        MeasuredPoint bracketHigh,
        List<MeasuredPoint> points,
        boolean complete) {
    public NeededEbn0 {
        points = List.copyOf(points);
    }

    /** Whether the target lies between two measured points, so that the estimate interpolates. */
    public boolean bracketed() {
        return bracketLow != null && bracketHigh != null;
    }
}
