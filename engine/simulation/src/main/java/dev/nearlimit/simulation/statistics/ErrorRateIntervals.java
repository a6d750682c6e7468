package dev.nearlimit.simulation.statistics;

import dev.nearlimit.simulation.InvalidSimulationException;
import dev.nearlimit.simulation.PointCounts;
import dev.nearlimit.simulation.StoppingRule;

/**
 * Confidence intervals on error rates from the counts of one point.
 *
 * <p>Notation: N frames counted, E frame errors, r and M the stopping rule's frame errors and most frames, alpha = 1 -
 * confidence, B(p; a, b) the p-quantile of the beta distribution, k information bits a frame.
 *
 * <p><b>FER.</b> Outcomes of the rule, from the highest rate to the lowest, are: r errors after r, r+1, .. M frames, then
 * r-1, .. 0 errors in M frames. The interval holds all rates at which neither the outcomes up to the one seen nor those
 * from it on have a probability below alpha/2, and so is exact in that it covers every rate with at least the stated
 * confidence:
 *
 * <ul>
 *   <li>E = r: [B(alpha/2; r, N-r+1), B(1-alpha/2; r, N-r)], the upper end 1 when N = r (inverse binomial sampling: J. B.
 *       S. Haldane, "On a method of estimating frequencies", Biometrika 33, 1945);
 *   <li>E &lt; r: [B(alpha/2; E, N-E+1), B(1-alpha/2; E+1, N-E)], the lower end 0 when E = 0 and the upper 1 when E = N
 *       (C. J. Clopper, E. S. Pearson, Biometrika 26, 1934).
 * </ul>
 *
 * <p>A run that was ended early is treated like the second case with the N that it reached; that is exact where the time
 * of the end did not depend on the errors.
 *
 * <p><b>BER.</b> Bit errors come in bursts: with S the sum of the squares of frames' bit errors, the ratio estimate over
 * frames, BER = (bit errors)/(N k), has a relative variance of S/(bit errors)^2 - 1/N, that of a binomial count of
 * E' = (bit errors)^2/S events in N frames. So the interval is that of E' events, each worth S/(bit errors) wrong bits:
 * S/(bit errors)/k times [B(alpha/2; E', N-E'+1), B(1-alpha/2; E'+1, N-E')]. It is approximate in that the burst sizes
 * seen stand for all (the idea of M. P. Fay and E. J. Feuer, Statistics in Medicine 16, 1997, for weighted sums of Poisson
 * counts). Without a bit error the upper end is that of the FER of zero errors, which bounds the BER.
 *
 * <p><b>Upper bounds</b> are one-sided: all of alpha is spent above.
 */
public final class ErrorRateIntervals {
    /** The confidence that reports use. */
    public static final double DEFAULT_CONFIDENCE = 0.95;

    private final double alpha;

    /** Intervals of 95 %. */
    public ErrorRateIntervals() {
        this(DEFAULT_CONFIDENCE);
    }

    /**
     * Intervals of a stated confidence.
     *
     * @param confidence in (0, 1)
     */
    public ErrorRateIntervals(double confidence) {
        if (!(confidence > 0 && confidence < 1)) {
            throw new InvalidSimulationException("confidence is " + confidence + ", must be between 0 and 1");
        }
        this.alpha = 1 - confidence;
    }

    /** The two-sided interval on FER, exact for the stopping rule. With no frame counted it is [0, 1]. */
    public Interval frameErrorRate(PointCounts counts, StoppingRule rule) {
        if (stoppedOnErrors(counts, rule)) {
            return new Interval(
                    lower(counts.frameErrors(), counts.frames(), alpha / 2),
                    upperOfInverse(counts.frameErrors(), counts.frames(), alpha / 2));
        }
        return new Interval(
                lower(counts.frameErrors(), counts.frames(), alpha / 2),
                upper(counts.frameErrors(), counts.frames(), alpha / 2));
    }

    /** The rate that FER does not exceed, one-sided: 'none seen above' when there are no errors. */
    public double frameErrorRateUpper(PointCounts counts, StoppingRule rule) {
        return stoppedOnErrors(counts, rule)
                ? upperOfInverse(counts.frameErrors(), counts.frames(), alpha)
                : upper(counts.frameErrors(), counts.frames(), alpha);
    }

    /**
     * The two-sided interval on BER.
     *
     * @param informationBits k, information bits a frame
     */
    public Interval bitErrorRate(PointCounts counts, int informationBits) {
        if (counts.bitErrors() == 0) {
            return new Interval(0, upper(0, counts.frames(), alpha / 2));
        }
        double bitErrors = counts.bitErrors();
        double burst = counts.bitErrorSquares() / bitErrors;
        double events = bitErrors / burst;
        double scale = burst / informationBits;
        return new Interval(
                scale * lower(events, counts.frames(), alpha / 2),
                Math.min(1, scale * upper(events, counts.frames(), alpha / 2)));
    }

    /**
     * The rate that UER does not exceed, one-sided. Frames are taken as given; where the run stopped on frame errors this
     * is on the safe side.
     */
    public double undetectedErrorRateUpper(PointCounts counts) {
        return upper(counts.undetectedErrors(), counts.frames(), alpha);
    }

    private static boolean stoppedOnErrors(PointCounts counts, StoppingRule rule) {
        return counts.frameErrors() >= rule.frameErrors();
    }

    private static double lower(double events, double frames, double tail) {
        return events == 0 ? 0 : BetaQuantile.of(tail, events, frames - events + 1);
    }

    private static double upper(double events, double frames, double tail) {
        return events >= frames ? 1 : BetaQuantile.of(1 - tail, events + 1, frames - events);
    }

    private static double upperOfInverse(double events, double frames, double tail) {
        return events >= frames ? 1 : BetaQuantile.of(1 - tail, events, frames - events);
    }
}
