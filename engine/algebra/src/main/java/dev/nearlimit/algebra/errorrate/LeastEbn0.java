package dev.nearlimit.algebra.errorrate;

import java.util.function.DoubleUnaryOperator;
import org.apache.commons.math3.analysis.solvers.BrentSolver;

/** Finds the Eb/N0 at which an error rate that falls with it meets a target, by Brent's method on logarithms. */
final class LeastEbn0 {
    private static final double ACCURACY_DB = 1e-10;
    private static final double STEP_DB = 4;
    private static final double LOWEST_DB = -100;
    private static final double HIGHEST_DB = 100;
    private static final int MAX_EVALUATIONS = 500;

    private LeastEbn0() {}

    /**
     * The least Eb/N0 in dB, to 1e-9 dB.
     *
     * @param logErrorRate ln of the error rate at an Eb/N0 in dB, falling
     * @param target error rate in (0, 1)
     * @throws InvalidErrorRateException if the target is outside (0, 1), or is met at any Eb/N0 however low
     */
    static double of(DoubleUnaryOperator logErrorRate, double target) {
        double logTarget = Math.log(Checks.target(target));
        double low = 0;
        while (logErrorRate.applyAsDouble(low) <= logTarget) {
            low -= STEP_DB;
            if (low < LOWEST_DB) {
                throw new InvalidErrorRateException("target error rate " + target
                        + " is met at any Eb/N0: without a signal the error rate is already "
                        + Math.exp(logErrorRate.applyAsDouble(LOWEST_DB)));
            }
        }
        double high = low + STEP_DB;
        while (logErrorRate.applyAsDouble(high) > logTarget) {
            low = high;
            high += STEP_DB;
            if (high > HIGHEST_DB) {
                throw new InvalidErrorRateException(
                        "target error rate " + target + " is not met below " + HIGHEST_DB + " dB");
            }
        }
        return new BrentSolver(ACCURACY_DB)
                .solve(MAX_EVALUATIONS, x -> logErrorRate.applyAsDouble(x) - logTarget, low, high);
    }
}
