package dev.nearlimit.decoders.ldpc;

import dev.nearlimit.codes.gf2.SparseBitMatrix;

/**
 * Sum-product and min-sum for one frame in double precision with the library's functions, every outgoing message from
 * the definition: the twin of the single-precision decoders.
 */
final class SingleFrameSumProduct {
    boolean[] bits;
    int iterations;
    boolean failed;
    double[] posterior;

    private final SparseBitMatrix H;
    private final boolean minSum;
    private final MagnitudeCorrection correction;

    SingleFrameSumProduct(SparseBitMatrix matrix, boolean minSum, MagnitudeCorrection correction) {
        this.H = matrix;
        this.minSum = minSum;
        this.correction = correction;
    }

    void decode(double[] channel, Iterations settings) {
        posterior = channel.clone();
        double[][] message = new double[H.rows()][H.columns()];
        iterations = 0;
        decide();
        while (iterations < settings.most() && (failed || !settings.earlyStop())) {
            double[] next = channel.clone();
            for (int row = 0; row < H.rows(); row++) {
                double[] t = new double[H.columns()];
                for (int column : H.row(row)) {
                    t[column] = posterior[column] - message[row][column];
                }
                for (int column : H.row(row)) {
                    message[row][column] = outgoing(row, column, t);
                    next[column] += message[row][column];
                    if (settings.schedule() == Schedule.LAYERED) {
                        posterior[column] = t[column] + message[row][column];
                    }
                }
            }
            if (settings.schedule() == Schedule.FLOODING) {
                posterior = next;
            }
            iterations++;
            decide();
        }
    }

    private double outgoing(int row, int to, double[] t) {
        double limit = FloatBeliefPropagation.LARGEST;
        double sign = 1;
        double least = limit;
        double phiSum = 0;
        for (int column : H.row(row)) {
            if (column != to) {
                sign *= t[column] < 0 ? -1 : 1;
                least = Math.min(least, Math.abs(t[column]));
                phiSum += phi(Math.abs(t[column]));
            }
        }
        if (!minSum) {
            return sign * Math.min(phi(phiSum), least);
        }
        return sign
                * (correction instanceof MagnitudeCorrection.Scale scale
                        ? scale.eighths() * least / 8
                        : Math.max(least - ((MagnitudeCorrection.Offset) correction).amount(), 0));
    }

    /** -ln tanh(x/2), its own inverse: ln(1 + e^-x) - ln(1 - e^-x). */
    private static double phi(double x) {
        return x <= 0
                ? Double.POSITIVE_INFINITY
                : StrictMath.log1p(StrictMath.exp(-x)) - StrictMath.log(-StrictMath.expm1(-x));
    }

    private void decide() {
        bits = new boolean[posterior.length];
        for (int i = 0; i < bits.length; i++) {
            bits[i] = posterior[i] < 0;
        }
        failed = false;
        for (int row = 0; row < H.rows(); row++) {
            boolean odd = false;
            for (int column : H.row(row)) {
                odd ^= bits[column];
            }
            failed |= odd;
        }
    }
}
