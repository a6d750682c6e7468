package dev.nearlimit.codes.gf2;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Random;
import java.util.stream.IntStream;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

class BitMatrixTest {
    static Stream<RandomMatrix> cases() {
        return RandomMatrix.seeds().mapToObj(RandomMatrix::ofSeed);
    }

    @ParameterizedTest
    @MethodSource("cases")
    void productAgreesWithTheNaiveOne(RandomMatrix a) {
        int columns = 1 + (int) (a.seed() % 130);
        boolean[][] right = a.partner(a.columns(), columns);
        BitMatrix product = a.packed().multiply(NaiveGf2.packed(right, columns));
        assertArrayEquals(NaiveGf2.product(a.entries(), right, columns), NaiveGf2.unpacked(product), a.toString());
        assertTrue(product.paddingIsClear(), a.toString());
    }

    @ParameterizedTest
    @MethodSource("cases")
    void transposeAgreesWithTheNaiveOne(RandomMatrix a) {
        BitMatrix turned = a.packed().transpose();
        assertArrayEquals(NaiveGf2.transpose(a.entries(), a.columns()), NaiveGf2.unpacked(turned), a.toString());
        assertTrue(turned.paddingIsClear(), a.toString());
        assertEquals(a.packed(), turned.transpose(), a.toString());
    }

    @ParameterizedTest
    @MethodSource("cases")
    void rowOperationsAgreeWithTheNaiveOnesAndKeepPaddingClear(RandomMatrix a) {
        if (a.rows() < 2 || a.columns() == 0) {
            return;
        }
        Random random = new Random(a.seed());
        boolean[][] naive = NaiveGf2.unpacked(a.packed());
        BitMatrix packed = a.packed();
        for (int step = 0; step < 50; step++) {
            int one = random.nextInt(a.rows());
            int other = (one + 1 + random.nextInt(a.rows() - 1)) % a.rows();
            int column = random.nextInt(a.columns());
            switch (step % 3) {
                case 0 -> {
                    packed.addRow(one, other);
                    for (int c = 0; c < a.columns(); c++) {
                        naive[other][c] ^= naive[one][c];
                    }
                }
                case 1 -> {
                    packed.swapRows(one, other);
                    boolean[] kept = naive[one];
                    naive[one] = naive[other];
                    naive[other] = kept;
                }
                default -> {
                    packed.flip(one, column);
                    naive[one][column] = !naive[one][column];
                }
            }
        }
        assertArrayEquals(naive, NaiveGf2.unpacked(packed), a.toString());
        assertTrue(packed.paddingIsClear(), a.toString());
    }

    @ParameterizedTest
    @MethodSource("cases")
    void rowsAndTheirOnesAgreeWithTheEntries(RandomMatrix a) {
        BitMatrix packed = a.packed();
        for (int r = 0; r < a.rows(); r++) {
            boolean[] row = a.entries()[r];
            int[] ones = IntStream.range(0, a.columns()).filter(c -> row[c]).toArray();
            assertArrayEquals(ones, packed.onesOfRow(r), a + " row " + r);
            assertEquals(ones.length, packed.rowWeight(r), a + " row " + r);
            assertEquals(ones.length == 0, packed.isZeroRow(r), a + " row " + r);
        }
    }

    @ParameterizedTest
    @MethodSource("cases")
    void selectionsKeepOrderAndPadding(RandomMatrix a) {
        BitMatrix packed = a.packed();
        int[] backwards =
                IntStream.range(0, a.columns()).map(c -> a.columns() - 1 - c).toArray();
        BitMatrix turned = packed.selectColumns(backwards);
        assertEquals(packed, turned.selectColumns(backwards), a.toString());
        assertTrue(turned.paddingIsClear(), a.toString());
        BitMatrix half = packed.selectRows(a.rows() / 2, a.rows());
        for (int r = 0; r < half.rows(); r++) {
            assertArrayEquals(packed.row(a.rows() / 2 + r), half.row(r), a.toString());
        }
    }

    @Test
    void literalsAreReadAndShown() {
        BitMatrix matrix = BitMatrix.ofRows("101", "010");
        assertTrue(matrix.get(0, 2));
        assertFalse(matrix.get(1, 0));
        assertEquals("101\n010\n", matrix.toString());
        assertThrows(IllegalArgumentException.class, () -> BitMatrix.ofRows("10", "101"));
        assertThrows(IllegalArgumentException.class, () -> BitMatrix.ofRows("12"));
    }

    @Test
    void columnsBeyondTheShapeAreRefused() {
        BitMatrix matrix = new BitMatrix(2, 5);
        assertThrows(IndexOutOfBoundsException.class, () -> matrix.set(0, 5, true));
        assertThrows(IndexOutOfBoundsException.class, () -> matrix.get(2, 0));
        assertThrows(IllegalArgumentException.class, () -> matrix.multiply(matrix));
    }
}
