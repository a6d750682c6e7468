package dev.nearlimit.simulation.search;

import dev.nearlimit.simulation.PointCounts;
import dev.nearlimit.simulation.StoppingRule;

/**
 * Counts at one Eb/N0 with the rule that ended them, which the interval on their rate depends on.
 *
 * @param microDb Eb/N0 in micro-dB
 */
public record MeasuredPoint(long microDb, PointCounts counts, StoppingRule rule) {
    /** Eb/N0 in dB. */
    public double ebn0Db() {
        return microDb / 1e6;
    }

    /** Frame errors over frames. */
    public double fer() {
        return counts.frames() == 0 ? Double.NaN : (double) counts.frameErrors() / counts.frames();
    }
}
