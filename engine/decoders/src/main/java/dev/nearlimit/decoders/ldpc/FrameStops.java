package dev.nearlimit.decoders.ldpc;

import dev.nearlimit.codes.gf2.SparseBitMatrix;
import dev.nearlimit.decoders.batch.DecodedBatch;
import java.util.Arrays;

/**
 * Finds the frames whose hard decisions satisfy every check, and keeps their bits and iterations as they were then, so
 * that what their lanes do afterwards no longer matters.
 *
 * <p>Hard decisions are taken only where a check asks for them, and checks are looked at only until every running frame
 * has failed one: long before convergence this costs next to nothing.
 */
final class FrameStops {
    /** Where hard decisions come from. */
    interface HardDecisions {
        /** Decided bits of one position, bit f belonging to frame f. */
        long at(int position);
    }

    private final SparseBitMatrix matrix;
    private final long[] bits;
    private final boolean[] known;
    private long running;

    FrameStops(SparseBitMatrix matrix) {
        this.matrix = matrix;
        this.bits = new long[matrix.columns()];
        this.known = new boolean[matrix.columns()];
    }

    /** Sets all frames running. */
    void start() {
        running = -1L;
    }

    boolean allStopped() {
        return running == 0;
    }

    /** Stops the running frames that satisfy all checks, with the iterations taken so far. */
    void stopSatisfied(HardDecisions decisions, int iterations, DecodedBatch decoded) {
        long satisfied = running & ~unsatisfied(decisions, running);
        if (satisfied != 0) {
            keep(satisfied, decisions, iterations, decoded);
            running &= ~satisfied;
        }
    }

    /** Stops what still runs; those that leave a check unsatisfied have failed. */
    void stopAll(HardDecisions decisions, int iterations, DecodedBatch decoded) {
        if (running == 0) {
            decoded.setDeclaredFailures(0);
            return;
        }
        decoded.setDeclaredFailures(unsatisfied(decisions, running));
        keep(running, decisions, iterations, decoded);
        running = 0;
    }

    /** Lanes with an unsatisfied check; the answer is right for the lanes in question, of which it is a subset. */
    private long unsatisfied(HardDecisions decisions, long inQuestion) {
        Arrays.fill(known, false);
        long found = 0;
        for (int row = 0; row < matrix.rows() && (found & inQuestion) != inQuestion; row++) {
            long sum = 0;
            for (int i = 0; i < matrix.rowWeight(row); i++) {
                sum ^= bit(decisions, matrix.column(row, i));
            }
            found |= sum;
        }
        return found & inQuestion;
    }

    private long bit(HardDecisions decisions, int position) {
        if (!known[position]) {
            bits[position] = decisions.at(position);
            known[position] = true;
        }
        return bits[position];
    }

    private void keep(long lanes, HardDecisions decisions, int iterations, DecodedBatch decoded) {
        long[] kept = decoded.bits();
        for (int position = 0; position < bits.length; position++) {
            kept[position] = (kept[position] & ~lanes) | (bit(decisions, position) & lanes);
        }
        for (long rest = lanes; rest != 0; rest &= rest - 1) {
            decoded.iterations()[Long.numberOfTrailingZeros(rest)] = iterations;
        }
    }
}
