package dev.nearlimit.decoders.ldpc;

import dev.nearlimit.codes.batch.FrameBatch;
import dev.nearlimit.codes.gf2.SparseBitMatrix;
import dev.nearlimit.decoders.batch.LlrBatch;
import dev.nearlimit.numerics.kernels.BitSumKernels;
import dev.nearlimit.numerics.kernels.CheckRun;
import dev.nearlimit.numerics.kernels.DecoderKernels;
import dev.nearlimit.numerics.kernels.LayeredFloatKernels;
import java.util.Arrays;

/** Flooding in single precision on kernels. It gives what {@link FloatBeliefPropagation} gives, to the bit. */
final class FloodingFloat extends BeliefPropagation {
    private final FloatChecks checks;
    private final LayeredFloatKernels kernels;
    private final BitSumKernels sums;
    private final FloodingPasses passes;
    private final float[] channel;
    private final float[] posterior;
    private final float[] message;
    private final float[] copy;
    private final float[] scratch;
    private final ChosenLanes starting = new ChosenLanes();
    private final float[] row = new float[FrameBatch.FRAMES];

    FloodingFloat(SparseBitMatrix matrix, Iterations iterations, FloatChecks checks, DecoderKernels kernels) {
        super(matrix, iterations);
        this.checks = checks;
        this.kernels = kernels.layeredFloat();
        this.sums = kernels.bitSums();
        this.passes = new FloodingPasses(matrix);
        this.channel = new float[matrix.columns() * FrameBatch.FRAMES];
        this.posterior = new float[channel.length];
        this.message = new float[matrix.ones() * FrameBatch.FRAMES];
        this.copy = new float[passes.copyLength()];
        this.scratch = new float[passes.largest(LayeredFloatKernels::scratch)];
    }

    @Override
    void load(LlrBatch received, long lanes) {
        starting.choose(lanes);
        starting.copyLimited(received.values(), FloatBeliefPropagation.LARGEST, channel);
        starting.copyLimited(received.values(), FloatBeliefPropagation.LARGEST, posterior);
        starting.clear(message);
    }

    @Override
    void iterate() {
        for (int run = 0; run < passes.runs(); run++) {
            CheckRun onCopy = passes.onCopy(run);
            passes.copyPosteriors(run, posterior, copy);
            checks.update(onCopy, copy, message, scratch);
        }
        sums.sum(passes.edges(), channel, message, posterior);
    }

    @Override
    long unsatisfied(long inQuestion) {
        Arrays.fill(row, 0f);
        for (CheckRun run : passes.all()) {
            kernels.addUnsatisfied(run, posterior, row);
        }
        return FloatBeliefPropagation.signs(row, 0) & inQuestion;
    }

    @Override
    long hardDecisions(int position) {
        return FloatBeliefPropagation.signs(posterior, position * FrameBatch.FRAMES);
    }
}
