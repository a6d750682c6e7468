package dev.nearlimit.numerics.kernels;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.Random;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** The vector passes give the bits of the plain ones, and write nothing beyond their end. */
class VectorReceptionKernelsTest {
    private static final int AT = 5;
    private static final int GUARD = 70;

    private final ReceptionKernels plain = new PlainReceptionKernels();
    private final ReceptionKernels vector = new VectorReceptionKernels();

    @ParameterizedTest
    @ValueSource(ints = {0, 1, 2, 7, 32})
    void demapsAlike(int positions) {
        for (long seed = 1; seed <= 20; seed++) {
            Random random = new Random(seed);
            long[] bits = random.longs(3 + positions).toArray();
            float[] values = values(random, AT + 64 * positions + GUARD, 3f);
            float[] expected = values.clone();
            float sigma = random.nextFloat();
            float scale = 10 * random.nextFloat();
            plain.demap(bits, 3, positions, sigma, scale, expected, AT);
            vector.demap(bits, 3, positions, sigma, scale, values, AT);
            assertSameBits(expected, values, "seed " + seed);
        }
    }

    @ParameterizedTest
    @ValueSource(floats = {0.25f, 0.5f, 1f, 2f, 0.3f, 0.1f, 1.7f, 1e-3f, 123f})
    void quantisesAlike(float step) {
        for (int rail = 1; rail <= 127; rail += rail < 16 ? 1 : 37) {
            for (int count : new int[] {0, 64, 640}) {
                Random random = new Random(rail);
                float[] values = values(random, AT + count + GUARD, step * rail);
                onThresholds(random, values, step);
                String where = "step " + step + ", rail " + rail + ", " + count + " values";
                float[][] result = {values.clone(), values.clone(), values.clone(), values.clone()};
                byte[][] levels = new byte[4][count + GUARD];
                plain.midTread(result[0], AT, count, step, rail, levels[0], 2);
                vector.midTread(result[1], AT, count, step, rail, levels[1], 2);
                assertArrayEquals(levels[0], levels[1], where);
                assertSameBits(result[0], result[1], where);
                int rise = Math.min(63, rail - 1);
                plain.midRise(result[2], AT, count, step, rise, levels[2], 2);
                vector.midRise(result[3], AT, count, step, rise, levels[3], 2);
                assertArrayEquals(levels[2], levels[3], where);
                assertSameBits(result[2], result[3], where);
            }
        }
    }

    /** A value one rounding below a threshold is below it; adding 1/2 and cutting off would not know. */
    @Test
    void valuesNextToAThresholdStayOnTheirSide() {
        float[] values = new float[64];
        values[0] = Math.nextDown(0.5f);
        values[1] = 0.5f;
        values[2] = -Math.nextDown(1.5f);
        values[3] = -1.5f;
        values[4] = Math.nextDown(2.5f);
        values[5] = 2.5f;
        byte[] levels = new byte[64];
        vector.midTread(values, 0, 64, 1f, 7, levels, 0);
        assertEquals(0, levels[0]);
        assertEquals(1, levels[1]);
        assertEquals(-1, levels[2]);
        assertEquals(-2, levels[3]);
        assertEquals(2, levels[4]);
        assertEquals(3, levels[5]);
    }

    private static float[] values(Random random, int count, float spread) {
        float[] values = new float[count];
        for (int i = 0; i < count; i++) {
            values[i] = (float) random.nextGaussian() * spread;
        }
        return values;
    }

    private static void onThresholds(Random random, float[] values, float step) {
        for (int i = 0; i < values.length; i += 2) {
            float threshold = (random.nextInt(21) - 10) * 0.5f * step;
            int side = random.nextInt(3);
            values[i] = side == 0 ? Math.nextDown(threshold) : side == 1 ? Math.nextUp(threshold) : threshold;
        }
        values[AT] = -0f;
        values[AT + 1] = 0f;
        values[AT + 2] = Float.MAX_VALUE;
        values[AT + 3] = -Float.MAX_VALUE;
        values[AT + 4] = -Float.MIN_VALUE;
    }

    private static void assertSameBits(float[] expected, float[] actual, String where) {
        int[] bits = new int[expected.length];
        int[] actualBits = new int[expected.length];
        for (int i = 0; i < bits.length; i++) {
            bits[i] = Float.floatToRawIntBits(expected[i]);
            actualBits[i] = Float.floatToRawIntBits(actual[i]);
        }
        assertArrayEquals(bits, actualBits, where);
    }
}
