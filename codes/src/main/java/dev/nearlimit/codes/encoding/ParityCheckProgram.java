package dev.nearlimit.codes.encoding;

import dev.nearlimit.codes.gf2.SparseBitMatrix;
import java.util.Arrays;
import java.util.Optional;

/**
 * Encoding with a sparse parity-check matrix, whatever structure it has: the parity part is brought to
 * {@linkplain ApproximateTriangle approximate lower triangular form}, the few gap positions are solved from
 * {@linkplain GapEquations their own equations}, and every other parity position follows from one row by
 * back-substitution. Lower triangular, staircase (accumulator) and dual-diagonal parity parts are special cases with a gap
 * of 0, 0 and 1 positions, and are encoded with about one word read for each 1 of the matrix.
 *
 * <p>Gap positions are found in one of two ways, whichever reads fewer words:
 *
 * <ul>
 *   <li>by sums: the information of the rows that the gap equations name is summed first and kept where the parity will
 *       stand; nothing is computed twice. Best where few rows are named.
 *   <li>in two passes, as in Richardson and Urbanke: back-substitution with the gap positions taken as 0 gives the
 *       equations' right-hand sides; a second pass corrects what depends on the gap. The work stays proportional to the
 *       ones of the matrix, plus some g^2 / 2 where the gap's equations are dense.
 * </ul>
 */
public final class ParityCheckProgram {
    private final SparseBitMatrix H;
    private final boolean[] isInformation;
    private final ApproximateTriangle triangle;
    private final GapEquations equations;
    private final int[] rank;

    ParityCheckProgram(SparseBitMatrix H, boolean[] isInformation, ApproximateTriangle triangle) {
        this.H = H;
        this.isInformation = isInformation;
        this.triangle = triangle;
        this.equations = GapEquations.of(H, isInformation, triangle);
        this.rank = ranks(H.columns(), triangle);
    }

    /**
     * The program that completes a codeword whose information words are in place, if one is found that reads fewer words
     * than {@code wordOperations}.
     *
     * @param wordOperations words read by the program at hand, which this one has to beat
     * @param H m x n; dependent rows are left out
     * @param informationPositions the columns of {@code H} that are not named here are independent and of the same rank
     * @throws IllegalArgumentException if the other columns of {@code H} are dependent
     */
    public static Optional<WordProgram> cheaperThan(
            long wordOperations, SparseBitMatrix H, int[] informationPositions) {
        long spare = wordOperations - leastWordOperations(H, H.columns() - informationPositions.length);
        if (spare <= 0) {
            return Optional.empty();
        }
        boolean[] isInformation = InformationSet.mask(H.columns(), informationPositions);
        // A larger gap is given up: half of its g^2 coefficients, if dense, would already read more than is to spare.
        int maxGap = (int) Math.ceil(Math.sqrt(2.0 * spare));
        return ApproximateTriangle.of(H, isInformation, maxGap)
                .map(triangle -> new ParityCheckProgram(H, isInformation, triangle).cheapest())
                .filter(program -> program.wordOperations() < wordOperations);
    }

    /**
     * About the least that any program of this kind reads: the other ones of as many rows as there are parity positions,
     * the lightest.
     */
    private static long leastWordOperations(SparseBitMatrix H, int parity) {
        int[] weights = new int[H.rows()];
        Arrays.setAll(weights, H::rowWeight);
        Arrays.sort(weights);
        long least = -parity;
        for (int i = 0; i < Math.min(parity, weights.length); i++) {
            least += weights[i];
        }
        return least;
    }

    /** Information and gap positions first, then peeled ones as they become known. */
    private static int[] ranks(int n, ApproximateTriangle triangle) {
        int[] rank = new int[n];
        for (int i = 0; i < triangle.peeled().length; i++) {
            rank[triangle.peeled()[i]] = i + 1;
        }
        return rank;
    }

    private WordProgram cheapest() {
        WordProgram twoPasses = twoPasses();
        // The sums can be as many as gap times parity positions; they are written out only where they can be the fewer.
        if (equations.additions() > H.ones()) {
            return twoPasses;
        }
        WordProgram bySums = bySums();
        return bySums.wordOperations() <= twoPasses.wordOperations() ? bySums : twoPasses;
    }

    WordProgram bySums() {
        boolean[] summed = new boolean[H.columns()];
        for (int[] peels : equations.addedPeels()) {
            for (int position : peels) {
                summed[position] = true;
            }
        }
        WordProgram.Builder program = new WordProgram.Builder();
        int[] peeled = triangle.peeled();
        for (int i = 0; i < peeled.length; i++) {
            if (summed[peeled[i]]) {
                program.set(peeled[i]).add(information(triangle.rowOf()[i]));
            }
        }
        for (int j = 0; j < triangle.gap().length; j++) {
            program.set(triangle.gap()[j])
                    .add(information(equations.checkRow()[j]))
                    .add(equations.addedPeels()[j])
                    .add(gapWords(equations.lower()[j]));
        }
        substituteBack(program);
        for (int i = 0; i < peeled.length; i++) {
            int position = peeled[i];
            int row = triangle.rowOf()[i];
            program.set(position);
            program.add(summed[position] ? new int[] {position} : information(row));
            program.add(parity(row, position, true));
        }
        return program.build();
    }

    WordProgram twoPasses() {
        boolean[] needed = neededByChecks();
        boolean[] corrected = dependentOnGap();
        WordProgram.Builder program = new WordProgram.Builder();
        int[] peeled = triangle.peeled();
        for (int i = 0; i < peeled.length; i++) {
            if (needed[peeled[i]]) {
                int row = triangle.rowOf()[i];
                program.set(peeled[i]).add(information(row)).add(parity(row, peeled[i], false));
            }
        }
        for (int j = 0; j < triangle.gap().length; j++) {
            int row = equations.checkRow()[j];
            program.set(triangle.gap()[j])
                    .add(information(row))
                    .add(parity(row, -1, false))
                    .add(gapWords(equations.lower()[j]));
        }
        substituteBack(program);
        for (int i = 0; i < peeled.length; i++) {
            if (corrected[peeled[i]] || !needed[peeled[i]]) {
                int row = triangle.rowOf()[i];
                program.set(peeled[i]).add(information(row)).add(parity(row, peeled[i], true));
            }
        }
        return program.build();
    }

    /** Peeled positions that the paired check rows contain, directly or through other peeled positions. */
    private boolean[] neededByChecks() {
        boolean[] needed = new boolean[H.columns()];
        for (int row : equations.checkRow()) {
            mark(row, needed);
        }
        for (int i = triangle.peeled().length - 1; i >= 0; i--) {
            if (needed[triangle.peeled()[i]]) {
                mark(triangle.rowOf()[i], needed);
            }
        }
        return needed;
    }

    private void mark(int row, boolean[] positions) {
        for (int i = 0; i < H.rowWeight(row); i++) {
            positions[H.column(row, i)] = true;
        }
    }

    /** Positions that are gap positions or follow from one. */
    private boolean[] dependentOnGap() {
        boolean[] dependent = new boolean[H.columns()];
        for (int position : triangle.gap()) {
            dependent[position] = true;
        }
        for (int i = 0; i < triangle.peeled().length; i++) {
            int row = triangle.rowOf()[i];
            for (int e = 0; e < H.rowWeight(row); e++) {
                dependent[triangle.peeled()[i]] |= dependent[H.column(row, e)];
            }
        }
        return dependent;
    }

    private void substituteBack(WordProgram.Builder program) {
        for (int j = triangle.gap().length - 1; j >= 0; j--) {
            if (equations.upper()[j].length > 0) {
                program.set(triangle.gap()[j])
                        .add(triangle.gap()[j])
                        .add(gapWords(equations.upper()[j]));
            }
        }
    }

    private int[] gapWords(int[] indices) {
        return Arrays.stream(indices).map(j -> triangle.gap()[j]).toArray();
    }

    private int[] information(int row) {
        return Arrays.stream(H.row(row))
                .filter(position -> isInformation[position])
                .toArray();
    }

    /**
     * Parity positions of a row but one, with or without those of the gap. What was computed last comes last, so that a
     * processor has summed the rest by the time it is there.
     */
    private int[] parity(int row, int except, boolean withGap) {
        return Arrays.stream(H.row(row))
                .filter(position -> !isInformation[position] && position != except)
                .filter(position -> withGap || rank[position] > 0)
                .boxed()
                .sorted((a, b) -> Integer.compare(rank[a], rank[b]))
                .mapToInt(position -> position)
                .toArray();
    }
}
