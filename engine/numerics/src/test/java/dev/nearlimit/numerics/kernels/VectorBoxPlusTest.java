package dev.nearlimit.numerics.kernels;

import static org.junit.jupiter.api.Assertions.assertEquals;

import dev.nearlimit.numerics.functions.BoxPlusCorrection;
import java.util.Random;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** The vector form of box-plus gives the bits of the plain one. */
class VectorBoxPlusTest {
    private static final int LANES = 64;

    /** As {@link LayeredFloatKernels#sumProduct} defines it, in plain Java. */
    static float plain(float a, float b) {
        float lesser = Math.max(Math.min(a, b), -Math.max(a, b));
        return lesser + (BoxPlusCorrection.of(Math.abs(a + b)) - BoxPlusCorrection.of(Math.abs(a - b)));
    }

    private static void compare(float[] a, float[] b, String where) {
        float[] result = new float[3 * LANES];
        VectorBoxPlus.combine(a, 0, b, 0, result, LANES, LANES, new float[2 * LANES], 0);
        for (int l = 0; l < LANES; l++) {
            assertEquals(
                    Float.floatToRawIntBits(plain(a[l], b[l])),
                    Float.floatToRawIntBits(result[LANES + l]),
                    where + ": " + a[l] + " (+) " + b[l]);
            assertEquals(0f, result[l], where);
            assertEquals(0f, result[2 * LANES + l], where);
        }
    }

    @ParameterizedTest
    @ValueSource(longs = {1, 2, 3, 4})
    void equalsThePlainFormOnRandomValuesOfEverySize(long seed) {
        Random random = new Random(seed);
        float[] a = new float[LANES];
        float[] b = new float[LANES];
        for (int trial = 0; trial < 1000; trial++) {
            for (int l = 0; l < LANES; l++) {
                a[l] = (float) (random.nextGaussian() * Math.scalb(1.0, random.nextInt(28) - 14));
                b[l] = random.nextInt(16) == 0
                        ? (random.nextBoolean() ? a[l] : -a[l])
                        : (float) (random.nextGaussian() * Math.scalb(1.0, random.nextInt(28) - 14));
            }
            compare(a, b, "seed " + seed);
        }
    }

    @Test
    void equalsThePlainFormOnPairsOfSpecialValues() {
        float[] special = {
            0f,
            -0f,
            Float.MIN_VALUE,
            -Float.MIN_VALUE,
            Float.MIN_NORMAL,
            1e-20f,
            1f,
            -1f,
            6f,
            -6f,
            11.999999f,
            12f,
            12.000001f,
            -12f,
            1024f,
            -1024f,
            1e6f,
            -1e30f
        };
        float[] a = new float[LANES];
        float[] b = new float[LANES];
        for (float x : special) {
            for (int l = 0; l < LANES; l++) {
                a[l] = x;
                b[l] = special[l % special.length];
            }
            compare(a, b, "special");
            compare(b, a, "special");
        }
    }

    @Test
    void takesTheResultInThePlaceOfAnOperand() {
        float[] values = new float[2 * LANES];
        Random random = new Random(5);
        for (int l = 0; l < values.length; l++) {
            values[l] = (float) (3 * random.nextGaussian());
        }
        float[] before = values.clone();
        VectorBoxPlus.combine(values, LANES, values, 0, values, LANES, LANES, new float[2 * LANES], 0);
        for (int l = 0; l < LANES; l++) {
            assertEquals(before[l], values[l]);
            assertEquals(plain(before[LANES + l], before[l]), values[LANES + l]);
        }
    }
}
