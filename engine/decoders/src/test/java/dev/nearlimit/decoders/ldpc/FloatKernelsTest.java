package dev.nearlimit.decoders.ldpc;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import dev.nearlimit.codes.Code;
import dev.nearlimit.codes.catalogue.Catalogue;
import dev.nearlimit.codes.gf2.SparseBitMatrix;
import dev.nearlimit.decoders.Decoder;
import dev.nearlimit.decoders.RandomBatches;
import dev.nearlimit.decoders.batch.DecodedBatch;
import dev.nearlimit.decoders.batch.LlrBatch;
import dev.nearlimit.numerics.kernels.DecoderKernels;
import dev.nearlimit.numerics.kernels.Kernels;
import java.util.Optional;
import java.util.Random;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** The single-precision decoders give the same on kernels and without: decisions, iterations and declared failures. */
class FloatKernelsTest {
    private static final MagnitudeCorrection[] CORRECTIONS = {
        new MagnitudeCorrection.Scale(6),
        new MagnitudeCorrection.Scale(8),
        new MagnitudeCorrection.Offset(0.5f),
        new MagnitudeCorrection.Offset(0)
    };

    /** Irregular rows of weight 1 to 9, quasi-cyclic and not; few iterations, so that nothing has settled. */
    @ParameterizedTest
    @ValueSource(longs = {1, 2, 3, 4, 5, 6, 7, 8, 9, 10})
    void agreeOnRandomMatrices(long seed) {
        Random random = new Random(seed);
        SparseBitMatrix matrix = seed % 2 == 0
                ? RandomBatches.quasiCyclic(random, 4, 9, 3 + random.nextInt(20))
                : RandomBatches.matrix(random, 20, 40, 1, 9);
        LlrBatch batch = new LlrBatch(matrix.columns());
        for (int i = 0; i < batch.values().length; i++) {
            int kind = random.nextInt(20);
            float llr = (float) (2 + 2 * random.nextGaussian());
            batch.values()[i] = kind == 0
                    ? -0f
                    : kind == 1 ? Float.POSITIVE_INFINITY : kind == 2 ? 5000 * llr : kind < 6 ? Math.round(llr) : llr;
        }
        for (Schedule schedule : Schedule.values()) {
            for (boolean early : new boolean[] {true, false}) {
                Iterations iterations = new Iterations(1 + random.nextInt(8), schedule, early);
                compareAll(matrix, iterations, batch, "seed " + seed);
            }
        }
    }

    @Test
    void agreeOnAWirelessCodeNearItsThreshold() {
        Code code = Catalogue.standard().build("ldpc-802.11n:648,1/2");
        LlrBatch batch = RandomBatches.noisy(code, new Random(1), 0.8, new long[code.n()]);
        for (Schedule schedule : Schedule.values()) {
            compareAll(code.parityCheck(), new Iterations(9, schedule, true), batch, "seed 1");
        }
    }

    private static void compareAll(SparseBitMatrix matrix, Iterations iterations, LlrBatch batch, String where) {
        Optional<DecoderKernels> kernels = Kernels.decoders();
        assertTrue(kernels.isPresent(), "this test needs --add-modules jdk.incubator.vector");
        SumProductSettings sumProduct = new SumProductSettings(iterations);
        compare(
                sumProduct.decoder(matrix, Optional.empty()),
                sumProduct.decoder(matrix, kernels),
                batch,
                where + ", " + sumProduct.designator());
        for (MagnitudeCorrection correction : CORRECTIONS) {
            MinSumSettings minSum = new MinSumSettings(iterations, correction, Optional.empty());
            compare(
                    minSum.singlePrecision(matrix, Optional.empty()),
                    minSum.singlePrecision(matrix, kernels),
                    batch,
                    where + ", " + minSum.designator());
        }
    }

    private static void compare(Decoder plain, Decoder onKernels, LlrBatch batch, String where) {
        assertEquals(FloatBeliefPropagation.class, plain.getClass());
        DecodedBatch expected = new DecodedBatch(batch.n());
        DecodedBatch found = new DecodedBatch(batch.n());
        plain.decode(batch, expected);
        onKernels.decode(batch, found);
        onKernels.decode(batch, found); // a second batch sees nothing of the first
        assertArrayEquals(expected.bits(), found.bits(), where);
        assertArrayEquals(expected.iterations(), found.iterations(), where);
        assertEquals(expected.declaredFailures(), found.declaredFailures(), where);
    }
}
