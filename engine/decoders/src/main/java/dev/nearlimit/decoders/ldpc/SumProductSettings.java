package dev.nearlimit.decoders.ldpc;

import dev.nearlimit.codes.Code;
import dev.nearlimit.codes.batch.FrameBatch;
import dev.nearlimit.codes.gf2.SparseBitMatrix;
import dev.nearlimit.decoders.Decoder;
import dev.nearlimit.decoders.DecoderSettings;
import dev.nearlimit.decoders.OperationCount;
import dev.nearlimit.decoders.Quantiser;
import dev.nearlimit.numerics.kernels.DecoderKernels;
import dev.nearlimit.numerics.kernels.Kernels;
import dev.nearlimit.numerics.kernels.LayeredFloatKernels;
import java.util.Optional;

/**
 * Sum-product decoding (Gallager 1962) in single precision, with the check rule of {@link SumProductCheckRule}: a message
 * of a row of weight d is within (d - 2) * 1.1e-4 of the exact rule on the values read, before both are limited. A
 * quantiser in front acts on the channel's LLRs alone.
 */
public record SumProductSettings(Iterations iterations) implements DecoderSettings {
    static final String NAME = "sum-product";

    @Override
    public String family() {
        return NAME;
    }

    @Override
    public String designator() {
        return NAME + ":" + iterations.designator();
    }

    @Override
    public int revision() {
        return 1;
    }

    @Override
    public boolean hardDecision() {
        return false;
    }

    @Override
    public Decoder newDecoder(Code code, Quantiser quantiser) {
        return decoder(code.parityCheck(), Kernels.decoders());
    }

    /** The decoder on the given kernels, or without any; the results are the same. */
    Decoder decoder(SparseBitMatrix matrix, Optional<DecoderKernels> kernels) {
        if (kernels.isPresent()) {
            LayeredFloatKernels checks = kernels.get().layeredFloat();
            return FloatBeliefPropagation.on(
                    kernels.get(),
                    matrix,
                    iterations,
                    (run, posterior, message, scratch) ->
                            checks.sumProduct(run, FloatBeliefPropagation.LARGEST, posterior, message, scratch));
        }
        RowRuns runs = new RowRuns(matrix);
        FloatCheckRule rule = new SumProductCheckRule(runs.largestDegree(), RowRuns.MOST_ROWS * FrameBatch.FRAMES);
        return new FloatBeliefPropagation(matrix, iterations, runs, rule);
    }

    /**
     * An iteration takes 2 additions (reading and updating the posterior) and 1 comparison (the limit) an edge, and
     * 3(d-2) box-plus operations a row of weight d, each of 5 additions, 3 comparisons and 2 look-ups. With early
     * stopping a syndrome is added before the first iteration and after each.
     */
    @Override
    public OperationCount operationsPerFrame(Code code, double iterations) {
        EdgeCounts edges = EdgeCounts.of(code.parityCheck());
        OperationCount iteration = new OperationCount(2, 1, 0)
                .times(edges.edges())
                .plus(new OperationCount(5, 3, 2).times(3 * edges.inner()));
        return edges.perFrame(iteration, iterations, this.iterations);
    }

    @Override
    public int maxIterations() {
        return iterations.most();
    }
}
