package dev.nearlimit.numerics.kernels;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Random;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/**
 * The vector passes give the bits of the plain ones. Arrays are longer than what is asked for, so that a pass that writes
 * beyond its end shows in the words that follow.
 */
class VectorNoiseKernelsTest {
    private static final int GUARD = 70;
    private static final int[] EDGES = {
        0, 1, 2, 3, 127, 128, 129, -1, -2, Integer.MAX_VALUE, Integer.MIN_VALUE, Integer.MIN_VALUE + 1, 1 << 30, 3 << 30
    };

    private final NoiseKernels plain = new PlainNoiseKernels();
    private final NoiseKernels vector = new VectorNoiseKernels();

    @ParameterizedTest
    @ValueSource(ints = {0, 1, 2, 3, 15, 16, 33})
    void fillsWithTheSameDraws(int steps) {
        Random random = new Random(steps);
        long[] state = random.longs(256 + GUARD).toArray();
        state[0] = 0;
        state[64] = -1;
        long[] draws = random.longs(64 * steps + GUARD).toArray();
        long[] expectedState = state.clone();
        long[] expected = draws.clone();
        plain.fill(expectedState, expected, steps);
        vector.fill(state, draws, steps);
        assertArrayEquals(expected, draws, steps + " steps");
        assertArrayEquals(expectedState, state, steps + " steps");
    }

    /** Halves of the draws that the generator itself gives, lane by lane. */
    @ParameterizedTest
    @ValueSource(ints = {0, 1, 2, 15, 16, 33})
    void halvesAreThoseOfTheDraws(int steps) {
        Random random = new Random(steps);
        long[] straight = random.longs(256).toArray();
        long[] state = new long[256 + GUARD];
        for (int i = 0; i < 256; i++) {
            int lane = i % 64;
            state[i - lane + lane / 2 + lane % 2 * 32] = straight[i];
        }
        long[] other = state.clone();
        long[] draws = new long[64 * steps];
        plain.fill(straight, draws, steps);
        int[][] high = pair(random.ints(64 * steps + GUARD).toArray());
        int[][] low = pair(random.ints(64 * steps + GUARD).toArray());
        plain.halves(state, high[0], low[0], steps);
        vector.halves(other, high[1], low[1], steps);
        assertArrayEquals(state, other);
        assertArrayEquals(high[0], high[1]);
        assertArrayEquals(low[0], low[1]);
        for (int i = 0; i < draws.length; i++) {
            assertEquals(draws[i], (long) high[0][i] << 32 | (low[0][i] & 0xFFFFFFFFL), "draw " + i);
        }
    }

    @ParameterizedTest
    @ValueSource(ints = {0, 64, 128, 1024, 64 * 33})
    void everyPassGivesTheSameBits(int count) {
        for (long seed = 1; seed <= 20; seed++) {
            Random random = new Random(seed);
            String where = count + " draws, seed " + seed;
            long[] draws = random.longs(count + GUARD).toArray();
            for (int i = 0; i < count; i += 5) {
                int other = random.nextInt();
                int edge = EDGES[random.nextInt(EDGES.length)];
                draws[i] = i % 2 == 0
                        ? (long) edge << 32 | (other & 0xFFFFFFFFL)
                        : (long) other << 32 | (edge & 0xFFFFFFFFL);
            }
            int[][] high = pair(random.ints(count + GUARD).toArray());
            int[][] low = pair(random.ints(count + GUARD).toArray());
            for (int i = 0; i < count; i++) {
                high[0][i] = high[1][i] = (int) (draws[i] >>> 32);
                low[0][i] = low[1][i] = (int) draws[i];
            }

            float[][] radius = guarded(count);
            plain.radius(high[0], radius[0], new float[count], count);
            vector.radius(high[0], radius[1], new float[count], count);
            assertSameBits(radius[0], radius[1], where);

            float[][] samples = guarded(2 * count);
            plain.rotate(low[0], radius[0], samples[0], 3, count);
            vector.rotate(low[0], radius[0], samples[1], 3, count);
            assertSameBits(samples[0], samples[1], where);
        }
    }

    /** Every exponent that a draw can have, with mantissas all over. */
    @Test
    void radiusHasTheSameBitsForDrawsOfEverySize() {
        Random random = new Random(7);
        int[] high = new int[32 * 64];
        for (int round = 0; round < 200; round++) {
            for (int i = 0; i < high.length; i++) {
                high[i] = random.nextInt() >>> (i % 32);
            }
            float[][] radius = guarded(high.length);
            plain.radius(high, radius[0], new float[high.length], high.length);
            vector.radius(high, radius[1], new float[high.length], high.length);
            assertSameBits(radius[0], radius[1], "seed 7, round " + round);
        }
    }

    @ParameterizedTest
    @ValueSource(ints = {64, 128, 1024})
    void findsTheTailWhereverItStands(int count) {
        Random random = new Random(count);
        int[] high = random.ints(count + GUARD, 128, Integer.MAX_VALUE).toArray();
        float[] radius = new float[count];
        high[count] = 0; // beyond what is asked for
        high[1] = -1;
        high[2] = 128;
        high[3] = Integer.MIN_VALUE;
        assertEquals(false, vector.radius(high, radius, new float[count], count));
        for (int i = 0; i < count; i++) {
            int kept = high[i];
            high[i] = random.nextInt(128);
            assertTrue(vector.radius(high, radius, new float[count], count), "draw " + i + " of " + count);
            high[i] = kept;
        }
    }

    private static int[][] pair(int[] values) {
        return new int[][] {values, values.clone()};
    }

    private static float[][] guarded(int count) {
        float[] values = new float[count + GUARD];
        java.util.Arrays.fill(values, 12345.678f);
        return new float[][] {values, values.clone()};
    }

    private static void assertSameBits(float[] expected, float[] actual, String where) {
        // Unlike a comparison of floats this tells -0 from +0.
        int[] bits = new int[expected.length];
        int[] actualBits = new int[expected.length];
        for (int i = 0; i < bits.length; i++) {
            bits[i] = Float.floatToRawIntBits(expected[i]);
            actualBits[i] = Float.floatToRawIntBits(actual[i]);
        }
        assertArrayEquals(bits, actualBits, where);
    }
}
