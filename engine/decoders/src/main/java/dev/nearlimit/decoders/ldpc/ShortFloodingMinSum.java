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
 * Flooding fixed-point min-sum on kernels with 16-bit lanes, for word lengths of any size and
 * whose sums fit 16 bits. It gives what {@link FixedPointBeliefPropagation} gives, to the bit.
 */
final class ShortFloodingMinSum extends BeliefPropagation {
    private final LayeredMinSumKernels checks;
    private final BitSumKernels sums;
    private final MinSumArithmetic arithmetic;
    private final FloodingPasses passes;
    private final short[] channel;
    private final short[] posterior;
    private final short[] message;
    private final short[] copy;
    private final short[] scratch;
    private final ChosenLanes starting = new ChosenLanes();
    private final short[] row = new short[FrameBatch.FRAMES];
    private final short[] keep = new short[RowRuns.MOST_ROWS * FrameBatch.FRAMES];
    private long started;

    ShortFloodingMinSum(
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
        this.channel = new short[matrix.columns() * FrameBatch.FRAMES];
        this.posterior = new short[channel.length];
        this.message = new short[matrix.ones() * FrameBatch.FRAMES];
        this.copy = new short[passes.copyLength()];
        this.scratch = new short[passes.largest(CheckRun::scratch)];
    }

    @Override
    void load(LlrBatch received, long lanes) {
        starting.choose(lanes);
        starting.copy(received.levels(), posterior);
        starting.copy(received.levels(), channel);
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
        Arrays.fill(row, (short) 0);
        for (CheckRun run : passes.all()) {
            checks.addUnsatisfied(run, posterior, row);
        }
        return ShortLayeredMinSum.signs(row, 0) & inQuestion;
    }

    @Override
    long hardDecisions(int position) {
        return ShortLayeredMinSum.signs(posterior, position * FrameBatch.FRAMES);
    }
}
