package dev.nearlimit.decoders.ldpc;

import dev.nearlimit.codes.batch.FrameBatch;
import dev.nearlimit.codes.gf2.SparseBitMatrix;
import dev.nearlimit.numerics.kernels.CheckRun;
import java.util.Arrays;

/**
 * The rows of a parity-check matrix gathered into runs that may be done together: within a run every row is the row
 * before it moved one column to the right, and no two rows share a column, so that the i-th edges of all its rows lie
 * side by side in position-major arrays and the rows do not see each other's results. Quasi-cyclic matrices have long
 * runs; any other matrix has runs of one row. The order of rows and of edges is that of the matrix.
 *
 * <p>Rows without ones are left out: they are always satisfied.
 *
 * <p>Decoders keep one array of soft values for each edge of a run, its rows side by side, and copy the posteriors that
 * an edge touches to and from such an array: the JIT of Java 17 and 25 makes SIMD of a loop only where it reads and writes
 * every array at the same index, not where each has an offset of its own.
 */
final class RowRuns {
    /** Rows in a run at most: their soft values of one edge then fill 2 KB, so that a run's work stays in the L1 cache. */
    static final int MOST_ROWS = 8;

    private final int count;
    private final int[] rows;
    private final int[] degree;
    private final int[] firstEdge;
    private final int[] column;
    private int largestDegree;

    RowRuns(SparseBitMatrix matrix) {
        int[] rowsOfRun = new int[matrix.rows()];
        int[] degreeOfRun = new int[matrix.rows()];
        int[] firstRow = new int[matrix.rows()];
        int[] seenInRun = new int[matrix.columns()];
        int runs = 0;
        for (int r = 0; r < matrix.rows(); r++) {
            if (matrix.rowWeight(r) == 0) {
                continue;
            }
            boolean extend = runs > 0
                    && firstRow[runs - 1] + rowsOfRun[runs - 1] == r
                    && rowsOfRun[runs - 1] < MOST_ROWS
                    && follows(matrix, r, seenInRun, runs);
            if (!extend) {
                firstRow[runs] = r;
                degreeOfRun[runs] = matrix.rowWeight(r);
                runs++;
            }
            rowsOfRun[runs - 1]++;
            for (int i = 0; i < matrix.rowWeight(r); i++) {
                seenInRun[matrix.column(r, i)] = runs;
            }
            largestDegree = Math.max(largestDegree, matrix.rowWeight(r));
        }
        count = runs;
        rows = rowsOfRun;
        degree = degreeOfRun;
        firstEdge = new int[runs];
        int[] columns = new int[Arrays.stream(degreeOfRun).sum()];
        int edges = 0;
        for (int run = 0; run < runs; run++) {
            firstEdge[run] = edges;
            for (int i = 0; i < degree[run]; i++) {
                columns[edges + i] = matrix.column(firstRow[run], i);
            }
            edges += degree[run];
        }
        column = columns;
    }

    private static boolean follows(SparseBitMatrix matrix, int row, int[] seenInRun, int run) {
        if (matrix.rowWeight(row) != matrix.rowWeight(row - 1)) {
            return false;
        }
        for (int i = 0; i < matrix.rowWeight(row); i++) {
            int wanted = matrix.column(row, i);
            if (wanted != matrix.column(row - 1, i) + 1 || seenInRun[wanted] == run) {
                return false;
            }
        }
        return true;
    }

    int count() {
        return count;
    }

    /** The runs as kernels take them; messages of one run after those of the other, edge by edge. */
    CheckRun[] checkRuns() {
        CheckRun[] result = new CheckRun[count];
        int messages = 0;
        for (int run = 0; run < count; run++) {
            int[] bits = new int[degree[run]];
            for (int i = 0; i < bits.length; i++) {
                bits[i] = column(run, i) * FrameBatch.FRAMES;
            }
            result[run] = new CheckRun(bits, messages, rows[run] * FrameBatch.FRAMES);
            messages += bits.length * result[run].lanes();
        }
        return result;
    }

    /** Rows of a run, 1 .. {@link #MOST_ROWS}. */
    int rows(int run) {
        return rows[run];
    }

    /** Ones of each row of a run. */
    int degree(int run) {
        return degree[run];
    }

    /** Number of a run's first edge, counting the edges of all runs one after the other. */
    int firstEdge(int run) {
        return firstEdge[run];
    }

    /** Edges of all runs. */
    int edges() {
        return column.length;
    }

    /** Column of the i-th one of a run's first row. */
    int column(int run, int i) {
        return column[firstEdge[run] + i];
    }

    int largestDegree() {
        return largestDegree;
    }
}
