package dev.nearlimit.limits;

import org.apache.commons.math3.analysis.UnivariateFunction;
import org.apache.commons.math3.analysis.solvers.BrentSolver;

/** Roots of functions known to change sign once in a bracket, by Brent's method. */
final class RootSearch {
    private static final double RELATIVE_ERROR = 1e-14;
    private static final double ABSOLUTE_ERROR = 1e-13;
    private static final double FUNCTION_ERROR = 1e-16;
    private static final int MAX_EVALUATIONS = 500;

    private RootSearch() {}

    /** The root between {@code low} and {@code high}, where {@code f} must have opposite signs. */
    static double between(UnivariateFunction f, double low, double high) {
        return new BrentSolver(RELATIVE_ERROR, ABSOLUTE_ERROR, FUNCTION_ERROR).solve(MAX_EVALUATIONS, f, low, high);
    }
}
