package dev.nearlimit.decoders.ldpc;

import dev.nearlimit.codes.batch.FrameBatch;
import dev.nearlimit.codes.gf2.SparseBitMatrix;
import dev.nearlimit.decoders.batch.LlrBatch;
import java.util.Arrays;

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
    private final RowRuns runs;
    private final boolean layered;
    private final FixedPointCheckRule rule;
    private final int largestPosterior;
    private final int[] posterior;
    private final int[] message;
    private final int[] channel;
    private final int[] sum;
    private final int[] incoming;

    FixedPointBeliefPropagation(
            SparseBitMatrix matrix, Iterations iterations, WordLengths words, MagnitudeCorrection correction) {
        super(matrix, iterations);
        this.runs = new RowRuns(matrix);
        this.layered = iterations.schedule() == Schedule.LAYERED;
        int lanes = RowRuns.MOST_ROWS * FrameBatch.FRAMES;
        this.rule = new FixedPointCheckRule(words.largestMessage(), correction, lanes);
        this.largestPosterior = words.largestPosterior();
        this.posterior = new int[matrix.columns() * FrameBatch.FRAMES];
        this.message = new int[Math.multiplyExact(matrix.ones(), FrameBatch.FRAMES)];
        this.channel = new int[layered ? 0 : posterior.length];
        this.sum = new int[layered ? 0 : posterior.length];
        this.incoming = new int[runs.largestDegree() * lanes];
    }

    @Override
    void load(LlrBatch received) {
        byte[] levels = received.levels();
        for (int i = 0; i < posterior.length; i++) {
            posterior[i] = levels[i];
        }
        System.arraycopy(posterior, 0, channel, 0, channel.length);
        Arrays.fill(message, 0);
    }

    @Override
    void iterate() {
        System.arraycopy(channel, 0, sum, 0, sum.length);
        int messagesOfRun = 0;
        for (int run = 0; run < runs.count(); run++) {
            int lanes = runs.rows(run) * FrameBatch.FRAMES;
            int degree = runs.degree(run);
            for (int i = 0; i < degree; i++) {
                int bits = runs.column(run, i) * FrameBatch.FRAMES;
                subtract(posterior, bits, message, messagesOfRun + i * lanes, incoming, i * lanes, lanes);
            }
            rule.apply(incoming, degree, lanes, message, messagesOfRun);
            for (int i = 0; i < degree; i++) {
                int bits = runs.column(run, i) * FrameBatch.FRAMES;
                if (layered) {
                    addLimited(incoming, i * lanes, message, messagesOfRun + i * lanes, posterior, bits, lanes);
                } else {
                    accumulate(message, messagesOfRun + i * lanes, sum, bits, lanes);
                }
            }
            messagesOfRun += degree * lanes;
        }
        if (!layered) {
            limit(sum, posterior);
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

    private static void subtract(int[] a, int aFrom, int[] b, int bFrom, int[] result, int from, int lanes) {
        for (int f = 0; f < lanes; f++) {
            result[from + f] = a[aFrom + f] - b[bFrom + f];
        }
    }

    private static void accumulate(int[] a, int aFrom, int[] total, int from, int lanes) {
        for (int f = 0; f < lanes; f++) {
            total[from + f] += a[aFrom + f];
        }
    }

    private void addLimited(int[] a, int aFrom, int[] b, int bFrom, int[] result, int from, int lanes) {
        int limit = largestPosterior;
        for (int f = 0; f < lanes; f++) {
            result[from + f] = limited(a[aFrom + f] + b[bFrom + f], limit);
        }
    }

    private void limit(int[] values, int[] result) {
        int limit = largestPosterior;
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
