package dev.nearlimit.decoders.ldpc;

import dev.nearlimit.codes.gf2.SparseBitMatrix;
import dev.nearlimit.decoders.RefillingDecoder;
import dev.nearlimit.decoders.batch.BatchSource;
import dev.nearlimit.decoders.batch.DecodedBatch;
import dev.nearlimit.decoders.batch.FinishedFrames;
import dev.nearlimit.decoders.batch.LlrBatch;

/**
 * The course of every decoder in this package: start from the channel's LLRs, iterate, and end each frame by itself. A
 * frame whose hard decisions on the channel's LLRs are a codeword already takes 0 iterations when it may stop early.
 * What is left over after the most iterations with an unsatisfied check is a declared failure; its bits are the last
 * hard decisions. A lane whose frame has ended takes its next one while the others go on.
 */
abstract class BeliefPropagation implements RefillingDecoder {
    private final int n;
    private final Iterations iterations;
    private final Lanes lanes = new Lanes();
    private final DecodedBatch ended;
    private final HardSyndrome syndrome;
    private final SingleBatch single = new SingleBatch();

    BeliefPropagation(SparseBitMatrix matrix, Iterations iterations) {
        this.n = matrix.columns();
        this.iterations = iterations;
        this.ended = new DecodedBatch(n);
        this.syndrome = new HardSyndrome(matrix, this::hardDecisions);
    }

    @Override
    public final void decode(LlrBatch received, DecodedBatch decoded) {
        if (received.n() != n || decoded.bits().length != n) {
            throw new IllegalArgumentException("decoder is for n = " + n + ", received has " + received.n()
                    + " positions, decoded " + decoded.bits().length);
        }
        decoded.setDeclaredFailures(0);
        single.received = received;
        single.decoded = decoded;
        decode(single, single);
    }

    @Override
    public final void decode(BatchSource source, FinishedFrames finished) {
        lanes.start();
        while (true) {
            for (long some = lanes.nextToStart(source); some != 0; some = lanes.nextToStart(source)) {
                load(lanes.batchToStart(), some);
            }
            if (lanes.running() == 0) {
                return;
            }
            endFrames(finished);
            if (lanes.running() != 0) {
                iterate();
                lanes.countIteration();
            }
        }
    }

    private void endFrames(FinishedFrames finished) {
        long last = lanes.atIteration(iterations.most());
        long inQuestion = iterations.earlyStop() ? lanes.running() : last;
        if (inQuestion == 0) {
            return;
        }
        syndrome.forget();
        long unsatisfied = unsatisfied(inQuestion);
        long ends = (inQuestion & ~unsatisfied) | last;
        if (ends != 0) {
            syndrome.copyDecisions(ended.bits());
            ended.setDeclaredFailures(unsatisfied & ends);
            lanes.end(ends, ended, finished);
        }
    }

    /**
     * Which of the lanes in question leave a check unsatisfied; may be asked once after each iteration. Here by hard
     * decisions, taken only where a check asks for them, until every lane has failed one.
     */
    long unsatisfied(long inQuestion) {
        return syndrome.unsatisfied(inQuestion);
    }

    /** Starts some lanes: their posteriors are the channel's values, their messages 0. Other lanes stay what they are. */
    abstract void load(LlrBatch received, long lanes);

    /** One iteration over all rows, in all lanes. */
    abstract void iterate();

    /** Signs of the posteriors of one position: bit f is 1 exactly where frame f's is below 0. */
    abstract long hardDecisions(int position);

    /** A source of one batch, and where its result goes. */
    private static final class SingleBatch implements BatchSource, FinishedFrames {
        private LlrBatch received;
        private DecodedBatch decoded;

        @Override
        public LlrBatch next() {
            LlrBatch next = received;
            received = null;
            return next;
        }

        @Override
        public void accept(long batch, long lanes, DecodedBatch ended) {
            decoded.take(lanes, ended);
        }
    }
}
