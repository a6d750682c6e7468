package dev.nearlimit.limits;

import org.apache.commons.math3.optim.MaxEval;
import org.apache.commons.math3.optim.nonlinear.scalar.GoalType;
import org.apache.commons.math3.optim.univariate.BrentOptimizer;
import org.apache.commons.math3.optim.univariate.SearchInterval;
import org.apache.commons.math3.optim.univariate.UnivariateObjectiveFunction;
import org.apache.commons.math3.optim.univariate.UnivariatePointValuePair;

/**
 * The step at which a uniform quantiser costs least at a rate. A grid of steps, a quarter apart, brackets it, so that a
 * second minimum far off does no harm; Brent's method refines it. The loss is flat at its least, so it is right to
 * 1e-9 dB where the step is right to a few parts in 10^5.
 */
public final class BestQuantiserStep {
    private static final double GRID_RATIO = 1.25;
    /** The grid covers steps from a hundredth to ten times of what spreads the levels over all likely LLRs. */
    private static final double LEAST_SPREAD = 0.01;

    private static final double MOST_SPREAD = 10;
    private static final double STEP_ERROR = 1e-6;

    private BestQuantiserStep() {}

    /**
     * The quantiser of that word and rise whose step needs the least Eb/N0 at a rate.
     *
     * @param rate in (0, 1), bits per real dimension
     * @param wordBits 2 .. 8 for mid-tread, 2 .. 7 for mid-rise
     * @throws InvalidLimitException if a value is out of range, or the word is 1 bit, which has no step
     */
    public static UniformLlrQuantiser at(double rate, int wordBits, QuantiserRise rise) {
        UniformLlrQuantiser.requireWord(wordBits, rise);
        if (wordBits == 1) {
            throw new InvalidLimitException("a quantiser of 1 bit has no step");
        }
        double esn0 = BinaryInputAwgn.leastEsn0(rate);
        double spread = 2 * (4 * esn0 + 4 * Math.sqrt(8 * esn0)) / (1 << wordBits);
        double best = Double.NaN;
        double bestLoss = Double.POSITIVE_INFINITY;
        for (double step = spread * LEAST_SPREAD; step <= spread * MOST_SPREAD; step *= GRID_RATIO) {
            double loss = lossDb(rate, wordBits, step, rise);
            if (loss < bestLoss) {
                best = step;
                bestLoss = loss;
            }
        }
        UnivariatePointValuePair refined = new BrentOptimizer(STEP_ERROR, STEP_ERROR)
                .optimize(
                        new UnivariateObjectiveFunction(x -> lossDb(rate, wordBits, Math.exp(x), rise)),
                        GoalType.MINIMIZE,
                        new SearchInterval(Math.log(best / GRID_RATIO), Math.log(best * GRID_RATIO), Math.log(best)),
                        MaxEval.unlimited());
        return new UniformLlrQuantiser(wordBits, Math.exp(refined.getPoint()), rise);
    }

    private static double lossDb(double rate, int wordBits, double step, QuantiserRise rise) {
        return new QuantisedBinaryAwgn(new UniformLlrQuantiser(wordBits, step, rise)).lossDb(rate);
    }
}
