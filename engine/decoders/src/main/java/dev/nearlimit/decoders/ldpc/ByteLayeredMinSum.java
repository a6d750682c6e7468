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
    }

    @Override
    void load(LlrBatch received) {
        System.arraycopy(received.levels(), 0, posterior, 0, posterior.length);
        Arrays.fill(message, (byte) 0);
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
    static long signs(byte[] posterior, int position) {
        int at = position * FrameBatch.FRAMES;
        long word = 0;
        for (int f = 0; f < FrameBatch.FRAMES; f += Byte.SIZE) {
            long signs = (long) EIGHT_BYTES.get(posterior, at + f) & SIGNS;
            word |= (((signs >>> 7) * GATHER) >>> 56) << f;
        }
        return word;
    }
}
