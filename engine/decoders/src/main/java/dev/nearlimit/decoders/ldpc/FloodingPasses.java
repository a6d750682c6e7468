package dev.nearlimit.decoders.ldpc;

import dev.nearlimit.codes.batch.FrameBatch;
import dev.nearlimit.codes.gf2.SparseBitMatrix;
import dev.nearlimit.numerics.kernels.BitEdges;
import dev.nearlimit.numerics.kernels.CheckRun;
import java.util.function.ToIntFunction;

/**
 * A flooding iteration as kernels take it. Its checks are those of the layered schedule, made on copies of the posteriors
 * that are thrown away, so that all of them see the posteriors of the iteration before; then every bit adds its messages
 * in the order of the rows.
 */
final class FloodingPasses {
    private final CheckRun[] runs;
    private final CheckRun[] onCopy;
    private final BitEdges edges;

    FloodingPasses(SparseBitMatrix matrix) {
        this.runs = new RowRuns(matrix).checkRuns();
        this.onCopy = new CheckRun[runs.length];
        for (int run = 0; run < runs.length; run++) {
            int[] bits = new int[runs[run].bits().length];
            for (int i = 0; i < bits.length; i++) {
                bits[i] = i * runs[run].lanes();
            }
            onCopy[run] = new CheckRun(bits, runs[run].messages(), runs[run].lanes());
        }
        this.edges = edges(runs, matrix);
    }

    private static BitEdges edges(CheckRun[] runs, SparseBitMatrix matrix) {
        int[] next = new int[matrix.columns() + 1];
        for (int row = 0; row < matrix.rows(); row++) {
            for (int i = 0; i < matrix.rowWeight(row); i++) {
                next[matrix.column(row, i) + 1]++;
            }
        }
        for (int bit = 0; bit < matrix.columns(); bit++) {
            next[bit + 1] += next[bit];
        }
        int[] first = next.clone();
        int[] messages = new int[matrix.ones()];
        // Rows of a run share no bit, so that runs in order are rows in order.
        for (CheckRun run : runs) {
            for (int i = 0; i < run.bits().length; i++) {
                for (int lanes = 0; lanes < run.lanes(); lanes += FrameBatch.FRAMES) {
                    int bit = (run.bits()[i] + lanes) / FrameBatch.FRAMES;
                    messages[next[bit]++] = run.messages() + i * run.lanes() + lanes;
                }
            }
        }
        return new BitEdges(first, messages);
    }

    int runs() {
        return runs.length;
    }

    /** All runs, on the posteriors themselves. */
    CheckRun[] all() {
        return runs;
    }

    /**
     * Copies the posteriors that a run reads to where {@link #onCopy} has them.
     *
     * @param posteriors array of any element type
     * @param copy another of the same, of {@link #copyLength()} elements
     */
    void copyPosteriors(int run, Object posteriors, Object copy) {
        int[] from = runs[run].bits();
        for (int i = 0; i < from.length; i++) {
            System.arraycopy(posteriors, from[i], copy, onCopy[run].bits()[i], onCopy[run].lanes());
        }
    }

    /** A run whose bits lie in the copy, one after the other. */
    CheckRun onCopy(int run) {
        return onCopy[run];
    }

    /** Values that the copy holds at most. */
    int copyLength() {
        return largest(run -> run.bits().length * run.lanes());
    }

    /** The largest figure of any run; 0 where there is none. */
    int largest(ToIntFunction<CheckRun> figure) {
        int most = 0;
        for (CheckRun run : runs) {
            most = Math.max(most, figure.applyAsInt(run));
        }
        return most;
    }

    BitEdges edges() {
        return edges;
    }

    /** Magnitude that a bit's sum reaches at most, the channel's level being a posterior itself. */
    long largestSum(WordLengths words) {
        int most = 0;
        for (int bit = 0; bit < edges.bits(); bit++) {
            most = Math.max(most, edges.first()[bit + 1] - edges.first()[bit]);
        }
        return words.largestPosterior() + (long) most * words.largestMessage();
    }
}
