package dev.nearlimit.codes.encoding;

import dev.nearlimit.codes.gf2.SparseBitMatrix;
import java.util.ArrayDeque;
import java.util.Arrays;
import java.util.Deque;
import java.util.Optional;

/**
 * A parity-check matrix brought to approximate lower triangular form by permutations alone (T. J. Richardson and
 * R. L. Urbanke, "Efficient encoding of low-density parity-check codes", IEEE Trans. Inf. Theory 47, 2001, sec. III):
 * rows are peeled as long as one has a single unknown parity position, which that row then determines; when none has,
 * one position is declared a gap position, known from somewhere else, and peeling goes on.
 *
 * <p>Where the paper lets chance choose the gap position among those of a row with the fewest unknowns, this takes the one
 * that most rows contain, because that one sets most rows free. Triangular and staircase (accumulator) parts have no gap;
 * the dual-diagonal part of IEEE 802.11 codes, closed into a ring by one block column of weight three, has a gap of one
 * position, not of a whole block.
 *
 * @param peeled parity positions that a row determines, in an order in which each row has only earlier ones before it
 * @param rowOf for each of them, in the same order, the row that determines it
 * @param gap parity positions that no row determines by itself, in the order in which they were declared
 * @param checkRows rows that determine nothing, ascending; at least as many as gap positions, the surplus being dependent
 */
record ApproximateTriangle(int[] peeled, int[] rowOf, int[] gap, int[] checkRows) {

    /**
     * Peels a matrix.
     *
     * @param H m x n
     * @param isInformation n flags; the other columns of {@code H} are independent
     * @param maxGap gap positions at which to give up
     * @return nothing if the gap would be larger than {@code maxGap}
     */
    static Optional<ApproximateTriangle> of(SparseBitMatrix H, boolean[] isInformation, int maxGap) {
        return new Peeling(H, isInformation).run(maxGap);
    }

    private static final class Peeling {
        private final SparseBitMatrix H;
        private final SparseBitMatrix columns;
        private final boolean[] known;
        private final int[] unknownsOfRow;
        private final boolean[] determines;
        private final Deque<Integer> ready = new ArrayDeque<>();
        private final int[] peeled;
        private final int[] rowOf;
        private final int[] gap;
        private int peeledCount;
        private int gapCount;

        Peeling(SparseBitMatrix H, boolean[] isInformation) {
            this.H = H;
            this.columns = H.transpose();
            this.known = isInformation.clone();
            this.unknownsOfRow = new int[H.rows()];
            this.determines = new boolean[H.rows()];
            int parity = 0;
            for (int position = 0; position < known.length; position++) {
                if (!known[position]) {
                    parity++;
                    for (int i = 0; i < columns.rowWeight(position); i++) {
                        unknownsOfRow[columns.column(position, i)]++;
                    }
                }
            }
            this.peeled = new int[parity];
            this.rowOf = new int[parity];
            this.gap = new int[parity];
        }

        Optional<ApproximateTriangle> run(int maxGap) {
            for (int row = 0; row < H.rows(); row++) {
                if (unknownsOfRow[row] == 1) {
                    ready.add(row);
                }
            }
            peel();
            while (peeledCount + gapCount < peeled.length) {
                if (gapCount == maxGap) {
                    return Optional.empty();
                }
                int position = nextGap();
                gap[gapCount++] = position;
                learn(position);
                peel();
            }
            return Optional.of(new ApproximateTriangle(
                    Arrays.copyOf(peeled, peeledCount),
                    Arrays.copyOf(rowOf, peeledCount),
                    Arrays.copyOf(gap, gapCount),
                    checkRows()));
        }

        private void peel() {
            for (Integer row = ready.poll(); row != null; row = ready.poll()) {
                // A row that waits here may have lost its last unknown to another row meanwhile.
                if (unknownsOfRow[row] == 1) {
                    int position = firstUnknown(row);
                    determines[row] = true;
                    peeled[peeledCount] = position;
                    rowOf[peeledCount++] = row;
                    learn(position);
                }
            }
        }

        private void learn(int position) {
            known[position] = true;
            for (int i = 0; i < columns.rowWeight(position); i++) {
                int row = columns.column(position, i);
                if (--unknownsOfRow[row] == 1) {
                    ready.add(row);
                }
            }
        }

        private int firstUnknown(int row) {
            int i = 0;
            while (known[H.column(row, i)]) {
                i++;
            }
            return H.column(row, i);
        }

        /** Of the rows with the fewest unknowns, the unknown that most rows contain; the first of several. */
        private int nextGap() {
            int fewest = Arrays.stream(unknownsOfRow)
                    .filter(unknowns -> unknowns > 0)
                    .min()
                    .orElseThrow(() -> new IllegalArgumentException("a parity position stands in no row"));
            int best = -1;
            for (int row = 0; row < H.rows(); row++) {
                if (unknownsOfRow[row] == fewest) {
                    for (int i = 0; i < H.rowWeight(row); i++) {
                        int position = H.column(row, i);
                        if (!known[position] && (best < 0 || columns.rowWeight(position) > columns.rowWeight(best))) {
                            best = position;
                        }
                    }
                }
            }
            return best;
        }

        private int[] checkRows() {
            int[] rows = new int[H.rows() - peeledCount];
            int next = 0;
            for (int row = 0; row < H.rows(); row++) {
                if (!determines[row]) {
                    rows[next++] = row;
                }
            }
            return rows;
        }
    }
}
