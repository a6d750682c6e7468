package dev.nearlimit.decoders.ldpc;

import dev.nearlimit.codes.batch.FrameBatch;
import dev.nearlimit.codes.gf2.SparseBitMatrix;
import dev.nearlimit.decoders.batch.LlrBatch;
import dev.nearlimit.numerics.kernels.CheckRun;
import dev.nearlimit.numerics.kernels.LayeredFloatKernels;
import java.util.Arrays;

/** Layered belief propagation in single precision on kernels. It gives what {@link FloatBeliefPropagation} gives, to the bit. */
final class LayeredFloat extends BeliefPropagation {
    private final LayeredFloatKernels kernels;
    private final FloatChecks checks;
    private final CheckRun[] runs;
    private final float[] posterior;
    private final float[] message;
    private final float[] scratch;
    private final ChosenLanes starting = new ChosenLanes();
    private final float[] row = new float[FrameBatch.FRAMES];

    LayeredFloat(SparseBitMatrix matrix, Iterations iterations, FloatChecks checks, LayeredFloatKernels kernels) {
        super(matrix, iterations);
        this.checks = checks;
        this.kernels = kernels;
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
    void load(LlrBatch received, long lanes) {
        starting.choose(lanes);
        starting.copyLimited(received.values(), FloatBeliefPropagation.LARGEST, posterior);
        starting.clear(message);
    }

    @Override
    void iterate() {
        for (CheckRun run : runs) {
            checks.update(run, posterior, message, scratch);
        }
    }

    @Override
    long unsatisfied(long inQuestion) {
        Arrays.fill(row, 0f);
        for (CheckRun run : runs) {
            kernels.addUnsatisfied(run, posterior, row);
        }
        return FloatBeliefPropagation.signs(row, 0) & inQuestion;
    }

    @Override
    long hardDecisions(int position) {
        return FloatBeliefPropagation.signs(posterior, position * FrameBatch.FRAMES);
    }
}
