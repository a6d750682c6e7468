package dev.nearlimit.simulation.link;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import dev.nearlimit.decoders.batch.LlrBatch;
import dev.nearlimit.limits.GaussianTail;
import dev.nearlimit.numerics.noise.GaussianNoise;
import dev.nearlimit.numerics.noise.UniformDraws;
import dev.nearlimit.numerics.random.FrameStreams;
import dev.nearlimit.numerics.random.Stream;
import java.math.BigInteger;
import java.nio.ByteBuffer;
import java.util.SplittableRandom;
import java.util.zip.CRC32C;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

class LinkTest {
    private static final int N = 37;

    /** LLR = ln P(y|0)/P(y|1) from the two Gaussian densities in double precision. */
    @ParameterizedTest
    @ValueSource(doubles = {0.05, 0.5, 1, 7.3})
    void softValuesAreLogLikelihoodRatios(double energy) {
        long[] codeword = new SplittableRandom(1).longs(N).toArray();
        float[] z = new float[64 * N];
        noise().fill(64, z, N);
        LlrBatch received = new LlrBatch(N);
        new GaussianLink(noise(), energy).carry(64, codeword, received);
        double variance = 1 / (2 * energy);
        for (int i = 0; i < N; i++) {
            for (int f = 0; f < 64; f++) {
                double y = 1 - 2 * ((codeword[i] >>> f) & 1) + Math.sqrt(variance) * z[64 * i + f];
                double llr = (-(y - 1) * (y - 1) + (y + 1) * (y + 1)) / (2 * variance);
                assertEquals(llr, received.values()[64 * i + f], 1e-5 * (1 + energy), "E/N0 " + energy);
            }
        }
    }

    @ParameterizedTest
    @ValueSource(doubles = {0.05, 0.5, 1, 7.3, 400, 1e4})
    void hardDecisionsAreTheSignsOfTheSoftValues(double energy) {
        long[] codeword = new SplittableRandom(2).longs(N).toArray();
        LlrBatch soft = new LlrBatch(N);
        LlrBatch hard = new LlrBatch(N);
        new GaussianLink(noise(), energy).carry(0, codeword, soft);
        new HardDecisionLink(noise(), energy).carry(0, codeword, hard);
        double logP = GaussianTail.logQ(Math.sqrt(2 * energy));
        double llr = Math.min(-Math.log(Double.MIN_NORMAL), Math.log1p(-Math.exp(logP)) - logP);
        for (int i = 0; i < 64 * N; i++) {
            assertEquals(soft.values()[i] < 0, hard.values()[i] < 0);
            assertEquals(llr, Math.abs(hard.values()[i]), 1e-6 * llr, "E/N0 " + energy);
        }
    }

    @ParameterizedTest
    @ValueSource(doubles = {0.01, 0.3, 1e-30})
    void fixedCrossoverComparesDrawWithP(double p) {
        long[] codeword = new SplittableRandom(3).longs(N).toArray();
        LlrBatch received = new LlrBatch(N);
        new BinarySymmetricLink(draws(), p).carry(192, codeword, received);
        long[] drawn = new long[64 * N];
        UniformDraws draws = draws();
        draws.start(192);
        draws.next(drawn, N);
        for (int i = 0; i < 64 * N; i++) {
            // Exact enough to tell apart any two draws but those within 2^-53 of p.
            double u = new BigInteger(Long.toUnsignedString(drawn[i])).doubleValue() * 0x1p-64;
            boolean one = ((codeword[i / 64] >>> (i % 64)) & 1) == 1;
            boolean decided = received.values()[i] < 0;
            assertEquals(u < p, one != decided);
            assertEquals(Math.log((1 - p) / p), Math.abs(received.values()[i]), 1e-5);
        }
    }

    @Test
    void thresholdIsTheFloorOfPTimes2To64() {
        assertEquals(1L << 62, BinarySymmetricLink.threshold(0.25));
        assertEquals(0x1999999999999a00L, BinarySymmetricLink.threshold(0.1));
        assertEquals(0, BinarySymmetricLink.threshold(0x1p-65));
        assertEquals(1, BinarySymmetricLink.threshold(0x1.8p-64));
        assertTrue(BinarySymmetricLink.threshold(Math.nextDown(0.5)) > 0);
    }

    /** Pinned: received values that change by a bit, on any machine, need a new revision. */
    @Test
    void receivedValuesStayWhatTheyAre() {
        assertEquals(1, Link.REVISION);
        assertEquals("f054e16", fingerprint(new GaussianLink(noise(), 0.7)));
        assertEquals("20ee2a4b", fingerprint(new HardDecisionLink(noise(), 0.7)));
        assertEquals("b938933c", fingerprint(new BinarySymmetricLink(draws(), 0.11)));
    }

    /** CRC-32C over the bits of the LLRs of 128 frames of 700 bits. */
    private static String fingerprint(Link link) {
        int n = 700;
        long[] codeword = new long[n];
        CRC32C crc = new CRC32C();
        for (int batch = 0; batch < 2; batch++) {
            new Payload(new UniformDraws(new FrameStreams(5, 6, Stream.PAYLOAD))).fill(64L * batch, codeword);
            LlrBatch received = new LlrBatch(n);
            link.carry(64L * batch, codeword, received);
            ByteBuffer bytes = ByteBuffer.allocate(received.values().length * Float.BYTES);
            bytes.asFloatBuffer().put(received.values());
            crc.update(bytes.array());
        }
        return Long.toHexString(crc.getValue());
    }

    private static GaussianNoise noise() {
        return new GaussianNoise(new FrameStreams(5, 6, Stream.NOISE));
    }

    private static UniformDraws draws() {
        return new UniformDraws(new FrameStreams(5, 6, Stream.NOISE));
    }
}
