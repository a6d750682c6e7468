package dev.nearlimit.numerics.kernels;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.Arrays;
import java.util.Random;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** Every lane of the kernels against the definition, one check at a time in plain Java; to the bit. */
class LayeredFloatKernelsTest {
    private static final float LARGEST = 1024f;

    private final DecoderKernels kernels = Kernels.decoders().orElseThrow();

    /** Runs of random weight and length; bits of the posteriors, and of the messages but for the sign of a zero. */
    @ParameterizedTest
    @ValueSource(longs = {1, 2, 3, 4, 5, 6, 7, 8, 9, 10, 11, 12, 13, 14, 15, 16})
    void equalTheDefinition(long seed) {
        Random random = new Random(seed);
        int d = 1 + (int) seed % 9;
        int lanes = 64 * (1 + random.nextInt(8));
        int[] bits = new int[d];
        for (int i = 0; i < d; i++) {
            bits[i] = (d - 1 - i) * (lanes + 64) + 64;
        }
        CheckRun run = new CheckRun(bits, 128, lanes);
        float[] posterior = values(random, d * (lanes + 64) + 64);
        float[] message = values(random, 128 + d * lanes + 64);
        FloatCorrection scale = new FloatCorrection((1 + random.nextInt(8)) * 0.125f, 0f, LARGEST);
        FloatCorrection offset = new FloatCorrection(1f, random.nextInt(3) * 0.375f, LARGEST);
        for (FloatCorrection correction : new FloatCorrection[] {null, scale, offset}) {
            float[] expectedPosterior = posterior.clone();
            float[] expectedMessage = message.clone();
            for (int lane = 0; lane < lanes; lane++) {
                check(run, lane, correction, expectedPosterior, expectedMessage);
            }
            float[] scratch = new float[LayeredFloatKernels.scratch(run)];
            Arrays.fill(scratch, Float.NaN);
            if (correction == null) {
                kernels.layeredFloat().sumProduct(run, LARGEST, posterior, message, scratch);
            } else {
                kernels.layeredFloat().minSum(run, correction, posterior, message, scratch);
            }
            String where = "seed " + seed + ", weight " + d + ", " + lanes + " lanes, " + correction + ", value ";
            for (int i = 0; i < posterior.length; i++) {
                assertEquals(
                        Float.floatToRawIntBits(expectedPosterior[i]),
                        Float.floatToRawIntBits(posterior[i]),
                        where + i);
            }
            for (int i = 0; i < message.length; i++) {
                // Adding +0 turns -0 into +0.
                assertEquals(
                        Float.floatToRawIntBits(expectedMessage[i] + 0f),
                        Float.floatToRawIntBits(message[i] + 0f),
                        where + i);
            }
        }
    }

    /** LLRs of all sizes, with ties, zeros and values beyond the largest message; none is -0. */
    private static float[] values(Random random, int count) {
        float[] values = new float[count];
        for (int i = 0; i < count; i++) {
            int kind = random.nextInt(8);
            double value = random.nextGaussian() * (kind == 0 ? 2000 : 4);
            values[i] = (kind == 1 ? 0 : kind < 4 ? Math.round(value) : (float) value) + 0f;
        }
        return values;
    }

    private static void check(CheckRun run, int lane, FloatCorrection correction, float[] posterior, float[] message) {
        int d = run.bits().length;
        float[] t = new float[d];
        for (int i = 0; i < d; i++) {
            t[i] = posterior[run.bits()[i] + lane] - message[run.messages() + i * run.lanes() + lane];
        }
        for (int to = 0; to < d; to++) {
            float m = correction == null ? boxPlus(t, to) : corrected(least(t, to), correction);
            m = Math.max(-LARGEST, Math.min(LARGEST, m));
            message[run.messages() + to * run.lanes() + lane] = m;
            posterior[run.bits()[to] + lane] = t[to] + m;
        }
    }

    /** F_(to-1) (+) B_(to+1). */
    private static float boxPlus(float[] t, int to) {
        int last = t.length - 1;
        if (last == 0) {
            return LARGEST;
        }
        float forward = t[0];
        for (int i = 1; i < to; i++) {
            forward = VectorBoxPlusTest.plain(forward, t[i]);
        }
        float backward = t[last];
        for (int i = last - 1; i > to; i--) {
            backward = VectorBoxPlusTest.plain(backward, t[i]);
        }
        return to == 0 ? backward : to == last ? forward : VectorBoxPlusTest.plain(forward, backward);
    }

    private static float least(float[] t, int to) {
        float least = t.length == 1 ? LARGEST : Float.POSITIVE_INFINITY;
        boolean negative = false;
        for (int i = 0; i < t.length; i++) {
            if (i != to) {
                least = Math.min(least, Math.abs(t[i]));
                negative ^= t[i] < 0;
            }
        }
        return negative ? -least : least;
    }

    private static float corrected(float m, FloatCorrection correction) {
        float scaled = Math.abs(m) * correction.factor();
        return Math.copySign(Math.max(scaled - correction.offset(), 0f), m);
    }

    @ParameterizedTest
    @ValueSource(longs = {1, 2, 3, 4})
    void findLanesWithAnUnsatisfiedCheck(long seed) {
        Random random = new Random(seed);
        int d = 1 + (int) seed;
        int lanes = 64 * (1 + random.nextInt(3));
        int[] bits = new int[d];
        for (int i = 0; i < d; i++) {
            bits[i] = i * lanes;
        }
        float[] posterior = new float[d * lanes];
        for (int i = 0; i < posterior.length; i++) {
            posterior[i] = (float) random.nextGaussian() + 1.5f;
        }
        float[] found = new float[64];
        found[(int) seed] = -0f;
        kernels.layeredFloat().addUnsatisfied(new CheckRun(bits, 0, lanes), posterior, found);
        for (int f = 0; f < 64; f++) {
            boolean unsatisfied = f == seed;
            for (int row = 0; row < lanes; row += 64) {
                boolean odd = false;
                for (int i = 0; i < d; i++) {
                    odd ^= posterior[bits[i] + row + f] < 0;
                }
                unsatisfied |= odd;
            }
            assertEquals(
                    unsatisfied ? 0x80000000 : 0, Float.floatToRawIntBits(found[f]), "seed " + seed + " frame " + f);
        }
    }
}
