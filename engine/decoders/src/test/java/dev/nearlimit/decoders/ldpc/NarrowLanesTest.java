package dev.nearlimit.decoders.ldpc;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.sun.management.ThreadMXBean;
import dev.nearlimit.codes.Code;
import dev.nearlimit.codes.catalogue.Catalogue;
import dev.nearlimit.codes.gf2.SparseBitMatrix;
import dev.nearlimit.decoders.Decoder;
import dev.nearlimit.decoders.RandomBatches;
import dev.nearlimit.decoders.batch.DecodedBatch;
import dev.nearlimit.decoders.batch.LlrBatch;
import dev.nearlimit.numerics.kernels.Kernels;
import java.lang.management.ManagementFactory;
import java.util.Arrays;
import java.util.Optional;
import java.util.Random;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

/** The decoders on 8-bit and 16-bit lanes give what the one on 32-bit lanes gives, where most frames nearly converge. */
class NarrowLanesTest {
    private static final Iterations EARLY = new Iterations(12, Schedule.LAYERED, true);
    private static final Iterations ALL = new Iterations(7, Schedule.LAYERED, false);
    private static final Iterations FLOODING = new Iterations(9, Schedule.FLOODING, true);

    /** All pairs of word lengths, so that every limit and the border between the widths of lanes is met. */
    @ParameterizedTest
    @ValueSource(ints = {2, 3, 4, 5, 6, 7, 8})
    void agreeForEveryWordLength(int message) {
        for (int posterior = message; posterior <= 15; posterior++) {
            Random random = new Random(100 * message + posterior);
            String seed = "seed " + (100 * message + posterior);
            SparseBitMatrix matrix = posterior % 2 == 0
                    ? RandomBatches.quasiCyclic(random, 4, 9, 11)
                    : RandomBatches.matrix(random, 20, 40, 1, 9);
            WordLengths words = new WordLengths(message, posterior);
            MagnitudeCorrection correction = random.nextBoolean()
                    ? new MagnitudeCorrection.Scale(1 + random.nextInt(8))
                    : new MagnitudeCorrection.Offset(random.nextInt(4));
            int rail = Math.min(words.largestPosterior(), 127);
            LlrBatch batch = new LlrBatch(matrix.columns());
            for (int i = 0; i < batch.levels().length; i++) {
                int level = random.nextInt(4) == 0 ? rail : random.nextInt(rail + 1);
                batch.levels()[i] = (byte) (random.nextInt(9) == 0 ? -level : level);
            }
            compare(matrix, words, correction, EARLY, batch, seed);
            compare(matrix, words, correction, ALL, batch, seed);
            compare(matrix, words, correction, FLOODING, batch, seed);
        }
    }

    @ParameterizedTest
    @CsvSource({"4, 6, 6, 0, 8", "5, 7, 8, 1, 8", "6, 7, 7, 0, 8", "6, 8, 8, 1, 16", "7, 7, 6, 0, 16", "8, 10, 8, 2, 16"
    })
    void agreeOnAWirelessCode(int message, int posterior, int eighths, int offset, int bitsOfLane) {
        Code code = Catalogue.standard().build("ldpc-802.11n:648,1/2");
        Random random = new Random(posterior);
        LlrBatch batch = RandomBatches.noisy(code, random, 0.75, new long[code.n()]);
        WordLengths words = new WordLengths(message, posterior);
        int rail = words.largestMessage();
        for (int i = 0; i < batch.levels().length; i++) {
            batch.levels()[i] = (byte) Math.max(-rail, Math.min(rail, Math.round(batch.values()[i] * rail / 10)));
        }
        MagnitudeCorrection correction =
                eighths < 8 ? new MagnitudeCorrection.Scale(eighths) : new MagnitudeCorrection.Offset(offset);
        Decoder decoder = new MinSumSettings(EARLY, correction, Optional.of(words))
                .fixedPoint(code.parityCheck(), words, Kernels.decoders());
        assertEquals(bitsOfLane == 8 ? ByteLayeredMinSum.class : ShortLayeredMinSum.class, decoder.getClass());
        compare(code.parityCheck(), words, correction, EARLY, batch, "seed " + posterior);
        compare(code.parityCheck(), words, correction, ALL, batch, "seed " + posterior);
        Decoder flooding = new MinSumSettings(FLOODING, correction, Optional.of(words))
                .fixedPoint(code.parityCheck(), words, Kernels.decoders());
        assertEquals(bitsOfLane == 8 ? ByteFloodingMinSum.class : ShortFloodingMinSum.class, flooding.getClass());
        compare(code.parityCheck(), words, correction, FLOODING, batch, "seed " + posterior);
    }

    /** A bit of 256 rows may sum up to 127 + 256 * 127 = 32639, which 16 bits hold; one of 260 rows may not. */
    @ParameterizedTest
    @CsvSource({"256, true", "260, false"})
    void floodingKeepsItsSumsExact(int rows, boolean narrow) {
        int[][] ones = new int[rows][];
        for (int row = 0; row < rows; row++) {
            ones[row] = new int[] {0, 1 + row};
        }
        SparseBitMatrix matrix = SparseBitMatrix.ofRows(1 + rows, ones);
        WordLengths words = new WordLengths(8, 8);
        MagnitudeCorrection none = new MagnitudeCorrection.Scale(8);
        Iterations iterations = new Iterations(1, Schedule.FLOODING, false);
        LlrBatch batch = new LlrBatch(matrix.columns());
        Arrays.fill(batch.levels(), (byte) -127);
        Decoder decoder =
                new MinSumSettings(iterations, none, Optional.of(words)).fixedPoint(matrix, words, Kernels.decoders());
        assertEquals(narrow ? ShortFloodingMinSum.class : FixedPointBeliefPropagation.class, decoder.getClass());
        DecodedBatch decoded = new DecodedBatch(matrix.columns());
        decoder.decode(batch, decoded);
        for (long bits : decoded.bits()) {
            assertEquals(-1L, bits);
        }
    }

    /**
     * The plain loops allocate nothing from the first call on. Of the vector ones no test can say so: whether the JIT keeps
     * its vectors in registers depends on what else it has compiled, and is measured by the benchmarks ({@code -prof gc}).
     */
    @Test
    void aCallOfThePlainLoopsAllocatesNothing() {
        WordLengths words = new WordLengths(5, 7);
        Code code = Catalogue.standard().build("hamming:15,11");
        Decoder decoder = new MinSumSettings(ALL, new MagnitudeCorrection.Scale(6), Optional.of(words))
                .fixedPoint(code.parityCheck(), words, Optional.empty());
        LlrBatch batch = new LlrBatch(code.n());
        DecodedBatch decoded = new DecodedBatch(code.n());
        decoder.decode(batch, decoded);
        long allocated = ofCalls(decoder, batch, decoded);
        assertTrue(allocated < 100 * 16, "100 calls allocated " + allocated + " bytes");
    }

    private static long ofCalls(Decoder decoder, LlrBatch batch, DecodedBatch decoded) {
        ThreadMXBean thread = (ThreadMXBean) ManagementFactory.getThreadMXBean();
        long before = thread.getThreadAllocatedBytes(Thread.currentThread().getId());
        for (int i = 0; i < 100; i++) {
            decoder.decode(batch, decoded);
        }
        return thread.getThreadAllocatedBytes(Thread.currentThread().getId()) - before;
    }

    private static void compare(
            SparseBitMatrix matrix,
            WordLengths words,
            MagnitudeCorrection correction,
            Iterations iterations,
            LlrBatch batch,
            String seed) {
        assertTrue(Kernels.decoders().isPresent(), "this test needs --add-modules jdk.incubator.vector");
        MinSumSettings settings = new MinSumSettings(iterations, correction, Optional.of(words));
        DecodedBatch expected = new DecodedBatch(matrix.columns());
        DecodedBatch found = new DecodedBatch(matrix.columns());
        settings.fixedPoint(matrix, words, Optional.empty()).decode(batch, expected);
        settings.fixedPoint(matrix, words, Kernels.decoders()).decode(batch, found);
        String where = seed + ", " + settings.designator();
        assertArrayEquals(expected.bits(), found.bits(), where);
        assertArrayEquals(expected.iterations(), found.iterations(), where);
        assertEquals(expected.declaredFailures(), found.declaredFailures(), where);
    }
}
