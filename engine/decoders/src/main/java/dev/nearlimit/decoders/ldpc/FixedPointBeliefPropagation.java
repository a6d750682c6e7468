package dev.nearlimit.decoders.ldpc;

import dev.nearlimit.codes.batch.FrameBatch;
import dev.nearlimit.codes.gf2.SparseBitMatrix;
import dev.nearlimit.decoders.batch.LlrBatch;

/**
 * Min-sum on integers of stated word lengths (M and P the largest message and posterior). A check reads from each of its
 * bits t = posterior - its own last message to it, exactly; returns to each bit the least min(|t|, M) of the others,
 * corrected, with the product of the others' signs (0 counts as positive); and
 *
 * <ul>
 *   <li>layered: the posterior becomes t plus the new message, limited to -P .. P, before the next row reads it;
 *   <li>flooding: once all rows are done, the posterior becomes the channel's level plus all new messages, limited to
 *       -P .. P.
 * </ul>
 *
 * A row of weight 1 returns M, corrected. Lanes are {@code int}: with them the JIT makes SIMD of every loop below, which
 * it does not of narrower ones; the results are those of any lanes that are wide enough.
 */
final class FixedPointBeliefPropagation extends BeliefPropagation {
    private final ChosenLanes starting = new ChosenLanes();
    private final RowRuns runs;
    private final boolean layered;
    private final FixedPointCheckRule rule;
    private final int largestPosterior;
    private final int[] posterior;
    private final int[][] message;
    private final int[] channel;
    private final int[] sum;
    private final int[][] incoming;
    private final int[] touched;

    FixedPointBeliefPropagation(
            SparseBitMatrix matrix, Iterations iterations, WordLengths words, MagnitudeCorrection correction) {
        super(matrix, iterations);
        this.runs = new RowRuns(matrix);
        this.layered = iterations.schedule() == Schedule.LAYERED;
        int lanes = RowRuns.MOST_ROWS * FrameBatch.FRAMES;
        this.rule = new FixedPointCheckRule(words.largestMessage(), correction, lanes);
        this.largestPosterior = words.largestPosterior();
        this.posterior = new int[matrix.columns() * FrameBatch.FRAMES];
        this.message = new int[runs.edges()][];
        for (int run = 0; run < runs.count(); run++) {
            for (int i = 0; i < runs.degree(run); i++) {
                message[runs.firstEdge(run) + i] = new int[runs.rows(run) * FrameBatch.FRAMES];
            }
        }
        this.channel = new int[layered ? 0 : posterior.length];
        this.sum = new int[layered ? 0 : posterior.length];
        this.incoming = new int[runs.largestDegree()][lanes];
        this.touched = new int[lanes];
    }

    @Override
    void load(LlrBatch received, long lanes) {
        starting.choose(lanes);
        starting.copy(received.levels(), posterior);
        starting.copy(received.levels(), channel);
        for (int[] ofEdge : message) {
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
                int bits = runs.column(run, i) * FrameBatch.FRAMES;
                if (layered) {
                    addLimited(incoming[i], message[first + i], largestPosterior, lanes);
                    System.arraycopy(incoming[i], 0, posterior, bits, lanes);
                } else {
                    System.arraycopy(sum, bits, touched, 0, lanes);
                    add(touched, message[first + i], lanes);
                    System.arraycopy(touched, 0, sum, bits, lanes);
                }
            }
        }
        if (!layered) {
            limit(sum, posterior, largestPosterior);
        }
    }

    @Override
    long hardDecisions(int position) {
        int at = position * FrameBatch.FRAMES;
        long word = 0;
        for (int f = 0; f < FrameBatch.FRAMES; f++) {
            word |= (posterior[at + f] >>> 31 & 1L) << f;
        }
        return word;
    }

    private static void subtract(int[] values, int[] less, int lanes) {
        for (int f = 0; f < lanes; f++) {
            values[f] -= less[f];
        }
    }

    private static void add(int[] values, int[] more, int lanes) {
        for (int f = 0; f < lanes; f++) {
            values[f] += more[f];
        }
    }

    private static void addLimited(int[] values, int[] more, int limit, int lanes) {
        for (int f = 0; f < lanes; f++) {
            values[f] = limited(values[f] + more[f], limit);
        }
    }

    private static void limit(int[] values, int[] result, int limit) {
        for (int i = 0; i < result.length; i++) {
            result[i] = limited(values[i], limit);
        }
    }

    /** The nearest to x in -limit .. limit, by masks: the JIT of Java 17 makes no SIMD of the integer Math.min. */
    private static int limited(int x, int limit) {
        int over = x - limit;
        int above = (over & (over >> 31)) + 2 * limit;
        return (above & ~(above >> 31)) - limit;
    }
}
