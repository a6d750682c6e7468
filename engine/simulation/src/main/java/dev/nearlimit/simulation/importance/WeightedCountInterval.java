package dev.nearlimit.simulation.importance;

import dev.nearlimit.simulation.statistics.Interval;
import org.apache.commons.math3.distribution.GammaDistribution;

/**
 * The interval on the mean of weights, most of which may be 0, of independent frames: M. P. Fay and E. J. Feuer,
 * "Confidence intervals for directly standardized rates", Statistics in Medicine 16, 1997, where a rate is a weighted sum
 * of Poisson counts. With y the mean of the weights, v the sum of their squares over N^2 and k the largest weight over N,
 *
 * <pre>
 *   low  = v / y            times the alpha/2 quantile of the gamma distribution of shape y^2 / v
 *   high = (v + k^2)/(y + k) times the 1-alpha/2 quantile of shape (y + k)^2 / (v + k^2)
 * </pre>
 *
 * <p>It tends to the normal interval where many frames share the sum, and is wider above where few do. k is the largest
 * weight seen; without any it is the largest that there can be.
 */
final class WeightedCountInterval {
    private WeightedCountInterval() {}

    /**
     * The two-sided interval; [0, 1] where no frame was seen.
     *
     * @param largestPossible bound on the weights, used where none was seen
     * @param confidence in (0, 1)
     */
    static Interval of(WeightTally tally, double largestPossible, double confidence) {
        if (tally.frames() == 0) {
            return new Interval(0, 1);
        }
        double alpha = 1 - confidence;
        double frames = tally.frames();
        double most = (tally.errors() > 0 ? tally.largest() : largestPossible) / frames;
        double y = tally.sum() / frames;
        double v = tally.squares() / frames / frames;
        double low = v > 0 ? v / y * quantile(alpha / 2, y * y / v) : 0;
        double above = v + most * most;
        double high = above > 0 ? above / (y + most) * quantile(1 - alpha / 2, (y + most) * (y + most) / above) : 0;
        return new Interval(Math.min(low, 1), Math.min(high, 1));
    }

    private static double quantile(double p, double shape) {
        return new GammaDistribution(shape, 1).inverseCumulativeProbability(p);
    }
}
