package dev.nearlimit.limits;

import java.util.function.DoubleUnaryOperator;

/**
 * The slow and obvious way to BI-AWGN: the trapezoidal rule on a fine grid, straight from the definition, one normal LLR
 * at a time. Absolute error about 1e-13.
 */
final class TrapezoidTwin {
    private static final int STEPS = 40_000;
    private static final double REACH = 10;

    private TrapezoidTwin() {}

    static double capacity(double esn0) {
        return 1 - mean(esn0, TrapezoidTwin::lost);
    }

    static double dispersion(double esn0) {
        double mean = mean(esn0, TrapezoidTwin::lost);
        return mean(esn0, llr -> (lost(llr) - mean) * (lost(llr) - mean));
    }

    private static double lost(double llr) {
        double positive = llr > 0 ? Math.log1p(Math.exp(-llr)) : -llr + Math.log1p(Math.exp(llr));
        return positive / Math.log(2);
    }

    private static double mean(double esn0, DoubleUnaryOperator f) {
        double step = 2 * REACH / STEPS;
        double sum = 0;
        for (int i = 0; i <= STEPS; i++) {
            double z = -REACH + i * step;
            double weight = i == 0 || i == STEPS ? 0.5 : 1;
            sum += weight * Math.exp(-0.5 * z * z) * f.applyAsDouble(4 * esn0 + Math.sqrt(8 * esn0) * z);
        }
        return sum * step / Math.sqrt(2 * Math.PI);
    }
}
