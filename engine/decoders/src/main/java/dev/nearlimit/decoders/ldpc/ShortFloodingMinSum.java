package dev.nearlimit.decoders.ldpc;

import dev.nearlimit.codes.batch.FrameBatch;
import dev.nearlimit.codes.gf2.SparseBitMatrix;
import dev.nearlimit.decoders.batch.LlrBatch;
import dev.nearlimit.numerics.kernels.CheckRun;
import dev.nearlimit.numerics.kernels.DecoderKernels;
import dev.nearlimit.numerics.kernels.MinSumArithmetic;
import java.util.Arrays;

/**
 * Flooding fixed-point min-sum on kernels with 16-bit lanes, for word lengths of any size and
 * whose sums fit 16 bits. It gives what {@link FixedPointBeliefPropagation} gives, to the bit.
 */
final class ShortFloodingMinSum extends BeliefPropagation {
    private final DecoderKernels kernels;
    private final MinSumArithmetic arithmetic;
    private final FloodingPasses passes;
    private final short[] channel;
    private final short[] posterior;
    private final short[] message;
    private final short[] copy;
    private final short[] scratch;

    ShortFloodingMinSum(
            SparseBitMatrix matrix,
            Iterations iterations,
            MinSumArithmetic arithmetic,
            FloodingPasses passes,
            DecoderKernels kernels) {
        super(matrix, iterations);
        this.kernels = kernels;
        this.arithmetic = arithmetic;
        this.passes = passes;
        this.channel = new short[matrix.columns() * FrameBatch.FRAMES];
        this.posterior = new short[channel.length];
        this.message = new short[matrix.ones() * FrameBatch.FRAMES];
        this.copy = new short[passes.copyLength()];
        this.scratch = new short[passes.largest(CheckRun::scratch)];
    }

    @Override
    void load(LlrBatch received) {
        byte[] levels = received.levels();
        for (int i = 0; i < channel.length; i++) {
            channel[i] = levels[i];
        }
        System.arraycopy(channel, 0, posterior, 0, posterior.length);
        Arrays.fill(message, (short) 0);
    }

    @Override
    void iterate() {
        for (int run = 0; run < passes.runs(); run++) {
            CheckRun onCopy = passes.onCopy(run);
            int[] bits = passes.bits(run);
            for (int i = 0; i < bits.length; i++) {
                System.arraycopy(posterior, bits[i], copy, onCopy.bits()[i], onCopy.lanes());
            }
            kernels.layeredMinSum().update(onCopy, arithmetic, copy, message, scratch);
        }
        kernels.bitSums().sum(passes.edges(), arithmetic.largestPosterior(), channel, message, posterior);
    }

    @Override
    long hardDecisions(int position) {
        return ShortLayeredMinSum.signs(posterior, position);
    }
}
