package dev.nearlimit.decoders.ldpc;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import dev.nearlimit.codes.Code;
import dev.nearlimit.codes.batch.FrameBatch;
import dev.nearlimit.codes.catalogue.Catalogue;
import dev.nearlimit.decoders.RandomBatches;
import dev.nearlimit.decoders.batch.DecodedBatch;
import dev.nearlimit.decoders.batch.LlrBatch;
import dev.nearlimit.numerics.kernels.Kernels;
import java.util.Random;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/**
 * Single-precision sum-product against its double-precision twin on all 12 codes of IEEE 802.11n, near the threshold,
 * where frames take several iterations: decisions, iterations and declared failures of every frame looked at.
 */
class WirelessSumProductTest {
    @ParameterizedTest
    @CsvSource({
        "648, 1/2, 0.78", "648, 2/3, 0.62", "648, 3/4, 0.56", "648, 5/6, 0.53",
        "1296, 1/2, 0.78", "1296, 2/3, 0.63", "1296, 3/4, 0.57", "1296, 5/6, 0.51",
        "1944, 1/2, 0.79", "1944, 2/3, 0.64", "1944, 3/4, 0.58", "1944, 5/6, 0.51"
    })
    void decidesAsTheTwinDoes(int n, String rate, double deviation) {
        agree(n, rate, deviation, Schedule.LAYERED, 2);
    }

    @Tag("thorough")
    @ParameterizedTest
    @CsvSource({
        "648, 1/2, 0.78", "648, 2/3, 0.62", "648, 3/4, 0.56", "648, 5/6, 0.53",
        "1296, 1/2, 0.78", "1296, 2/3, 0.63", "1296, 3/4, 0.57", "1296, 5/6, 0.51",
        "1944, 1/2, 0.79", "1944, 2/3, 0.64", "1944, 3/4, 0.58", "1944, 5/6, 0.51"
    })
    void decidesAsTheTwinDoesOnManyFrames(int n, String rate, double deviation) {
        agree(n, rate, deviation, Schedule.LAYERED, 16);
        agree(n, rate, deviation, Schedule.FLOODING, 16);
    }

    private static void agree(int n, String rate, double deviation, Schedule schedule, int frames) {
        Code code = Catalogue.standard().build("ldpc-802.11n:" + n + "," + rate);
        Iterations iterations = new Iterations(12, schedule, true);
        LlrBatch batch = RandomBatches.noisy(code, new Random(n), deviation, new long[code.n()]);
        DecodedBatch decoded = new DecodedBatch(code.n());
        new SumProductSettings(iterations)
                .decoder(code.parityCheck(), Kernels.decoders())
                .decode(batch, decoded);
        SingleFrameSumProduct twin =
                new SingleFrameSumProduct(code.parityCheck(), false, new MagnitudeCorrection.Scale(8));
        int most = 0;
        for (int f = 0; f < frames; f++) {
            double[] channel = new double[code.n()];
            for (int i = 0; i < channel.length; i++) {
                channel[i] = batch.values()[FrameBatch.softIndex(i, f)];
            }
            twin.decode(channel, iterations);
            String where = "seed " + n + ", frame " + f + ", " + schedule;
            assertEquals(twin.iterations, decoded.iterations()[f], where);
            assertEquals(twin.failed, (decoded.declaredFailures() >>> f & 1L) != 0, where);
            assertArrayEquals(twin.bits, RandomBatches.frame(decoded.bits(), f), where);
            most = Math.max(most, twin.iterations);
        }
        assertTrue(most >= 3, "no frame takes more than " + most + " iterations, which tests little");
    }
}
