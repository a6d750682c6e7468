package dev.nearlimit.decoders.ldpc;

import dev.nearlimit.codes.batch.FrameBatch;
import dev.nearlimit.codes.gf2.SparseBitMatrix;
import dev.nearlimit.decoders.batch.LlrBatch;
import dev.nearlimit.numerics.kernels.CheckRun;
import dev.nearlimit.numerics.kernels.LayeredMinSumKernels;
import dev.nearlimit.numerics.kernels.MinSumArithmetic;
import java.util.Arrays;

/**
 * Layered fixed-point min-sum on kernels with 16-bit lanes, for word lengths of any size. It gives
 * what {@link FixedPointBeliefPropagation} gives, to the bit.
 */
final class ShortLayeredMinSum extends BeliefPropagation {
    private final LayeredMinSumKernels kernels;
    private final MinSumArithmetic arithmetic;
    private final CheckRun[] runs;
    private final short[] posterior;
    private final short[] message;
    private final short[] scratch;

    ShortLayeredMinSum(
            SparseBitMatrix matrix, Iterations iterations, MinSumArithmetic arithmetic, LayeredMinSumKernels kernels) {
        super(matrix, iterations);
        this.kernels = kernels;
        this.arithmetic = arithmetic;
        this.runs = new RowRuns(matrix).checkRuns();
        this.posterior = new short[matrix.columns() * FrameBatch.FRAMES];
        int messages = 0;
        int most = 0;
        for (CheckRun run : runs) {
            messages += run.bits().length * run.lanes();
            most = Math.max(most, run.scratch());
        }
        this.message = new short[messages];
        this.scratch = new short[most];
    }

    @Override
    void load(LlrBatch received) {
        byte[] levels = received.levels();
        for (int i = 0; i < posterior.length; i++) {
            posterior[i] = levels[i];
        }
        Arrays.fill(message, (short) 0);
    }

    @Override
    void iterate() {
        for (CheckRun run : runs) {
            kernels.update(run, arithmetic, posterior, message, scratch);
        }
    }

    @Override
    long hardDecisions(int position) {
        return signs(posterior, position);
    }

    /** Bit f is 1 exactly where the posterior of frame f is below 0. */
    static long signs(short[] posterior, int position) {
        int at = position * FrameBatch.FRAMES;
        long word = 0;
        for (int f = 0; f < FrameBatch.FRAMES; f++) {
            word |= (posterior[at + f] >>> 31 & 1L) << f;
        }
        return word;
    }
}
