package dev.nearlimit.codes.encoding;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import dev.nearlimit.codes.Code;
import dev.nearlimit.codes.catalogue.Catalogue;
import dev.nearlimit.codes.gf2.BitMatrix;
import dev.nearlimit.codes.gf2.Elimination;
import dev.nearlimit.codes.gf2.SparseBitMatrix;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import java.util.Random;
import java.util.TreeSet;
import java.util.stream.IntStream;
import java.util.stream.LongStream;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.MethodSource;
import org.junit.jupiter.params.provider.ValueSource;

/** Programs made from parity-check matrices against the generator's, which is slower and has nothing to find. */
class ParityCheckProgramTest {
    private static Code code(SparseBitMatrix H) {
        return Code.ofParityCheck("test", "test", H);
    }

    private static WordProgram generatorProgram(Code code) {
        return GeneratorProgram.of(code.generator(), code.informationPositions());
    }

    private static Optional<WordProgram> parityCheckProgram(Code code, long wordOperations) {
        return ParityCheckProgram.cheaperThan(wordOperations, code.parityCheck(), code.informationPositions());
    }

    /** Runs a program on a buffer whose parity words hold garbage and which ends in guard words. */
    private static long[] codeword(WordProgram program, Code code, long seed) {
        Random random = new Random(seed);
        long[] words = random.longs(code.n() + 3).toArray();
        long[] information = new Random(~seed).longs(code.k()).toArray();
        int[] positions = code.informationPositions();
        for (int i = 0; i < positions.length; i++) {
            words[positions[i]] = information[i];
        }
        long[] guards = Arrays.copyOfRange(words, code.n(), code.n() + 3);
        program.run(words);
        assertArrayEquals(guards, Arrays.copyOfRange(words, code.n(), code.n() + 3), "guard words, seed " + seed);
        for (int i = 0; i < positions.length; i++) {
            assertEquals(information[i], words[positions[i]], "information bit " + i + " seed " + seed);
        }
        return Arrays.copyOf(words, code.n());
    }

    private static void assertSameCodewords(Code code, WordProgram program, long seed) {
        assertArrayEquals(
                codeword(generatorProgram(code), code, seed),
                codeword(program, code, seed),
                code.designator() + " seed " + seed);
    }

    static List<String> ldpc() {
        return Catalogue.standard().listed().stream()
                .filter(designator -> designator.startsWith("ldpc-"))
                .toList();
    }

    @ParameterizedTest
    @MethodSource("ldpc")
    void ldpcCodesReadFewerWordsThanTheirMatrixHasOnes(String designator) {
        Code code = Catalogue.standard().build(designator);
        WordProgram program = parityCheckProgram(code, GeneratorProgram.wordOperations(code.generator()))
                .orElseThrow();
        assertSameCodewords(code, program, code.n());
        assertTrue(
                program.wordOperations() < code.parityCheck().ones(),
                designator + ": " + program.wordOperations() + " of "
                        + code.parityCheck().ones());
    }

    /** Whatever the catalogue lists, with every program that can be made of its matrix, cheaper or not. */
    @ParameterizedTest
    @MethodSource("listed")
    void everyListedCodeGivesTheSameCodewords(String designator) {
        Code code = Catalogue.standard().build(designator);
        assertSameCodewords(code, parityCheckProgram(code, Integer.MAX_VALUE).orElseThrow(), 1);
    }

    static List<String> listed() {
        return Catalogue.standard().listed();
    }

    @ParameterizedTest
    @ValueSource(
            strings = {
                "ldpc-802.11n:1944,1/2+shorten=100",
                "ldpc-802.11n:648,5/6+shorten=539",
                "ldpc-802.11n:1296,3/4+shorten=54",
            })
    void shortenedCodesKeepTheStructure(String designator) {
        Code code = Catalogue.standard().build(designator);
        WordProgram program =
                parityCheckProgram(code, code.parityCheck().ones()).orElseThrow();
        assertSameCodewords(code, program, 3);
    }

    /**
     * The parity part of 802.11n codes needs one gap position, which is the sum of the information of 12 rows, one of each
     * block row, since the parity of those cancels but for it. Count by hand: the ones of H, without each of 971 rows' own
     * parity one and the 3 parity ones of the check row; and 11 sums that are read twice, once for the gap and once in
     * their own row.
     */
    @Test
    void countedOperationsOfTheLongestHalfRateCode() {
        Code code = Catalogue.standard().build("ldpc-802.11n:1944,1/2");
        assertEquals(6966, code.parityCheck().ones());
        assertEquals(
                1, triangle(code).gap().length, "gap of the dual-diagonal part closed by a column of weight three");
        WordProgram program = parityCheckProgram(code, Integer.MAX_VALUE).orElseThrow();
        assertEquals(6966 - 971 - 3 + 2 * 11, program.wordOperations());
    }

    private static ApproximateTriangle triangle(Code code) {
        return ApproximateTriangle.of(
                        code.parityCheck(),
                        InformationSet.mask(code.n(), code.informationPositions()),
                        Integer.MAX_VALUE)
                .orElseThrow();
    }

    /** An accumulator: parity i adds some information to parity i-1, so that every row is read once and nothing more. */
    @ParameterizedTest
    @ValueSource(longs = {1, 2, 3})
    void staircasesHaveNoGap(long seed) {
        Random random = new Random(seed);
        int k = 60;
        int m = 90;
        int[][] rows = new int[m][];
        for (int r = 0; r < m; r++) {
            TreeSet<Integer> ones = new TreeSet<>();
            while (ones.size() < 4) {
                ones.add(random.nextInt(k));
            }
            ones.add(k + r);
            if (r > 0) {
                ones.add(k + r - 1);
            }
            rows[r] = ones.stream().mapToInt(Integer::intValue).toArray();
        }
        Code code = code(SparseBitMatrix.ofRows(k + m, rows));
        assertArrayEquals(IntStream.range(0, k).toArray(), code.informationPositions());
        assertEquals(0, triangle(code).gap().length, "seed " + seed);
        WordProgram program = parityCheckProgram(code, Integer.MAX_VALUE).orElseThrow();
        assertEquals(code.parityCheck().ones() - m, program.wordOperations(), "seed " + seed);
        assertSameCodewords(code, program, seed);
    }

    /** Column weight, rows and columns of random sparse matrices; some have gaps large enough for two passes to win. */
    static Stream<int[]> shapes() {
        return Stream.of(
                new int[] {3, 20, 40},
                new int[] {3, 100, 200},
                new int[] {3, 500, 1000},
                new int[] {2, 30, 70},
                new int[] {4, 64, 256},
                new int[] {5, 33, 65});
    }

    static Stream<Arguments> sparse() {
        return shapes().flatMap(shape -> LongStream.range(1, 9).mapToObj(seed -> Arguments.of(shape, seed)));
    }

    @ParameterizedTest
    @MethodSource("sparse")
    void bothWaysToTheGapGiveTheSameCodewordsOfRandomSparseMatrices(int[] shape, long seed) {
        Code code = code(randomColumns(shape[0], shape[1], shape[2], new Random(seed)));
        assertBothWays(code, seed);
        assertSameCodewords(code, parityCheckProgram(code, Integer.MAX_VALUE).orElseThrow(), seed);
    }

    private static void assertBothWays(Code code, long seed) {
        ParityCheckProgram programs = new ParityCheckProgram(
                code.parityCheck(), InformationSet.mask(code.n(), code.informationPositions()), triangle(code));
        assertSameCodewords(code, programs.bySums(), seed);
        assertSameCodewords(code, programs.twoPasses(), seed);
    }

    private static SparseBitMatrix randomColumns(int weight, int m, int n, Random random) {
        int[][] columns = new int[n][];
        for (int c = 0; c < n; c++) {
            TreeSet<Integer> ones = new TreeSet<>();
            while (ones.size() < weight) {
                ones.add(random.nextInt(m));
            }
            columns[c] = ones.stream().mapToInt(Integer::intValue).toArray();
        }
        return SparseBitMatrix.ofRows(m, columns).transpose();
    }

    /** The other way to the gap than that of 802.11n codes: its sums alone would read more than the whole matrix. */
    @Test
    void longRandomCodesTakeTwoPassesAndStillWin() {
        Code code = code(randomColumns(3, 500, 1000, new Random(1)));
        long dense = GeneratorProgram.wordOperations(code.generator());
        WordProgram program = parityCheckProgram(code, dense).orElseThrow();
        assertTrue(program.wordOperations() < 2 * code.parityCheck().ones(), program.wordOperations() + " words");
        assertTrue(program.wordOperations() * 10L < dense, program.wordOperations() + " of " + dense);
        ApproximateTriangle triangle = triangle(code);
        GapEquations equations = GapEquations.of(
                code.parityCheck(), InformationSet.mask(code.n(), code.informationPositions()), triangle);
        assertTrue(
                equations.additions() > code.parityCheck().ones(),
                equations.additions() + " rows added: sums would be the cheaper way");
    }

    /** Random dense matrices, up to rank one less than n, with their rows repeated, summed and zero rows among them. */
    @ParameterizedTest
    @MethodSource("seeds")
    void dependentRowsAreLeftOut(long seed) {
        Random random = new Random(seed);
        int n = 3 + random.nextInt(70);
        int m = 1 + random.nextInt(n - 1);
        double density = random.nextBoolean() ? 0.08 : 0.5;
        BitMatrix H = new BitMatrix(2 * m + 2, n);
        for (int r = 0; r < m; r++) {
            for (int c = 0; c < n; c++) {
                H.set(r, c, random.nextDouble() < density);
            }
        }
        for (int r = m; r < 2 * m; r++) {
            H.addRow(random.nextInt(m), r);
            H.addRow(random.nextInt(r), r);
        }
        for (int r = 0; r < H.rows(); r++) {
            H.swapRows(r, random.nextInt(H.rows()));
        }
        assertTrue(Elimination.rank(H) < H.rows(), "seed " + seed);
        assertBothWays(code(SparseBitMatrix.of(H)), seed);
    }

    static LongStream seeds() {
        return LongStream.range(1, 61);
    }

    @Test
    void aDenseMatrixIsLeftToTheGenerator() {
        Code code = Catalogue.standard().build("bch:63,36");
        assertTrue(parityCheckProgram(code, GeneratorProgram.wordOperations(code.generator()))
                .isEmpty());
    }

    @Test
    void positionsThatTheMatrixLeavesOpenAreRefused() {
        SparseBitMatrix H = SparseBitMatrix.of(BitMatrix.ofRows("1111000", "1100110"));
        // Columns 4 and 5 are equal, so that position 4 and 5 cannot both be parity.
        assertThrows(
                IllegalArgumentException.class,
                () -> ParityCheckProgram.cheaperThan(100, H, new int[] {0, 1, 2, 3, 6}));
        // Position 6 stands in no row.
        assertThrows(
                IllegalArgumentException.class,
                () -> ParityCheckProgram.cheaperThan(100, H, new int[] {0, 1, 3, 4, 5}));
    }
}
