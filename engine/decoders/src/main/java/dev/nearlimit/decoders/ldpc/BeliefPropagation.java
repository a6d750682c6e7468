package dev.nearlimit.decoders.ldpc;

import dev.nearlimit.codes.gf2.SparseBitMatrix;
import dev.nearlimit.decoders.Decoder;
import dev.nearlimit.decoders.batch.DecodedBatch;
import dev.nearlimit.decoders.batch.LlrBatch;

/**
 * The course of every decoder in this package: start from the channel's LLRs, iterate, and stop each frame by itself. A
 * frame whose hard decisions on the channel's LLRs are a codeword already takes 0 iterations when it may stop early.
 * What is left over at the end with an unsatisfied check is a declared failure; its bits are the last hard decisions.
 */
abstract class BeliefPropagation implements Decoder {
    private final int n;
    private final Iterations iterations;
    private final FrameStops stops;
    private final FrameStops.HardDecisions decisions;

    BeliefPropagation(SparseBitMatrix matrix, Iterations iterations) {
        this.n = matrix.columns();
        this.iterations = iterations;
        this.stops = new FrameStops(matrix);
        // Made once: a batch allocates nothing.
        this.decisions = this::hardDecisions;
    }

    @Override
    public final void decode(LlrBatch received, DecodedBatch decoded) {
        if (received.n() != n || decoded.bits().length != n) {
            throw new IllegalArgumentException("decoder is for n = " + n + ", received has " + received.n()
                    + " positions, decoded " + decoded.bits().length);
        }
        load(received);
        stops.start();
        if (iterations.earlyStop()) {
            stops.stopSatisfied(decisions, 0, decoded);
        }
        int taken = 0;
        while (taken < iterations.most() && !stops.allStopped()) {
            iterate();
            taken++;
            if (iterations.earlyStop() && taken < iterations.most()) {
                stops.stopSatisfied(decisions, taken, decoded);
            }
        }
        stops.stopAll(decisions, taken, decoded);
    }

    /** Starts a batch: posteriors are the channel's values, messages are 0. */
    abstract void load(LlrBatch received);

    /** One iteration over all rows. */
    abstract void iterate();

    /** Signs of the posteriors of one position: bit f is 1 exactly where frame f's is below 0. */
    abstract long hardDecisions(int position);
}
