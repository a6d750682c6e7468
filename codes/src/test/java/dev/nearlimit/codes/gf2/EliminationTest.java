package dev.nearlimit.codes.gf2;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.stream.Stream;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

class EliminationTest {
    static Stream<RandomMatrix> cases() {
        return RandomMatrix.seeds().mapToObj(RandomMatrix::ofSeed);
    }

    @ParameterizedTest
    @MethodSource("cases")
    void rankAgreesWithTheNaiveOneAndWithTheTranspose(RandomMatrix a) {
        int rank = NaiveGf2.rank(a.entries(), a.columns());
        assertEquals(rank, Elimination.rank(a.packed()), a.toString());
        assertEquals(rank, Elimination.rank(a.packed().transpose()), a.toString());
        assertEquals(rank, Elimination.fromLastColumn(a.packed()).rank(), a.toString());
    }

    @ParameterizedTest
    @MethodSource("cases")
    void reducedRowsSpanTheSameSpaceAndOwnTheirPivots(RandomMatrix a) {
        for (Elimination e :
                new Elimination[] {Elimination.fromFirstColumn(a.packed()), Elimination.fromLastColumn(a.packed())}) {
            BitMatrix reduced = e.reduced();
            assertTrue(reduced.paddingIsClear(), a.toString());
            for (int i = 0; i < e.rank(); i++) {
                for (int r = 0; r < e.rank(); r++) {
                    assertEquals(r == i, reduced.get(r, e.pivots()[i]), a + " pivot " + i + " row " + r);
                }
            }
            BitMatrix both = new BitMatrix(a.rows() + e.rank(), a.columns());
            for (int r = 0; r < both.rows(); r++) {
                for (int c = 0; c < a.columns(); c++) {
                    both.set(r, c, r < a.rows() ? a.entries()[r][c] : reduced.get(r - a.rows(), c));
                }
            }
            assertEquals(
                    e.rank(), NaiveGf2.rank(NaiveGf2.unpacked(both), a.columns()), a + " stacked on its reduced form");
        }
    }

    @ParameterizedTest
    @MethodSource("cases")
    void nullSpaceIsWholeAndUnitAtFreeColumns(RandomMatrix a) {
        Elimination e = Elimination.fromLastColumn(a.packed());
        BitMatrix basis = e.nullSpace();
        assertEquals(a.columns() - e.rank(), basis.rows(), a.toString());
        assertTrue(basis.paddingIsClear(), a.toString());
        boolean[][] turned = NaiveGf2.transpose(NaiveGf2.unpacked(basis), a.columns());
        for (boolean[] row : NaiveGf2.product(a.entries(), turned, basis.rows())) {
            for (boolean entry : row) {
                assertEquals(false, entry, a.toString());
            }
        }
        int[] free = e.freeColumns();
        for (int j = 0; j < free.length; j++) {
            for (int r = 0; r < basis.rows(); r++) {
                assertEquals(r == j, basis.get(r, free[j]), a + " free column " + j);
            }
        }
    }
}
