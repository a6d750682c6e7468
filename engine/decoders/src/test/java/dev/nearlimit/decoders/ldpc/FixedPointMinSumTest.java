package dev.nearlimit.decoders.ldpc;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;

import dev.nearlimit.codes.Code;
import dev.nearlimit.codes.batch.FrameBatch;
import dev.nearlimit.codes.gf2.SparseBitMatrix;
import dev.nearlimit.decoders.Decoder;
import dev.nearlimit.decoders.RandomBatches;
import dev.nearlimit.decoders.batch.DecodedBatch;
import dev.nearlimit.decoders.batch.LlrBatch;
import dev.nearlimit.decoders.quantiser.Rise;
import dev.nearlimit.decoders.quantiser.UniformQuantiser;
import dev.nearlimit.numerics.kernels.Kernels;
import java.util.List;
import java.util.Optional;
import java.util.Random;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/**
 * The lane-parallel decoder and its twin agree to the bit: decisions, iterations and declared failures; with and without
 * kernels.
 */
class FixedPointMinSumTest {
    private static final MagnitudeCorrection[] CORRECTIONS = {
        new MagnitudeCorrection.Scale(6),
        new MagnitudeCorrection.Scale(8),
        new MagnitudeCorrection.Scale(3),
        new MagnitudeCorrection.Offset(1),
        new MagnitudeCorrection.Offset(0)
    };

    @ParameterizedTest
    @ValueSource(longs = {1, 2, 3, 4, 5, 6, 7, 8, 9, 10, 11, 12})
    void equalsTheTwinOnRandomMatrices(long seed) {
        Random random = new Random(seed);
        SparseBitMatrix matrix = seed % 2 == 0
                ? RandomBatches.quasiCyclic(random, 3, 6, 5 + random.nextInt(9))
                : RandomBatches.matrix(random, 12, 24, 1, 7);
        for (MagnitudeCorrection correction : CORRECTIONS) {
            for (Schedule schedule : Schedule.values()) {
                int message = 2 + random.nextInt(7);
                WordLengths words = new WordLengths(message, message + random.nextInt(4));
                Iterations iterations = new Iterations(1 + random.nextInt(8), schedule, random.nextInt(4) > 0);
                compare(matrix, words, correction, iterations, random, "seed " + seed);
            }
        }
    }

    private static void compare(
            SparseBitMatrix matrix,
            WordLengths words,
            MagnitudeCorrection correction,
            Iterations iterations,
            Random random,
            String seed) {
        UniformQuantiser quantiser = new UniformQuantiser(Math.min(words.posterior(), 8), 0.25f, Rise.MID_TREAD);
        Code code = Code.ofParityCheck("test", "test", matrix);
        MinSumSettings settings = new MinSumSettings(iterations, correction, Optional.of(words));
        List<Decoder> decoders = List.of(
                settings.newDecoder(code, quantiser),
                settings.fixedPoint(matrix, words, Optional.empty()),
                settings.fixedPoint(matrix, words, Kernels.decoders()));
        SingleFrameMinSum twin = new SingleFrameMinSum(matrix, words, correction);
        LlrBatch batch = new LlrBatch(matrix.columns());
        int rail = quantiser.largestLevel();
        for (int i = 0; i < batch.levels().length; i++) {
            // Rails, zeros and ties are frequent; most frames lean to the zero word, so that some converge.
            int pick = random.nextInt(8);
            batch.levels()[i] = (byte)
                    (pick == 0
                            ? rail
                            : pick == 1
                                    ? -rail
                                    : pick == 2 ? 0 : Math.round(0.7f * random.nextInt(rail + 1)) - pick / 6);
        }
        DecodedBatch[] decoded = new DecodedBatch[decoders.size()];
        for (int i = 0; i < decoded.length; i++) {
            decoded[i] = new DecodedBatch(matrix.columns());
            decoders.get(i).decode(batch, decoded[i]);
            decoders.get(i).decode(batch, decoded[i]); // a second batch sees nothing of the first
        }
        for (int f = 0; f < FrameBatch.FRAMES; f++) {
            int[] channel = new int[matrix.columns()];
            for (int i = 0; i < channel.length; i++) {
                channel[i] = batch.levels()[FrameBatch.softIndex(i, f)];
            }
            twin.decode(channel, iterations);
            for (int i = 0; i < decoded.length; i++) {
                String where = seed + ", " + settings.designator() + ", frame " + f + ", "
                        + decoders.get(i).getClass().getSimpleName();
                assertArrayEquals(twin.bits, RandomBatches.frame(decoded[i].bits(), f), where);
                assertEquals(twin.iterations, decoded[i].iterations()[f], where);
                assertEquals(twin.failed, (decoded[i].declaredFailures() >>> f & 1L) != 0, where);
            }
        }
    }
}
