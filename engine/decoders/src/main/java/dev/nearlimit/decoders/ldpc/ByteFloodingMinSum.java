package dev.nearlimit.decoders.ldpc;

import dev.nearlimit.codes.batch.FrameBatch;
import dev.nearlimit.codes.gf2.SparseBitMatrix;
import dev.nearlimit.decoders.batch.LlrBatch;
import dev.nearlimit.numerics.kernels.BitSumKernels;
import dev.nearlimit.numerics.kernels.CheckRun;
import dev.nearlimit.numerics.kernels.DecoderKernels;
import dev.nearlimit.numerics.kernels.LayeredMinSumKernels;
import dev.nearlimit.numerics.kernels.MinSumArithmetic;
import java.util.Arrays;

/**
 * Flooding fixed-point min-sum on kernels with 8-bit lanes, for word lengths whose every value in a check fits a byte and
 * whose sums fit 16 bits. It gives what {@link FixedPointBeliefPropagation} gives, to the bit.
 */
final class ByteFloodingMinSum extends BeliefPropagation {
    private final LayeredMinSumKernels checks;
    private final BitSumKernels sums;
    private final MinSumArithmetic arithmetic;
    private final FloodingPasses passes;
    private final byte[] channel;
    private final byte[] posterior;
    private final byte[] message;
    private final byte[] copy;
    private final byte[] scratch;
    private final ChosenLanes starting = new ChosenLanes();
    private final byte[] row = new byte[FrameBatch.FRAMES];
    private final byte[] keep = new byte[RowRuns.MOST_ROWS * FrameBatch.FRAMES];
    private final long[] words = new long[512];
    private long started;

    ByteFloodingMinSum(
            SparseBitMatrix matrix,
            Iterations iterations,
            MinSumArithmetic arithmetic,
            FloodingPasses passes,
            DecoderKernels kernels) {
        super(matrix, iterations);
        this.checks = kernels.layeredMinSum();
        this.sums = kernels.bitSums();
        this.arithmetic = arithmetic;
        this.passes = passes;
        this.channel = new byte[matrix.columns() * FrameBatch.FRAMES];
        this.posterior = new byte[channel.length];
        this.message = new byte[matrix.ones() * FrameBatch.FRAMES];
        this.copy = new byte[passes.copyLength()];
        this.scratch = new byte[passes.largest(CheckRun::scratch)];
    }

    @Override
    void load(LlrBatch received, long lanes) {
        starting.choose(lanes);
        starting.keepOthers(row);
        checks.start(posterior, received.levels(), row);
        checks.start(channel, received.levels(), row);
        // Their messages are taken for 0 by the next iteration, which writes them anyway.
        started |= lanes;
    }

    @Override
    void iterate() {
        boolean some = started != 0;
        if (some) {
            starting.choose(started);
            starting.keepOthers(keep);
            started = 0;
        }
        for (int run = 0; run < passes.runs(); run++) {
            CheckRun onCopy = passes.onCopy(run);
            passes.copyPosteriors(run, posterior, copy);
            if (some) {
                checks.updateStarting(onCopy, arithmetic, copy, message, scratch, keep);
            } else {
                checks.update(onCopy, arithmetic, copy, message, scratch);
            }
        }
        sums.sum(passes.edges(), arithmetic.largestPosterior(), channel, message, posterior);
    }

    @Override
    long unsatisfied(long inQuestion) {
        Arrays.fill(row, (byte) 0);
        for (CheckRun run : passes.all()) {
            checks.addUnsatisfied(run, posterior, row);
        }
        return ByteLayeredMinSum.signs(row, 0) & inQuestion;
    }

    @Override
    void decisions(long[] bits) {
        checks.signs(posterior, bits, words);
    }

    @Override
    long hardDecisions(int position) {
        return ByteLayeredMinSum.signs(posterior, position * FrameBatch.FRAMES);
    }
}
