package dev.nearlimit.decoders.ldpc;

import dev.nearlimit.codes.Code;
import dev.nearlimit.codes.batch.FrameBatch;
import dev.nearlimit.codes.gf2.SparseBitMatrix;
import dev.nearlimit.decoders.Decoder;
import dev.nearlimit.decoders.DecoderSettings;
import dev.nearlimit.decoders.InvalidDecoderException;
import dev.nearlimit.decoders.OperationCount;
import dev.nearlimit.decoders.Quantiser;
import dev.nearlimit.numerics.kernels.Kernels;
import dev.nearlimit.numerics.kernels.LayeredMinSumKernels;
import dev.nearlimit.numerics.kernels.MinSumArithmetic;
import java.util.Optional;

/**
 * Min-sum decoding (Fossorier, Mihaljevic and Imai 1999; with a correction Chen et al. 2005). With word lengths it works
 * on the quantiser's levels in integers of exactly those lengths, without on the LLRs in single precision.
 *
 * @param words word lengths of the fixed-point decoder; empty for single precision
 */
public record MinSumSettings(Iterations iterations, MagnitudeCorrection correction, Optional<WordLengths> words)
        implements DecoderSettings {
    static final String NAME = "min-sum";

    public MinSumSettings {
        if (words.isPresent()
                && correction instanceof MagnitudeCorrection.Offset offset
                && offset.amount() != (int) offset.amount()) {
            throw new InvalidDecoderException("offset of " + NAME + " is " + offset.amount()
                    + ", must be a whole number of levels in fixed point (word=)");
        }
    }

    @Override
    public String family() {
        return NAME;
    }

    @Override
    public String designator() {
        return NAME + ":" + iterations.designator() + "," + correction.designator()
                + words.map(w -> ",message-word=" + w.message() + ",posterior-word=" + w.posterior())
                        .orElse("");
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
    public boolean readsLevels() {
        return words.isPresent();
    }

    @Override
    public Decoder newDecoder(Code code, Quantiser quantiser) {
        SparseBitMatrix matrix = code.parityCheck();
        if (words.isEmpty()) {
            RowRuns runs = new RowRuns(matrix);
            FloatCheckRule rule =
                    new MinSumCheckRule(correction, runs.largestDegree(), RowRuns.MOST_ROWS * FrameBatch.FRAMES);
            return new FloatBeliefPropagation(matrix, iterations, runs, rule);
        }
        if (quantiser.wordBits() == 0) {
            throw new InvalidDecoderException(NAME + " in fixed point needs a quantiser before it, found none");
        }
        if (quantiser.largestLevel() > words.get().largestPosterior()) {
            throw new InvalidDecoderException("posterior-word of " + NAME + " is "
                    + words.get().posterior() + " bits, too short for levels up to " + quantiser.largestLevel()
                    + " of the quantiser");
        }
        return fixedPoint(matrix, words.get(), Kernels.layeredMinSum());
    }

    /** The fixed-point decoder on the given kernels, or without any; the results are the same. */
    Decoder fixedPoint(SparseBitMatrix matrix, WordLengths words, Optional<LayeredMinSumKernels> kernels) {
        if (iterations.schedule() != Schedule.LAYERED || kernels.isEmpty()) {
            return new FixedPointBeliefPropagation(matrix, iterations, words, correction);
        }
        MinSumArithmetic arithmetic = new MinSumArithmetic(
                words.largestMessage(),
                words.largestPosterior(),
                correction instanceof MagnitudeCorrection.Scale scale ? scale.eighths() : 8,
                correction instanceof MagnitudeCorrection.Offset offset ? (int) offset.amount() : 0);
        return arithmetic.fitsBytes()
                ? new ByteLayeredMinSum(matrix, iterations, arithmetic, kernels.get())
                : new ShortLayeredMinSum(matrix, iterations, arithmetic, kernels.get());
    }

    /**
     * An iteration takes, an edge, 2 additions (reading and updating the posterior), 2 for the signs, 2 comparisons for
     * the two least magnitudes, 1 to choose between them, and 1 for each limit (message, and in fixed point posterior);
     * and a row the correction of two magnitudes, 1 addition each and with an offset 1 comparison. This is the cost of
     * the method with two minima, which gives the same messages as any other way to do it. With early stopping a
     * syndrome is added before the first iteration and after each.
     */
    @Override
    public OperationCount operationsPerFrame(Code code, double iterations) {
        EdgeCounts edges = EdgeCounts.of(code.parityCheck());
        OperationCount iteration = new OperationCount(4, words.isPresent() ? 5 : 4, 0)
                .times(edges.edges())
                .plus(ofCorrection().times(2 * edges.rows()));
        return edges.perFrame(iteration, iterations, this.iterations);
    }

    private OperationCount ofCorrection() {
        if (correction instanceof MagnitudeCorrection.Offset) {
            return new OperationCount(1, 1, 0);
        }
        boolean none = correction.equals(new MagnitudeCorrection.Scale(8));
        return new OperationCount(none ? 0 : 1, 0, 0);
    }

    @Override
    public int maxIterations() {
        return iterations.most();
    }
}
