package dev.nearlimit.codes.gf2;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import java.util.Random;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

class SparseBitMatrixTest {
    static Stream<RandomMatrix> cases() {
        return RandomMatrix.seeds().mapToObj(RandomMatrix::ofSeed);
    }

    @ParameterizedTest
    @MethodSource("cases")
    void entriesSurviveSparseAndTransposedForm(RandomMatrix a) {
        SparseBitMatrix sparse = SparseBitMatrix.of(a.packed());
        assertEquals(a.packed(), sparse.toDense(), a.toString());
        assertEquals(a.packed().transpose(), sparse.transpose().toDense(), a.toString());
        int ones = 0;
        for (int r = 0; r < a.rows(); r++) {
            for (int c = 0; c < a.columns(); c++) {
                assertEquals(a.entries()[r][c], sparse.get(r, c), a + " at " + r + "," + c);
                ones += a.entries()[r][c] ? 1 : 0;
            }
        }
        assertEquals(ones, sparse.ones(), a.toString());
    }

    @ParameterizedTest
    @MethodSource("cases")
    void batchSyndromesAreNaiveProductsLaneByLane(RandomMatrix a) {
        boolean[][] words = NaiveGf2.random(a.columns(), 64, 0.5, new Random(a.seed()));
        long[] bits = new long[a.columns()];
        for (int c = 0; c < a.columns(); c++) {
            for (int frame = 0; frame < 64; frame++) {
                bits[c] |= words[c][frame] ? 1L << frame : 0;
            }
        }
        SparseBitMatrix sparse = SparseBitMatrix.of(a.packed());
        long[] syndrome = new long[a.rows()];
        sparse.multiplyBatch(bits, syndrome);
        boolean[][] expected = NaiveGf2.product(a.entries(), words, 64);
        long unsatisfied = 0;
        for (int r = 0; r < a.rows(); r++) {
            for (int frame = 0; frame < 64; frame++) {
                assertEquals(expected[r][frame], (syndrome[r] >>> frame & 1) != 0, a + " row " + r + " frame " + frame);
            }
            unsatisfied |= syndrome[r];
        }
        assertEquals(unsatisfied, sparse.unsatisfiedLanes(bits), a.toString());
    }

    @Test
    void rowsMayComeInAnyOrderButNotTwiceOrOutOfRange() {
        assertArrayEquals(
                new int[] {1, 3, 4},
                SparseBitMatrix.ofRows(5, new int[][] {{4, 1, 3}}).row(0));
        assertThrows(IllegalArgumentException.class, () -> SparseBitMatrix.ofRows(5, new int[][] {{1, 1}}));
        assertThrows(IndexOutOfBoundsException.class, () -> SparseBitMatrix.ofRows(5, new int[][] {{5}}));
    }
}
