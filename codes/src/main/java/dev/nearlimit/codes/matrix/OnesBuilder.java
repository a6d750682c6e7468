package dev.nearlimit.codes.matrix;

import dev.nearlimit.codes.gf2.SparseBitMatrix;
import java.util.Arrays;

/** Collects the ones of a matrix in any order; memory grows with what was added, never with what a file announces. */
final class OnesBuilder {
    private final TextLines lines;
    private final int maxOnes;
    private int[] rows = new int[64];
    private int[] columns = new int[64];
    private int count;

    OnesBuilder(TextLines lines, MatrixLimits limits) {
        this.lines = lines;
        this.maxOnes = limits.maxOnes();
    }

    /** Adds a one; positions count from 0 and are not repeated. */
    void add(int row, int column) {
        if (count == maxOnes) {
            throw lines.error(0, "more than " + maxOnes + " ones", "fewer, or a raised limit");
        }
        if (count == rows.length) {
            int length = (int) Math.min(2L * count, maxOnes);
            rows = Arrays.copyOf(rows, length);
            columns = Arrays.copyOf(columns, length);
        }
        rows[count] = row;
        columns[count++] = column;
    }

    SparseBitMatrix build(int rowCount, int columnCount) {
        int[] weights = new int[rowCount];
        for (int i = 0; i < count; i++) {
            weights[rows[i]]++;
        }
        int[][] ones = new int[rowCount][];
        Arrays.setAll(ones, r -> new int[weights[r]]);
        int[] next = new int[rowCount];
        for (int i = 0; i < count; i++) {
            ones[rows[i]][next[rows[i]]++] = columns[i];
        }
        return SparseBitMatrix.ofRows(columnCount, ones);
    }
}
