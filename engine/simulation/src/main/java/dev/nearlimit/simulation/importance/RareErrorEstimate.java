package dev.nearlimit.simulation.importance;

import dev.nearlimit.simulation.statistics.ErrorRateIntervals;
import dev.nearlimit.simulation.statistics.Interval;

/**
 * The part of the frame error rate at one point that is due to given sets, for one decoder and quantiser, as
 * {@link ImportanceSampler} defines it. Never more than a part: other causes of errors are not in it.
 *
 * @param frames biased frames simulated
 * @param errors frames among them that count, whatever their weight
 * @param frameErrorRatePart the estimate
 * @param interval 95 % interval
 * @param variance of the estimate, itself estimated from the frames
 * @param effectiveSampleSize frame errors of a plain simulation that would say as much: (sum of weights)^2 / (sum of
 *     squared weights) (A. Kong, "A note on importance sampling using standardized weights", University of Chicago
 *     technical report 348, 1992)
 * @param largestShare the largest weight's part of the sum of weights; near 1, the estimate is one frame's word
 * @param complete whether all frames asked for were simulated
 */
public record RareErrorEstimate(
        long frames,
        long errors,
        double frameErrorRatePart,
        Interval interval,
        double variance,
        double effectiveSampleSize,
        double largestShare,
        boolean complete) {

    static RareErrorEstimate of(WeightTally tally, double largestPossible, boolean complete) {
        double frames = tally.frames();
        double spread = tally.squares() - tally.sum() * tally.sum() / frames;
        return new RareErrorEstimate(
                tally.frames(),
                tally.errors(),
                tally.sum() / frames,
                WeightedCountInterval.of(tally, largestPossible, ErrorRateIntervals.DEFAULT_CONFIDENCE),
                frames > 1 ? Math.max(0, spread) / frames / (frames - 1) : Double.NaN,
                tally.squares() > 0 ? tally.sum() * tally.sum() / tally.squares() : 0,
                tally.sum() > 0 ? tally.largest() / tally.sum() : 0,
                complete);
    }

    /** Standard deviation of the estimate over the estimate; not a number without an error. */
    public double relativeError() {
        return Math.sqrt(variance) / frameErrorRatePart;
    }
}
