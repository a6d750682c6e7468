package dev.nearlimit.codes;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import dev.nearlimit.codes.gf2.BitMatrix;
import dev.nearlimit.codes.gf2.Elimination;
import dev.nearlimit.codes.gf2.SparseBitMatrix;
import dev.nearlimit.codes.structure.BchStructure;
import dev.nearlimit.codes.structure.QuasiCyclicStructure;
import java.util.Random;
import java.util.stream.LongStream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

class CodeTest {
    static LongStream seeds() {
        return LongStream.range(1, 41);
    }

    private static BitMatrix random(int rows, int columns, Random random) {
        BitMatrix matrix = new BitMatrix(rows, columns);
        for (int r = 0; r < rows; r++) {
            for (int c = 0; c < columns; c++) {
                matrix.set(r, c, random.nextBoolean());
            }
        }
        return matrix;
    }

    @ParameterizedTest
    @MethodSource("seeds")
    void randomChecksGiveASoundCodeWithKFromTheRank(long seed) {
        Random random = new Random(seed);
        int n = 2 + random.nextInt(80);
        BitMatrix check = random(1 + random.nextInt(n), n, random);
        int rank = Elimination.rank(check);
        SparseBitMatrix sparse = SparseBitMatrix.of(check);
        if (rank == n) {
            assertThrows(InvalidCodeException.class, () -> Code.ofParityCheck("seed " + seed, "test", sparse));
            return;
        }
        Code code = Code.ofParityCheck("seed " + seed, "test", sparse);
        CodeChecks.assertSound(code, n, n - rank);
        assertEquals(check.rows() - rank, code.redundantChecks());
        assertEquals(check, code.parityCheck().toDense());
    }

    @ParameterizedTest
    @MethodSource("seeds")
    void randomGeneratorsSpanTheSameCodeInSystematicForm(long seed) {
        Random random = new Random(seed);
        int n = 2 + random.nextInt(80);
        int k = 1 + random.nextInt(Math.min(n, 12));
        BitMatrix generator = random(k, n, random);
        if (Elimination.rank(generator) < k) {
            assertThrows(InvalidCodeException.class, () -> Code.ofGenerator("seed " + seed, "test", generator));
            return;
        }
        Code code = Code.ofGenerator("seed " + seed, "test", generator);
        CodeChecks.assertSound(code, n, k);
        assertTrue(
                code.parityCheck().toDense().multiply(generator.transpose()).isZero(),
                "seed " + seed + ": rows of the given matrix are no longer words");
    }

    @Test
    void aSystematicGeneratorIsUsedAsItStands() {
        BitMatrix parityFirst = BitMatrix.ofRows("110001", "011010", "101100");
        Code code = Code.ofGenerator("parity first", "test", parityFirst);
        assertEquals(parityFirst, code.generator());
        assertArrayEquals(new int[] {5, 4, 3}, code.informationPositions());
    }

    @Test
    void emptyMatricesAreRefused() {
        assertEquals(
                "the generator matrix of none is empty",
                assertThrows(InvalidCodeException.class, () -> Code.ofGenerator("none", "test", new BitMatrix(0, 5)))
                        .getMessage());
        assertEquals(
                "the parity-check matrix of none is empty",
                assertThrows(
                                InvalidCodeException.class,
                                () -> Code.ofParityCheck("none", "test", SparseBitMatrix.ofRows(0, new int[][] {{}})))
                        .getMessage());
    }

    @Test
    void anotherParityCheckMatrixMustDefineTheSameWords() {
        Code code = Code.ofGenerator("repetition", "test", BitMatrix.ofRows("111"));
        SparseBitMatrix cycle = SparseBitMatrix.of(BitMatrix.ofRows("110", "011", "101"));
        assertEquals(cycle, code.withParityCheck(cycle).parityCheck());
        assertEquals(1, code.withParityCheck(cycle).redundantChecks());
        SparseBitMatrix tooFew = SparseBitMatrix.of(BitMatrix.ofRows("110"));
        assertThrows(IllegalArgumentException.class, () -> code.withParityCheck(tooFew));
        SparseBitMatrix others = SparseBitMatrix.of(BitMatrix.ofRows("110", "001"));
        assertThrows(IllegalArgumentException.class, () -> code.withParityCheck(others));
    }

    @Test
    void structuresAreFoundByKindAndCodesStayUnchanged() {
        Code plain = Code.ofGenerator("repetition", "test", BitMatrix.ofRows("1111111"));
        BchStructure bch = new BchStructure(3, 0xB, 3, false, 0);
        Code structured = plain.withStructure(bch).withKnownDistance(7, "test");
        assertEquals(bch, structured.structure(BchStructure.class).orElseThrow());
        assertTrue(structured.structure(QuasiCyclicStructure.class).isEmpty());
        assertTrue(plain.structure(BchStructure.class).isEmpty());
        assertTrue(plain.knownDistance().isEmpty());
        assertEquals("1/7", structured.rate().toString());
    }

    @Test
    void circulantsAreShiftedRight() {
        QuasiCyclicStructure structure = new QuasiCyclicStructure(3, new int[][] {{0, 1, -1}});
        assertEquals(
                BitMatrix.ofRows("100010000", "010001000", "001100000"),
                structure.parityCheck().toDense());
        assertThrows(IllegalArgumentException.class, () -> new QuasiCyclicStructure(3, new int[][] {{3}}));
        assertThrows(IllegalArgumentException.class, () -> new QuasiCyclicStructure(3, new int[][] {{0}, {0, 1}}));
    }
}
