package dev.nearlimit.cli.command;

import dev.nearlimit.simulation.Point;
import dev.nearlimit.simulation.PointCounts;
import dev.nearlimit.simulation.StoppingRule;
import dev.nearlimit.simulation.statistics.ErrorRateIntervals;
import dev.nearlimit.simulation.statistics.Interval;

/**
 * A point's counts with the rates that they speak of.
 *
 * @param ebn0Db NaN where the channel's parameter is fixed
 * @param fer frame error rate with its 95 % interval
 * @param ber information-bit error rate with its 95 % interval
 * @param uerHigh what the undetected-frame error rate does not exceed, one-sided 95 %
 */
record MeasuredPoint(
        double ebn0Db,
        PointCounts counts,
        double fer,
        Interval ferInterval,
        double ber,
        Interval berInterval,
        double uerHigh) {
    /** @param k information bits a frame */
    static MeasuredPoint of(Point point, PointCounts counts, StoppingRule rule, int k) {
        ErrorRateIntervals intervals = new ErrorRateIntervals();
        return new MeasuredPoint(
                point.ebn0MicroDb().isPresent() ? point.ebn0Db() : Double.NaN,
                counts,
                (double) counts.frameErrors() / counts.frames(),
                intervals.frameErrorRate(counts, rule),
                (double) counts.bitErrors() / counts.frames() / k,
                intervals.bitErrorRate(counts, k),
                intervals.undetectedErrorRateUpper(counts));
    }

    double uer() {
        return (double) counts.undetectedErrors() / counts.frames();
    }

    double averageIterations() {
        return (double) counts.iterations() / counts.frames();
    }
}
