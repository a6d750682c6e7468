package dev.nearlimit.simulation.statistics;

import dev.nearlimit.simulation.FailedFrames;
import dev.nearlimit.simulation.PointOutcome;
import org.apache.commons.math3.special.Beta;

/**
 * Two schemes on the same frames and the same noise: what tells them apart are the frames that only one of them failed.
 *
 * @param frames frames that both have seen
 * @param both frames that both failed
 * @param onlyFirst frames that the first failed and the second did not
 * @param onlySecond frames that the second failed and the first did not
 */
public record PairedFailures(long frames, long both, long onlyFirst, long onlySecond) {
    /** Compares two schemes at one point and seed, over the frames that both have counted. */
    public static PairedFailures of(PointOutcome first, PointOutcome second) {
        return of(first.failures(), second.failures());
    }

    /** Compares two sets of failures, over the frames that both know of. */
    public static PairedFailures of(FailedFrames first, FailedFrames second) {
        long frames = Math.min(first.knownFrames(), second.knownFrames());
        long[] ofFirst = first.before(frames);
        long[] ofSecond = second.before(frames);
        long both = 0;
        int at = 0;
        for (long frame : ofFirst) {
            while (at < ofSecond.length && ofSecond[at] < frame) {
                at++;
            }
            both += at < ofSecond.length && ofSecond[at] == frame ? 1 : 0;
        }
        return new PairedFailures(frames, both, ofFirst.length - both, ofSecond.length - both);
    }

    /**
     * The two-sided sign test on the frames that only one failed (the exact form of Q. McNemar, Psychometrika 12, 1947): if
     * both schemes were equally good, each such frame would be either one's with probability 1/2. The result is the
     * probability of a split at least as uneven, at most 1.
     *
     * <p>It is exact for a number of frames fixed in advance. It is exact as well where the count ended when either scheme
     * had failed r frames and none was failed by both: that either has r within r + m of their flips of a coin is the same
     * event as at least r of r + m falling to its side. With frames that both failed it is very nearly so.
     */
    public double signTest() {
        long more = Math.max(onlyFirst, onlySecond);
        long all = onlyFirst + onlySecond;
        // P(X >= more) of a binomial with probability 1/2 is I_1/2(more, all - more + 1).
        return more == all - more ? 1 : Math.min(1, 2 * Beta.regularizedBeta(0.5, more, all - more + 1.0));
    }
}
