package dev.nearlimit.shortlist.evaluation;

import dev.nearlimit.simulation.PointCounts;
import dev.nearlimit.simulation.search.MeasuredPoint;
import dev.nearlimit.simulation.statistics.ErrorRateIntervals;
import dev.nearlimit.simulation.statistics.Interval;
import java.util.List;
import java.util.Optional;

/**
 * Information-bit error rate where the frame error rate is its target: target times wrong bits a failed frame, which
 * hardly changes over a bracket and is therefore taken from all its points together.
 *
 * @param value the estimate
 * @param interval its 95 % interval, for wrong bits that come in bursts
 */
public record BitErrorRate(double value, Interval interval) {

    /**
     * The BER at a target FER from points measured near it; empty if no wrong bit was seen.
     *
     * @param points near the needed Eb/N0
     * @param informationBits information bits a codeword
     */
    static Optional<BitErrorRate> at(double targetFer, List<MeasuredPoint> points, int informationBits) {
        PointCounts all = points.stream()
                .map(MeasuredPoint::counts)
                .reduce(new PointCounts(0, 0, 0, 0, 0, 0, true), BitErrorRate::sum);
        if (all.bitErrors() == 0) {
            return Optional.empty();
        }
        double scale = targetFer * all.frames() / all.frameErrors();
        Interval measured = new ErrorRateIntervals().bitErrorRate(all, informationBits);
        double value = scale * all.bitErrors() / ((double) all.frames() * informationBits);
        return Optional.of(new BitErrorRate(
                value, new Interval(Math.min(1, scale * measured.low()), Math.min(1, scale * measured.high()))));
    }

    private static PointCounts sum(PointCounts a, PointCounts b) {
        return new PointCounts(
                a.frames() + b.frames(),
                a.frameErrors() + b.frameErrors(),
                a.bitErrors() + b.bitErrors(),
                a.bitErrorSquares() + b.bitErrorSquares(),
                a.undetectedErrors() + b.undetectedErrors(),
                a.iterations() + b.iterations(),
                a.complete() && b.complete());
    }
}
