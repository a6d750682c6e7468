package dev.nearlimit.decoders.ldpc;

import dev.nearlimit.codes.batch.FrameBatch;
import dev.nearlimit.codes.gf2.SparseBitMatrix;
import dev.nearlimit.decoders.batch.LlrBatch;
import dev.nearlimit.numerics.kernels.CheckRun;
import dev.nearlimit.numerics.kernels.LayeredMinSumKernels;
import dev.nearlimit.numerics.kernels.MinSumArithmetic;
import java.lang.invoke.MethodHandles;
import java.lang.invoke.VarHandle;
import java.nio.ByteOrder;
import java.util.Arrays;

/**
 * Layered fixed-point min-sum on kernels with 8-bit lanes, for word lengths whose every intermediate value fits a byte. It gives
 * what {@link FixedPointBeliefPropagation} gives, to the bit.
 */
final class ByteLayeredMinSum extends BeliefPropagation {
    private static final VarHandle EIGHT_BYTES =
            MethodHandles.byteArrayViewVarHandle(long[].class, ByteOrder.LITTLE_ENDIAN);
    private static final long SIGNS = 0x8080808080808080L;
    /** Times signs moved to the lowest bits of their bytes, this brings that of byte k to bit 56 + k. */
    private static final long GATHER = 0x0102040810204080L;

    private final LayeredMinSumKernels kernels;
    private final MinSumArithmetic arithmetic;
    private final CheckRun[] runs;
    private final byte[] posterior;
    private final byte[] message;
    private final byte[] scratch;
    private final ChosenLanes starting = new ChosenLanes();
    private final byte[] row = new byte[FrameBatch.FRAMES];
    private final byte[] keep;
    private long started;

    ByteLayeredMinSum(
            SparseBitMatrix matrix, Iterations iterations, MinSumArithmetic arithmetic, LayeredMinSumKernels kernels) {
        super(matrix, iterations);
        this.kernels = kernels;
        this.arithmetic = arithmetic;
        this.runs = new RowRuns(matrix).checkRuns();
        this.posterior = new byte[matrix.columns() * FrameBatch.FRAMES];
        int messages = 0;
        int most = 0;
        for (CheckRun run : runs) {
            messages += run.bits().length * run.lanes();
            most = Math.max(most, run.scratch());
        }
        this.message = new byte[messages];
        this.scratch = new byte[most];
        this.keep = new byte[RowRuns.MOST_ROWS * FrameBatch.FRAMES];
    }

    @Override
    void load(LlrBatch received, long lanes) {
        starting.choose(lanes);
        starting.keepOthers(row);
        kernels.start(posterior, received.levels(), row);
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
        Arrays.fill(row, (byte) 0);
        for (CheckRun run : runs) {
            kernels.addUnsatisfied(run, posterior, row);
        }
        return signs(row, 0) & inQuestion;
    }

    @Override
    long hardDecisions(int position) {
        return signs(posterior, position * FrameBatch.FRAMES);
    }

    private static long signs(byte[] values, int at) {
        long word = 0;
        for (int f = 0; f < FrameBatch.FRAMES; f += Byte.SIZE) {
            long signs = (long) EIGHT_BYTES.get(values, at + f) & SIGNS;
            word |= (((signs >>> 7) * GATHER) >>> 56) << f;
        }
        return word;
    }
}
