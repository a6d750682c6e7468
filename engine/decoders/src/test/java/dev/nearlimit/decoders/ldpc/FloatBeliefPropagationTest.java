package dev.nearlimit.decoders.ldpc;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import dev.nearlimit.codes.Code;
import dev.nearlimit.codes.batch.FrameBatch;
import dev.nearlimit.codes.gf2.SparseBitMatrix;
import dev.nearlimit.decoders.Decoder;
import dev.nearlimit.decoders.DecoderSettings;
import dev.nearlimit.decoders.RandomBatches;
import dev.nearlimit.decoders.batch.DecodedBatch;
import dev.nearlimit.decoders.batch.LlrBatch;
import dev.nearlimit.decoders.quantiser.NoQuantiser;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import java.util.Random;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

class FloatBeliefPropagationTest {
    private static final MagnitudeCorrection SCALE = new MagnitudeCorrection.Scale(6);
    private static final MagnitudeCorrection OFFSET = new MagnitudeCorrection.Offset(0.5f);

    /** Each outgoing sum-product message, over random rows, against the double-precision definition. */
    @ParameterizedTest
    @ValueSource(longs = {1, 2, 3, 4})
    void boxPlusMessagesStayWithinTheirError(long seed) {
        Random random = new Random(seed);
        int degree = 2 + random.nextInt(9);
        int lanes = 512;
        float[][] incoming = new float[degree][lanes];
        for (float[] ofEdge : incoming) {
            for (int f = 0; f < lanes; f++) {
                ofEdge[f] = (float) (random.nextGaussian() * 4);
            }
        }
        float[][] message = new float[degree][lanes];
        new SumProductCheckRule(degree, lanes).apply(incoming, degree, lanes, message, 0);
        // d-2 operations lie behind a message, each adds twice the error of the correction; the operation does not
        // enlarge the error of its operands, since its derivatives do not exceed 1.
        double allowed = (degree - 2) * (2 * 5e-5 + 1e-5);
        for (int lane = 0; lane < lanes; lane++) {
            for (int to = 0; to < degree; to++) {
                double product = 1;
                for (int i = 0; i < degree; i++) {
                    product *= i == to ? 1 : StrictMath.tanh(incoming[i][lane] / 2.0);
                }
                double exact = StrictMath.log((1 + product) / (1 - product));
                assertEquals(exact, message[to][lane], allowed, "seed " + seed + " lane " + lane);
            }
        }
    }

    /**
     * Min-sum often meets exact ties, which rounding breaks. On LLRs that are multiples of 1/64, without a factor, single
     * and double precision compute both exactly, and every frame must agree; with a factor of 6/8 a tie may be broken
     * differently, which is rarer than 1 frame in 64.
     */
    @ParameterizedTest
    @ValueSource(longs = {1, 2, 3, 4, 5, 6})
    void minSumDecidesAsTheTwinDoes(long seed) {
        for (MagnitudeCorrection correction : List.of(new MagnitudeCorrection.Scale(8), OFFSET, SCALE)) {
            for (Schedule schedule : Schedule.values()) {
                Iterations iterations = new Iterations(6, schedule, true);
                MinSumSettings settings = new MinSumSettings(iterations, correction, Optional.empty());
                agree(settings, iterations, true, correction, seed, correction == SCALE ? 1 : 0);
            }
        }
    }

    /** The rule's error moves a decision only where a posterior is within it of 0; that is rarer than 1 frame in 64. */
    @ParameterizedTest
    @ValueSource(longs = {1, 2, 3, 4, 5, 6})
    void sumProductDecidesAsTheTwinDoes(long seed) {
        for (Schedule schedule : Schedule.values()) {
            Iterations iterations = new Iterations(8, schedule, true);
            agree(new SumProductSettings(iterations), iterations, false, SCALE, seed, 1);
        }
    }

    private static void agree(
            DecoderSettings settings,
            Iterations iterations,
            boolean minSum,
            MagnitudeCorrection correction,
            long seed,
            int framesThatMayDiffer) {
        Random random = new Random(seed);
        SparseBitMatrix matrix =
                seed % 2 == 0 ? RandomBatches.quasiCyclic(random, 4, 8, 7) : RandomBatches.matrix(random, 20, 40, 2, 6);
        Code code = Code.ofParityCheck("test", "test", matrix);
        LlrBatch batch = RandomBatches.noisy(code, random, 0.8, new long[code.n()]);
        for (int i = 0; i < batch.values().length; i++) {
            batch.values()[i] = Math.round(batch.values()[i] * 64f) / 64f;
        }
        DecodedBatch decoded = new DecodedBatch(code.n());
        settings.newDecoder(code, new NoQuantiser()).decode(batch, decoded);
        SingleFrameSumProduct twin = new SingleFrameSumProduct(matrix, minSum, correction);
        int different = 0;
        int converged = 0;
        for (int f = 0; f < FrameBatch.FRAMES; f++) {
            double[] channel = new double[code.n()];
            for (int i = 0; i < channel.length; i++) {
                channel[i] = batch.values()[FrameBatch.softIndex(i, f)];
            }
            twin.decode(channel, iterations);
            boolean same = Arrays.equals(twin.bits, RandomBatches.frame(decoded.bits(), f))
                    && twin.iterations == decoded.iterations()[f]
                    && twin.failed == ((decoded.declaredFailures() >>> f & 1L) != 0);
            different += same ? 0 : 1;
            converged += twin.failed ? 0 : 1;
        }
        String where = "seed " + seed + ", " + settings.designator();
        assertTrue(different <= framesThatMayDiffer, where + ": " + different + " frames differ");
        assertTrue(converged > 8, where + ": only " + converged + " frames converge, which tests little");
    }

    @Test
    void aCodewordTakesNoIterationAndIsLeftAlone() {
        Code code = Code.ofParityCheck("test", "test", RandomBatches.quasiCyclic(new Random(3), 3, 6, 5));
        long[] sent = new long[code.n()];
        LlrBatch batch = RandomBatches.noisy(code, new Random(4), 0.05, sent);
        DecodedBatch decoded = new DecodedBatch(code.n());
        new SumProductSettings(Iterations.atMost(5))
                .newDecoder(code, new NoQuantiser())
                .decode(batch, decoded);
        assertArrayEquals(sent, decoded.bits());
        assertArrayEquals(new int[FrameBatch.FRAMES], decoded.iterations());
        assertEquals(0, decoded.declaredFailures());
    }

    @Test
    void withoutEarlyStopEveryFrameTakesAllIterations() {
        Code code = Code.ofParityCheck("test", "test", RandomBatches.quasiCyclic(new Random(3), 3, 6, 5));
        long[] sent = new long[code.n()];
        LlrBatch batch = RandomBatches.noisy(code, new Random(4), 0.3, sent);
        DecodedBatch decoded = new DecodedBatch(code.n());
        new MinSumSettings(new Iterations(7, Schedule.LAYERED, false), SCALE, Optional.empty())
                .newDecoder(code, new NoQuantiser())
                .decode(batch, decoded);
        int[] all = new int[FrameBatch.FRAMES];
        Arrays.fill(all, 7);
        assertArrayEquals(all, decoded.iterations());
        assertArrayEquals(sent, decoded.bits());
    }

    /** A frame among others, in another lane, after other batches, or beside rubbish gives the same result. */
    @ParameterizedTest
    @ValueSource(strings = {"sum-product", "min-sum"})
    void framesDoNotSeeEachOther(String name) {
        Code code = Code.ofParityCheck("test", "test", RandomBatches.quasiCyclic(new Random(5), 4, 8, 6));
        Iterations iterations = Iterations.atMost(9);
        DecoderSettings settings = name.equals("sum-product")
                ? new SumProductSettings(iterations)
                : new MinSumSettings(iterations, SCALE, Optional.empty());
        LlrBatch batch = RandomBatches.noisy(code, new Random(6), 0.85, new long[code.n()]);
        Decoder decoder = settings.newDecoder(code, new NoQuantiser());
        DecodedBatch together = new DecodedBatch(code.n());
        decoder.decode(batch, together);
        Random random = new Random(7);
        for (int f = 0; f < FrameBatch.FRAMES; f += 9) {
            int lane = random.nextInt(FrameBatch.FRAMES);
            LlrBatch moved = new LlrBatch(code.n());
            for (int i = 0; i < moved.values().length; i++) {
                moved.values()[i] = random.nextInt(3) == 0 ? Float.POSITIVE_INFINITY : -1e30f * random.nextFloat();
            }
            for (int i = 0; i < code.n(); i++) {
                moved.values()[FrameBatch.softIndex(i, lane)] = batch.values()[FrameBatch.softIndex(i, f)];
            }
            DecodedBatch alone = new DecodedBatch(code.n());
            decoder.decode(moved, alone);
            assertArrayEquals(
                    RandomBatches.frame(together.bits(), f), RandomBatches.frame(alone.bits(), lane), "frame " + f);
            assertEquals(together.iterations()[f], alone.iterations()[lane], "frame " + f);
            assertEquals(together.declaredFailures() >>> f & 1L, alone.declaredFailures() >>> lane & 1L, "frame " + f);
        }
    }
}
