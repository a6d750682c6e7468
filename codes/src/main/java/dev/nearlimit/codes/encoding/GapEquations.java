package dev.nearlimit.codes.encoding;

import dev.nearlimit.codes.gf2.BitMatrix;
import dev.nearlimit.codes.gf2.Elimination;
import dev.nearlimit.codes.gf2.SparseBitMatrix;
import java.util.Arrays;
import java.util.Comparator;

/**
 * The equations that fix the g gap positions of an {@link ApproximateTriangle}. Adding to a check row the rows that
 * determine its peeled positions, and those that these bring in, leaves gap positions alone on the parity side:
 * {@code M x = s}, where s is the sum of the information of all rows added. M is factored as L U with rows in the order
 * that this needs, so that the g words are solved where they stand, by forward and back substitution; where M or its
 * factors are sparse, as in quasi-cyclic codes, so are these.
 *
 * <p>Of dependent check rows those are used to which the fewest rows have to be added.
 *
 * @param checkRow for each gap position the check row that is paired with it
 * @param addedPeels for each gap position the peeled positions whose rows are added to its check row, in peeling order
 * @param lower ones of each row of L left of the diagonal
 * @param upper ones of each row of U right of the diagonal
 */
record GapEquations(int[] checkRow, int[][] addedPeels, int[][] lower, int[][] upper) {

    /** Derives the equations; work is at most (ones of H) * (check rows) / 64 word operations, plus g^3 / 64. */
    static GapEquations of(SparseBitMatrix H, boolean[] isInformation, ApproximateTriangle triangle) {
        BitMatrix residue = residues(H, isInformation, triangle);
        int[] order = byAddedRows(residue, triangle);
        BitMatrix M = independentRows(residue, order, triangle.gap());
        BitMatrix L = factor(M, order);
        int g = triangle.gap().length;
        int[][] addedPeels = new int[g][];
        int[][] lower = new int[g][];
        int[][] upper = new int[g][];
        for (int i = 0; i < g; i++) {
            int check = order[i];
            int row = i;
            addedPeels[i] = Arrays.stream(triangle.peeled())
                    .filter(position -> residue.get(position, check))
                    .toArray();
            lower[i] = L.onesOfRow(i);
            upper[i] = Arrays.stream(M.onesOfRow(i)).filter(j -> j > row).toArray();
        }
        int[] checkRow = Arrays.stream(order, 0, g)
                .map(check -> triangle.checkRows()[check])
                .toArray();
        return new GapEquations(checkRow, addedPeels, lower, upper);
    }

    /**
     * What remains of every check row: entry (position, check) says for a peeled position whether its row is added to the
     * check row, and for a gap position whether it is in the sum. All check rows are treated at once, 64 a word.
     */
    private static BitMatrix residues(SparseBitMatrix H, boolean[] isInformation, ApproximateTriangle triangle) {
        int[] checkRows = triangle.checkRows();
        BitMatrix residue = new BitMatrix(H.columns(), checkRows.length);
        for (int check = 0; check < checkRows.length; check++) {
            for (int position : H.row(checkRows[check])) {
                if (!isInformation[position]) {
                    residue.set(position, check, true);
                }
            }
        }
        for (int i = triangle.peeled().length - 1; i >= 0; i--) {
            int row = triangle.rowOf()[i];
            for (int e = 0; e < H.rowWeight(row); e++) {
                int position = H.column(row, e);
                if (!isInformation[position] && position != triangle.peeled()[i]) {
                    residue.addRow(triangle.peeled()[i], position);
                }
            }
        }
        return residue;
    }

    /** Numbers of the check rows, those first to which fewer rows are added. */
    private static int[] byAddedRows(BitMatrix residue, ApproximateTriangle triangle) {
        int[] added = new int[triangle.checkRows().length];
        for (int position : triangle.peeled()) {
            for (int check : residue.onesOfRow(position)) {
                added[check]++;
            }
        }
        Integer[] order = new Integer[added.length];
        Arrays.setAll(order, check -> check);
        Arrays.sort(order, Comparator.comparingInt(check -> added[check]));
        return Arrays.stream(order).mapToInt(check -> check).toArray();
    }

    /**
     * The g x g matrix of the first independent check rows in the order given; the first g entries of {@code order} become
     * their numbers.
     */
    private static BitMatrix independentRows(BitMatrix residue, int[] order, int[] gap) {
        BitMatrix turned = new BitMatrix(gap.length, order.length);
        for (int j = 0; j < gap.length; j++) {
            for (int i = 0; i < order.length; i++) {
                turned.set(j, i, residue.get(gap[j], order[i]));
            }
        }
        int[] chosen = Elimination.fromFirstColumn(turned).pivots();
        if (chosen.length != gap.length) {
            throw new IllegalArgumentException("the matrix leaves " + (gap.length - chosen.length)
                    + " parity positions open: its columns there are dependent");
        }
        // Ascending, so that no entry is overwritten before it is read.
        for (int i = 0; i < chosen.length; i++) {
            order[i] = order[chosen[i]];
        }
        return turned.selectColumns(chosen).transpose();
    }

    /** Turns M into U, returns L without its diagonal, and brings {@code order} to the order of their rows. */
    private static BitMatrix factor(BitMatrix M, int[] order) {
        int g = M.rows();
        BitMatrix L = new BitMatrix(g, g);
        for (int j = 0; j < g; j++) {
            int pivot = lightestPivot(M, j);
            M.swapRows(j, pivot);
            L.swapRows(j, pivot);
            int kept = order[j];
            order[j] = order[pivot];
            order[pivot] = kept;
            for (int i = j + 1; i < g; i++) {
                if (M.get(i, j)) {
                    M.addRow(j, i);
                    L.set(i, j, true);
                }
            }
        }
        return L;
    }

    private static int lightestPivot(BitMatrix M, int column) {
        int best = -1;
        for (int i = column; i < M.rows(); i++) {
            if (M.get(i, column) && (best < 0 || M.rowWeight(i) < M.rowWeight(best))) {
                best = i;
            }
        }
        return best;
    }

    /** Rows added to check rows, counted for each. */
    long additions() {
        return Arrays.stream(addedPeels).mapToLong(peels -> peels.length).sum();
    }
}
