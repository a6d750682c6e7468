package dev.nearlimit.decoders.ldpc;

import dev.nearlimit.codes.batch.FrameBatch;
import dev.nearlimit.codes.gf2.SparseBitMatrix;
import dev.nearlimit.decoders.batch.LlrBatch;

/**
 * Belief propagation in single precision with any check rule. A check reads from each of its bits t = posterior - its own
 * last message to it; the rule makes new messages, which are limited to -{@value #LARGEST} .. {@value #LARGEST}; and
 *
 * <ul>
 *   <li>layered: the posterior becomes t plus the new message before the next row reads it;
 *   <li>flooding: the posterior becomes the channel's LLR plus all new messages, added in the order of the rows.
 * </ul>
 *
 * The channel's LLRs are limited likewise, so that nothing ever overflows; both limits are far beyond any LLR that
 * matters to a decision. Every operation is an addition, subtraction, multiplication, minimum or maximum in single
 * precision, and no lane sees another, so that any kernel gives the same bits. No posterior is ever -0: the channel's
 * are made +0, and a sum or difference of other values is -0 only if both operands vanish with that sign.
 */
final class FloatBeliefPropagation extends BeliefPropagation {
    /** Largest magnitude of a channel LLR and of a message. */
    static final float LARGEST = 1024f;

    private final ChosenLanes starting = new ChosenLanes();
    private final RowRuns runs;
    private final boolean layered;
    private final FloatCheckRule rule;
    private final float[] channel;
    private final float[][] message;
    private final float[][] incoming;
    private final float[] touched = new float[RowRuns.MOST_ROWS * FrameBatch.FRAMES];
    private float[] posterior;
    private float[] sum;

    FloatBeliefPropagation(SparseBitMatrix matrix, Iterations iterations, RowRuns runs, FloatCheckRule rule) {
        super(matrix, iterations);
        this.runs = runs;
        this.layered = iterations.schedule() == Schedule.LAYERED;
        this.rule = rule;
        this.posterior = new float[matrix.columns() * FrameBatch.FRAMES];
        this.message = new float[runs.edges()][];
        for (int run = 0; run < runs.count(); run++) {
            for (int i = 0; i < runs.degree(run); i++) {
                message[runs.firstEdge(run) + i] = new float[runs.rows(run) * FrameBatch.FRAMES];
            }
        }
        this.channel = new float[layered ? 0 : posterior.length];
        this.sum = new float[layered ? 0 : posterior.length];
        this.incoming = new float[runs.largestDegree()][touched.length];
    }

    @Override
    void load(LlrBatch received, long lanes) {
        starting.choose(lanes);
        starting.copyLimited(received.values(), LARGEST, posterior);
        starting.copyLimited(received.values(), LARGEST, channel);
        for (float[] ofEdge : message) {
            starting.clear(ofEdge);
        }
    }

    @Override
    void iterate() {
        System.arraycopy(channel, 0, sum, 0, sum.length);
        for (int run = 0; run < runs.count(); run++) {
            int lanes = runs.rows(run) * FrameBatch.FRAMES;
            int degree = runs.degree(run);
            int first = runs.firstEdge(run);
            for (int i = 0; i < degree; i++) {
                System.arraycopy(posterior, runs.column(run, i) * FrameBatch.FRAMES, incoming[i], 0, lanes);
                subtract(incoming[i], message[first + i], lanes);
            }
            rule.apply(incoming, degree, lanes, message, first);
            for (int i = 0; i < degree; i++) {
                limit(message[first + i], lanes);
                int bits = runs.column(run, i) * FrameBatch.FRAMES;
                if (layered) {
                    add(incoming[i], message[first + i], lanes);
                    System.arraycopy(incoming[i], 0, posterior, bits, lanes);
                } else {
                    System.arraycopy(sum, bits, touched, 0, lanes);
                    add(touched, message[first + i], lanes);
                    System.arraycopy(touched, 0, sum, bits, lanes);
                }
            }
        }
        if (!layered) {
            float[] old = posterior;
            posterior = sum;
            sum = old;
        }
    }

    @Override
    long hardDecisions(int position) {
        int at = position * FrameBatch.FRAMES;
        long word = 0;
        for (int f = 0; f < FrameBatch.FRAMES; f++) {
            word |= (Float.floatToRawIntBits(posterior[at + f]) >>> 31 & 1L) << f;
        }
        return word;
    }

    private static void subtract(float[] values, float[] less, int lanes) {
        for (int f = 0; f < lanes; f++) {
            values[f] -= less[f];
        }
    }

    private static void add(float[] values, float[] more, int lanes) {
        for (int f = 0; f < lanes; f++) {
            values[f] += more[f];
        }
    }

    private static void limit(float[] values, int lanes) {
        for (int f = 0; f < lanes; f++) {
            values[f] = Math.max(-LARGEST, Math.min(LARGEST, values[f]));
        }
    }
}
