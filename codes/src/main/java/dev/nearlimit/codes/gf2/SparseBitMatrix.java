package dev.nearlimit.codes.gf2;

import java.util.Arrays;
import java.util.Objects;

/**
 * A sparse matrix over GF(2) as the ascending column numbers of each row's ones. Immutable. Memory grows with the number
 * of ones, so parity-check matrices of long codes stay small.
 */
public final class SparseBitMatrix {
    private final int rows;
    private final int columns;
    private final int[] rowStart;
    private final int[] column;

    private SparseBitMatrix(int rows, int columns, int[] rowStart, int[] column) {
        this.rows = rows;
        this.columns = columns;
        this.rowStart = rowStart;
        this.column = column;
    }

    /**
     * A matrix from the column numbers of each row's ones, in any order.
     *
     * @param columns number of columns
     * @param onesOfRow column numbers of each row; no number twice in a row
     * @throws IllegalArgumentException if a number is out of range or appears twice in a row
     */
    public static SparseBitMatrix ofRows(int columns, int[][] onesOfRow) {
        int[] start = new int[onesOfRow.length + 1];
        for (int r = 0; r < onesOfRow.length; r++) {
            start[r + 1] = Math.addExact(start[r], onesOfRow[r].length);
        }
        int[] all = new int[start[onesOfRow.length]];
        for (int r = 0; r < onesOfRow.length; r++) {
            int[] sorted = onesOfRow[r].clone();
            Arrays.sort(sorted);
            for (int i = 0; i < sorted.length; i++) {
                Objects.checkIndex(sorted[i], columns);
                if (i > 0 && sorted[i] == sorted[i - 1]) {
                    throw new IllegalArgumentException("row " + r + " names column " + sorted[i] + " twice");
                }
            }
            System.arraycopy(sorted, 0, all, start[r], sorted.length);
        }
        return new SparseBitMatrix(onesOfRow.length, columns, start, all);
    }

    public static SparseBitMatrix of(BitMatrix dense) {
        int[][] ones = new int[dense.rows()][];
        Arrays.setAll(ones, dense::onesOfRow);
        return ofRows(dense.columns(), ones);
    }

    public int rows() {
        return rows;
    }

    public int columns() {
        return columns;
    }

    /** Number of ones in the whole matrix: the edges of its Tanner graph. */
    public int ones() {
        return column.length;
    }

    public int rowWeight(int row) {
        Objects.checkIndex(row, rows);
        return rowStart[row + 1] - rowStart[row];
    }

    /** The column of the i-th one of a row, in ascending order. */
    public int column(int row, int i) {
        Objects.checkIndex(i, rowWeight(row));
        return column[rowStart[row] + i];
    }

    /** A copy of the ascending column numbers of a row's ones. */
    public int[] row(int row) {
        Objects.checkIndex(row, rows);
        return Arrays.copyOfRange(column, rowStart[row], rowStart[row + 1]);
    }

    public int maxRowWeight() {
        int max = 0;
        for (int r = 0; r < rows; r++) {
            max = Math.max(max, rowWeight(r));
        }
        return max;
    }

    public boolean get(int row, int columnWanted) {
        Objects.checkIndex(row, rows);
        Objects.checkIndex(columnWanted, columns);
        return Arrays.binarySearch(column, rowStart[row], rowStart[row + 1], columnWanted) >= 0;
    }

    public SparseBitMatrix transpose() {
        int[] start = new int[columns + 1];
        for (int c : column) {
            start[c + 1]++;
        }
        for (int c = 0; c < columns; c++) {
            start[c + 1] += start[c];
        }
        int[] next = Arrays.copyOf(start, columns);
        int[] turned = new int[column.length];
        for (int r = 0; r < rows; r++) {
            for (int e = rowStart[r]; e < rowStart[r + 1]; e++) {
                turned[next[column[e]]++] = r;
            }
        }
        return new SparseBitMatrix(columns, rows, start, turned);
    }

    public BitMatrix toDense() {
        BitMatrix dense = new BitMatrix(rows, columns);
        for (int r = 0; r < rows; r++) {
            for (int e = rowStart[r]; e < rowStart[r + 1]; e++) {
                dense.set(r, column[e], true);
            }
        }
        return dense;
    }

    /**
     * Syndromes of 64 words at once: word r of the result is the XOR of the words at row r's ones.
     *
     * @param bits one word a column, bit f belonging to frame f
     * @param syndrome receives one word a row
     */
    public void multiplyBatch(long[] bits, long[] syndrome) {
        if (bits.length < columns || syndrome.length < rows) {
            throw new IllegalArgumentException("matrix is " + rows + "x" + columns + ", bits has " + bits.length
                    + " words, syndrome " + syndrome.length);
        }
        for (int r = 0; r < rows; r++) {
            long sum = 0;
            for (int e = rowStart[r]; e < rowStart[r + 1]; e++) {
                sum ^= bits[column[e]];
            }
            syndrome[r] = sum;
        }
    }

    /** Lanes in which at least one row's sum is 1: the frames that are no codewords. */
    public long unsatisfiedLanes(long[] bits) {
        if (bits.length < columns) {
            throw new IllegalArgumentException("matrix has " + columns + " columns, bits has " + bits.length);
        }
        long unsatisfied = 0;
        for (int r = 0; r < rows && unsatisfied != -1L; r++) {
            long sum = 0;
            for (int e = rowStart[r]; e < rowStart[r + 1]; e++) {
                sum ^= bits[column[e]];
            }
            unsatisfied |= sum;
        }
        return unsatisfied;
    }

    @Override
    public boolean equals(Object other) {
        return other instanceof SparseBitMatrix that
                && columns == that.columns
                && Arrays.equals(rowStart, that.rowStart)
                && Arrays.equals(column, that.column);
    }

    @Override
    public int hashCode() {
        return 31 * Arrays.hashCode(rowStart) + Arrays.hashCode(column);
    }

    @Override
    public String toString() {
        return rows + "x" + columns + " matrix over GF(2) with " + ones() + " ones";
    }
}
