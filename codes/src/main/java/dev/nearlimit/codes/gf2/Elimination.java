package dev.nearlimit.codes.gf2;

import java.util.Arrays;

/**
 * Gauss-Jordan elimination over GF(2) with a stated order in which columns are tried as pivots, so that a caller can say
 * where it would like its pivots to lie.
 *
 * <p>Work: rank * rows * wordsPerRow word operations. The input is not changed.
 *
 * @param reduced the rank x columns matrix in reduced form: row i has the only 1 of column {@code pivots[i]}
 * @param pivots pivot column of each row, in the order in which they were found
 */
public record Elimination(BitMatrix reduced, int[] pivots) {

    /** Reduces {@code A}, trying columns from the first to the last. */
    public static Elimination fromFirstColumn(BitMatrix A) {
        int[] order = new int[A.columns()];
        Arrays.setAll(order, c -> c);
        return inOrder(A, order);
    }

    /** Reduces {@code A}, trying columns from the last to the first, so that the first columns stay free. */
    public static Elimination fromLastColumn(BitMatrix A) {
        int n = A.columns();
        int[] order = new int[n];
        Arrays.setAll(order, c -> n - 1 - c);
        return inOrder(A, order);
    }

    /** Reduces {@code A}, trying columns in the order given; columns left out never become pivots. */
    public static Elimination inOrder(BitMatrix A, int[] columnOrder) {
        BitMatrix work = A.copy();
        int[] pivots = new int[Math.min(work.rows(), columnOrder.length)];
        int rank = 0;
        for (int column : columnOrder) {
            if (rank == work.rows()) {
                break;
            }
            int pivotRow = work.firstRowWithOne(rank, column);
            if (pivotRow < 0) {
                continue;
            }
            work.swapRows(rank, pivotRow);
            work.clearColumn(rank, column);
            pivots[rank++] = column;
        }
        return new Elimination(work.selectRows(0, rank), Arrays.copyOf(pivots, rank));
    }

    /** The rank of {@code A}. */
    public static int rank(BitMatrix A) {
        return fromFirstColumn(A).rank();
    }

    public int rank() {
        return pivots.length;
    }

    /** The columns that are not pivots, ascending. */
    public int[] freeColumns() {
        boolean[] isPivot = new boolean[reduced.columns()];
        for (int pivot : pivots) {
            isPivot[pivot] = true;
        }
        int[] free = new int[reduced.columns() - pivots.length];
        int next = 0;
        for (int c = 0; c < isPivot.length; c++) {
            if (!isPivot[c]) {
                free[next++] = c;
            }
        }
        return free;
    }

    /**
     * A basis of the null space of the reduced matrix, one row a free column: row j has a 1 at {@code freeColumns()[j]},
     * zeros at the other free columns, and what the pivots need to make the product zero.
     */
    public BitMatrix nullSpace() {
        int[] free = freeColumns();
        int[] basisRow = new int[reduced.columns()];
        BitMatrix basis = new BitMatrix(free.length, reduced.columns());
        for (int j = 0; j < free.length; j++) {
            basis.set(j, free[j], true);
            basisRow[free[j]] = j;
        }
        for (int i = 0; i < pivots.length; i++) {
            for (int column : reduced.onesOfRow(i)) {
                // The only pivot column in which a reduced row has a 1 is its own.
                if (column != pivots[i]) {
                    basis.set(basisRow[column], pivots[i], true);
                }
            }
        }
        return basis;
    }
}
