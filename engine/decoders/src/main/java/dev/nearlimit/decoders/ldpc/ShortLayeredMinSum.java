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
    private final ChosenLanes starting = new ChosenLanes();
    private final short[] row = new short[FrameBatch.FRAMES];
    private final short[] keep;
    private long started;

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
        this.keep = new short[RowRuns.MOST_ROWS * FrameBatch.FRAMES];
    }

    @Override
    void load(LlrBatch received, long lanes) {
        starting.choose(lanes);
        starting.copy(received.levels(), posterior);
        // Their messages are taken for 0 by the next iteration, which writes them anyway.
        started |= lanes;
    }

    @Override
    void iterate() {
        if (started == 0) {
            for (CheckRun run : runs) {
                kernels.update(run, arithmetic, posterior, message, scratch);
            }
            return;
        }
        starting.choose(started);
        starting.keepOthers(keep);
        started = 0;
        for (CheckRun run : runs) {
            kernels.updateStarting(run, arithmetic, posterior, message, scratch, keep);
        }
    }

    @Override
    long unsatisfied(long inQuestion) {
        Arrays.fill(row, (short) 0);
        for (CheckRun run : runs) {
            kernels.addUnsatisfied(run, posterior, row);
        }
        return signs(row, 0) & inQuestion;
    }

    @Override
    long hardDecisions(int position) {
        return signs(posterior, position * FrameBatch.FRAMES);
    }

    private static long signs(short[] values, int at) {
        long word = 0;
        for (int f = 0; f < FrameBatch.FRAMES; f++) {
            word |= (values[at + f] >>> 31 & 1L) << f;
        }
        return word;
    }
}
