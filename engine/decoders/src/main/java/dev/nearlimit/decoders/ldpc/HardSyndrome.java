package dev.nearlimit.decoders.ldpc;

import dev.nearlimit.codes.gf2.SparseBitMatrix;
import java.util.Arrays;

/**
 * The syndromes of 64 frames' hard decisions. Hard decisions are taken only where a check asks for them, and checks are
 * looked at only until every lane in question has failed one: long before convergence this costs next to nothing.
 */
final class HardSyndrome {
    /** Where hard decisions come from. */
    interface HardDecisions {
        /** Decided bits of one position, bit f belonging to frame f. */
        long at(int position);
    }

    private final SparseBitMatrix matrix;
    private final HardDecisions decisions;
    private final long[] bits;
    private final boolean[] known;

    HardSyndrome(SparseBitMatrix matrix, HardDecisions decisions) {
        this.matrix = matrix;
        this.decisions = decisions;
        this.bits = new long[matrix.columns()];
        this.known = new boolean[matrix.columns()];
    }

    /** To be called whenever decisions may have changed. */
    void forget() {
        Arrays.fill(known, false);
    }

    /** Those of the lanes in question that leave a check unsatisfied. */
    long unsatisfied(long inQuestion) {
        long found = 0;
        for (int row = 0; row < matrix.rows() && (found & inQuestion) != inQuestion; row++) {
            long sum = 0;
            for (int i = 0; i < matrix.rowWeight(row); i++) {
                sum ^= bit(matrix.column(row, i));
            }
            found |= sum;
        }
        return found & inQuestion;
    }

    /** Decisions of all positions. */
    void copyDecisions(long[] into) {
        for (int position = 0; position < bits.length; position++) {
            into[position] = bit(position);
        }
    }

    private long bit(int position) {
        if (!known[position]) {
            bits[position] = decisions.at(position);
            known[position] = true;
        }
        return bits[position];
    }
}
