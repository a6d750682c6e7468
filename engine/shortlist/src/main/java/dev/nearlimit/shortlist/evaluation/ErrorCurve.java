package dev.nearlimit.shortlist.evaluation;

import dev.nearlimit.simulation.search.MeasuredPoint;
import java.util.List;

/**
 * What is known of a code's and decoder's error rates, and the Eb/N0 it needs. Eb/N0 here is the code's own: filler is
 * charged later.
 *
 * @param neededDb Eb/N0 at which the codeword meets its target [dB]
 * @param neededLowDb lower end of the 95 % interval [dB], -infinity where unknown
 * @param neededHighDb upper end [dB], +infinity where the target was not met anywhere tried
 * @param method exact or simulated
 * @param how in words
 * @param stage exact, refined or coarse
 * @param points simulated points
 * @param exact exact FER at an Eb/N0, null where no formula is known
 * @param nearNeeded the simulated point that stands for behaviour at the needed Eb/N0, null if there is none
 * @param berAtNeeded information-bit error rate at the needed Eb/N0, null where unknown
 * @param complete false if the search was interrupted
 */
public record ErrorCurve(
        double neededDb,
        double neededLowDb,
        double neededHighDb,
        String method,
        String how,
        String stage,
        List<MeasuredPoint> points,
        ExactErrorRate exact,
        MeasuredPoint nearNeeded,
        BitErrorRate berAtNeeded,
        boolean complete) {
    public ErrorCurve {
        points = List.copyOf(points);
    }

    /** Whether the target was met at some Eb/N0 that was tried. */
    public boolean found() {
        return neededHighDb < Double.POSITIVE_INFINITY;
    }
}
