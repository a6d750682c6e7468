package dev.nearlimit.simulation.statistics;

import dev.nearlimit.simulation.InvalidSimulationException;
import org.apache.commons.math3.distribution.GammaDistribution;

/**
 * How many frame errors make an interval as narrow, relative to the estimate, as asked for. Stopping when the interval is
 * narrow enough would make the interval wrong, as it depends on the counts; but with r frame errors its relative width
 * depends on r almost alone. So the demand is turned into r beforehand, and the interval stays exact.
 */
public final class RelativeWidth {
    private static final double LEAST = 0.001;
    private static final double MOST = 4;

    private RelativeWidth() {}

    /**
     * The least r for which the interval of r frame errors after any number of frames is at most this wide. Among all
     * frame error rates small ones are the worst case: there N p has the gamma distribution of shape r, and the width over
     * the estimate r/N is (g(1 - alpha/2; r) - g(alpha/2; r)) / r, g being its quantiles. About (3.92 / width)^2 at 95 %.
     *
     * @param width upper less lower end of the 95 % interval on FER, over the estimate: 0.001 .. 4
     * @throws InvalidSimulationException if the width is out of range
     */
    public static long frameErrors(double width) {
        if (!(width >= LEAST && width <= MOST)) {
            throw new InvalidSimulationException(
                    "relative width is " + width + ", must be " + LEAST + " to " + (int) MOST);
        }
        long high = 1;
        while (ofFrameErrors(high) > width) {
            high *= 2;
        }
        long low = high / 2;
        while (high - low > 1) {
            long middle = (low + high) / 2;
            if (ofFrameErrors(middle) > width) {
                low = middle;
            } else {
                high = middle;
            }
        }
        return high;
    }

    /** The relative width that r frame errors give at a small frame error rate; falls with r. */
    static double ofFrameErrors(long r) {
        GammaDistribution gamma = new GammaDistribution(null, r, 1, 1e-12);
        double tail = (1 - ErrorRateIntervals.DEFAULT_CONFIDENCE) / 2;
        return (gamma.inverseCumulativeProbability(1 - tail) - gamma.inverseCumulativeProbability(tail)) / r;
    }
}
