package dev.nearlimit.cli.simulate;

import dev.nearlimit.simulation.Point;
import dev.nearlimit.simulation.PointCounts;
import dev.nearlimit.simulation.PointOutcome;
import dev.nearlimit.simulation.StoppingRule;
import dev.nearlimit.simulation.statistics.ErrorRateIntervals;
import dev.nearlimit.simulation.statistics.Interval;

/**
 * What was counted at a point with the rates that it speaks of.
 *
 * @param ebn0Db NaN where the channel's parameter is fixed
 * @param stop what ended it
 * @param fer frame error rate with its 95 % interval
 * @param ber information-bit error rate with its 95 % interval
 * @param uerHigh what the undetected-frame error rate does not exceed, one-sided 95 %
 */
record MeasuredPoint(
        double ebn0Db,
        PointOutcome outcome,
        PointStop stop,
        double fer,
        Interval ferInterval,
        double ber,
        Interval berInterval,
        double uerHigh) {
    /** @param k information bits a frame */
    static MeasuredPoint of(Point point, PointOutcome outcome, PointStop stop, StoppingRule rule, int k) {
        ErrorRateIntervals intervals = new ErrorRateIntervals();
        PointCounts counts = outcome.counts();
        return new MeasuredPoint(
                point.ebn0MicroDb().isPresent() ? point.ebn0Db() : Double.NaN,
                outcome,
                stop,
                (double) counts.frameErrors() / counts.frames(),
                intervals.frameErrorRate(counts, rule),
                (double) counts.bitErrors() / counts.frames() / k,
                intervals.bitErrorRate(counts, k),
                intervals.undetectedErrorRateUpper(counts));
    }

    PointCounts counts() {
        return outcome.counts();
    }

    double uer() {
        return (double) counts().undetectedErrors() / counts().frames();
    }

    double averageIterations() {
        return (double) counts().iterations() / counts().frames();
    }
}
