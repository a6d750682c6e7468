package dev.nearlimit.simulation.search;

import dev.nearlimit.simulation.PointCounts;
import dev.nearlimit.simulation.StoppingRule;

/** Counts frame errors at an Eb/N0; in production a simulator bound to a scheme, in tests a known error rate. */
@FunctionalInterface
public interface ErrorRateMeter {
    /**
     * Measures one point. Asking again with a stricter rule goes on where the last measurement ended.
     *
     * @param microDb Eb/N0 in micro-dB
     */
    PointCounts measure(long microDb, StoppingRule rule);
}
