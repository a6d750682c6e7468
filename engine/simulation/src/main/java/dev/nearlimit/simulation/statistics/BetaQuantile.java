package dev.nearlimit.simulation.statistics;

import org.apache.commons.math3.analysis.solvers.BrentSolver;
import org.apache.commons.math3.special.Beta;

/**
 * Quantiles of the beta distribution accurate relative to their size however small they are, which the library's own
 * inverse, accurate to 1e-9 absolutely, is not. The library's incomplete beta function forms 1 - x, so the relative
 * error grows with a + b: it is below 1e-7 up to 1e9 and below 1e-4 up to 1e12, far less than an interval is wide.
 */
final class BetaQuantile {
    private static final double LEAST_LOG = -700;
    private static final double ACCURACY = 1e-12;
    private static final int MAX_EVALUATIONS = 500;

    private BetaQuantile() {}

    /**
     * The x with I_x(a, b) = p, I being the regularised incomplete beta function; solved for ln x where x is small.
     *
     * @param p in (0, 1)
     * @param a first shape, above 0
     * @param b second shape, above 0
     */
    static double of(double p, double a, double b) {
        double mean = a / (a + b);
        if (mean > 0.5) {
            return 1 - of(1 - p, b, a);
        }
        double high = 0;
        double low = Math.log(mean);
        while (Beta.regularizedBeta(Math.exp(low), a, b) > p && low > LEAST_LOG) {
            high = low;
            low -= 1;
        }
        if (low <= LEAST_LOG) {
            return 0;
        }
        BrentSolver solver = new BrentSolver(ACCURACY, ACCURACY, ACCURACY * p);
        double log = solver.solve(MAX_EVALUATIONS, x -> Beta.regularizedBeta(Math.exp(x), a, b) - p, low, high);
        return Math.exp(log);
    }
}
