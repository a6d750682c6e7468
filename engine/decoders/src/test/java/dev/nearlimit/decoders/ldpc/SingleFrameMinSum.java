package dev.nearlimit.decoders.ldpc;

import dev.nearlimit.codes.gf2.SparseBitMatrix;

/** Fixed-point min-sum for one frame, written as the definition reads: the twin of the fast decoder. */
final class SingleFrameMinSum {
    boolean[] bits;
    int iterations;
    boolean failed;

    private final SparseBitMatrix H;
    private final int M;
    private final int P;
    private final MagnitudeCorrection correction;

    SingleFrameMinSum(SparseBitMatrix matrix, WordLengths words, MagnitudeCorrection correction) {
        this.H = matrix;
        this.M = (int) Math.pow(2, words.message() - 1) - 1;
        this.P = (int) Math.pow(2, words.posterior() - 1) - 1;
        this.correction = correction;
    }

    void decode(int[] channel, Iterations settings) {
        int[] posterior = channel.clone();
        int[][] message = new int[H.rows()][H.columns()];
        iterations = 0;
        decide(posterior);
        while (iterations < settings.most() && (failed || !settings.earlyStop())) {
            int[] next = channel.clone();
            for (int row = 0; row < H.rows(); row++) {
                int[] t = new int[H.columns()];
                for (int column : H.row(row)) {
                    t[column] = posterior[column] - message[row][column];
                }
                for (int column : H.row(row)) {
                    message[row][column] = outgoing(row, column, t);
                    next[column] += message[row][column];
                    if (settings.schedule() == Schedule.LAYERED) {
                        posterior[column] = saturate(t[column] + message[row][column], P);
                    }
                }
            }
            if (settings.schedule() == Schedule.FLOODING) {
                for (int column = 0; column < next.length; column++) {
                    posterior[column] = saturate(next[column], P);
                }
            }
            iterations++;
            decide(posterior);
        }
    }

    private int outgoing(int row, int to, int[] t) {
        int least = M;
        boolean negative = false;
        for (int column : H.row(row)) {
            if (column != to) {
                least = Math.min(least, Math.abs(saturate(t[column], M)));
                negative ^= t[column] < 0;
            }
        }
        int corrected = correction instanceof MagnitudeCorrection.Scale scale
                ? (int) Math.floor(scale.eighths() * least / 8.0)
                : (int) Math.max(least - ((MagnitudeCorrection.Offset) correction).amount(), 0);
        return negative ? -corrected : corrected;
    }

    private static int saturate(int value, int limit) {
        return value > limit ? limit : value < -limit ? -limit : value;
    }

    private void decide(int[] posterior) {
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
