package dev.nearlimit.decoders.ldpc;

import dev.nearlimit.codes.batch.FrameBatch;
import dev.nearlimit.codes.gf2.SparseBitMatrix;
import dev.nearlimit.decoders.batch.LlrBatch;
import dev.nearlimit.numerics.kernels.CheckRun;
import dev.nearlimit.numerics.kernels.DecoderKernels;
import dev.nearlimit.numerics.kernels.MinSumArithmetic;
import java.util.Arrays;

/**
 * Flooding fixed-point min-sum on kernels with 8-bit lanes, for word lengths whose every value in a check fits a byte and
 * whose sums fit 16 bits. It gives what {@link FixedPointBeliefPropagation} gives, to the bit.
 */
final class ByteFloodingMinSum extends BeliefPropagation {
    private final DecoderKernels kernels;
    private final MinSumArithmetic arithmetic;
    private final FloodingPasses passes;
    private final byte[] channel;
    private final byte[] posterior;
    private final byte[] message;
    private final byte[] copy;
    private final byte[] scratch;

    ByteFloodingMinSum(
            SparseBitMatrix matrix,
            Iterations iterations,
            MinSumArithmetic arithmetic,
            FloodingPasses passes,
            DecoderKernels kernels) {
        super(matrix, iterations);
        this.kernels = kernels;
        this.arithmetic = arithmetic;
        this.passes = passes;
        this.channel = new byte[matrix.columns() * FrameBatch.FRAMES];
        this.posterior = new byte[channel.length];
        this.message = new byte[matrix.ones() * FrameBatch.FRAMES];
        this.copy = new byte[passes.copyLength()];
        this.scratch = new byte[passes.largest(CheckRun::scratch)];
    }

    @Override
    void load(LlrBatch received) {
        System.arraycopy(received.levels(), 0, channel, 0, channel.length);
        System.arraycopy(channel, 0, posterior, 0, posterior.length);
        Arrays.fill(message, (byte) 0);
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
        return ByteLayeredMinSum.signs(posterior, position);
    }
}
