package dev.nearlimit.decoders.ldpc;

import dev.nearlimit.codes.batch.FrameBatch;
import dev.nearlimit.codes.gf2.SparseBitMatrix;
import dev.nearlimit.decoders.batch.LlrBatch;
import dev.nearlimit.numerics.kernels.CheckRun;
import dev.nearlimit.numerics.kernels.LayeredFloatKernels;
import java.util.Arrays;

/** Layered belief propagation in single precision on kernels. It gives what {@link FloatBeliefPropagation} gives, to the bit. */
final class LayeredFloat extends BeliefPropagation {
    private final FloatChecks checks;
    private final CheckRun[] runs;
    private final float[] posterior;
    private final float[] message;
    private final float[] scratch;

    LayeredFloat(SparseBitMatrix matrix, Iterations iterations, FloatChecks checks) {
        super(matrix, iterations);
        this.checks = checks;
        this.runs = new RowRuns(matrix).checkRuns();
        this.posterior = new float[matrix.columns() * FrameBatch.FRAMES];
        this.message = new float[matrix.ones() * FrameBatch.FRAMES];
        this.scratch = new float
                [Arrays.stream(runs)
                        .mapToInt(LayeredFloatKernels::scratch)
                        .max()
                        .orElse(0)];
    }

    @Override
    void load(LlrBatch received) {
        FloatBeliefPropagation.limit(received.values(), posterior);
        Arrays.fill(message, 0f);
    }

    @Override
    void iterate() {
        for (CheckRun run : runs) {
            checks.update(run, posterior, message, scratch);
        }
    }

    @Override
    long hardDecisions(int position) {
        return FloatBeliefPropagation.signs(posterior, position);
    }
}
