package dev.nearlimit.decoders.ldpc;

import dev.nearlimit.codes.gf2.SparseBitMatrix;
import dev.nearlimit.decoders.OperationCount;

/**
 * What the cost of an iteration depends on.
 *
 * @param rows rows with at least one 1
 * @param edges ones of the matrix
 * @param inner sum over rows of weight d of d - 2, rows of weight 1 counting 0
 */
record EdgeCounts(double rows, double edges, double inner) {
    static EdgeCounts of(SparseBitMatrix matrix) {
        int rows = 0;
        int inner = 0;
        for (int r = 0; r < matrix.rows(); r++) {
            rows += matrix.rowWeight(r) > 0 ? 1 : 0;
            inner += Math.max(0, matrix.rowWeight(r) - 2);
        }
        return new EdgeCounts(rows, matrix.ones(), inner);
    }

    /** Iterations, and the syndromes of early stopping: one before the first iteration and one after each. */
    OperationCount perFrame(OperationCount iteration, double taken, Iterations settings) {
        OperationCount syndrome = new OperationCount(edges - rows, 0, 0);
        return iteration.times(taken).plus(syndrome.times(settings.earlyStop() ? taken + 1 : 0));
    }
}
