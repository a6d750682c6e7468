package dev.nearlimit.numerics.functions;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.junit.jupiter.api.Test;

class BoxPlusCorrectionTest {
    private static double exact(double x) {
        return StrictMath.log1p(StrictMath.exp(-x));
    }

    @Test
    void staysWithinItsStatedErrorEverywhere() {
        double worst = 0;
        for (int i = 0; i <= 2_000_000; i++) {
            float x = i * 1e-5f;
            worst = Math.max(worst, Math.abs(BoxPlusCorrection.of(x) - exact(x)));
        }
        assertTrue(worst <= BoxPlusCorrection.MAX_ERROR, "largest error is " + worst);
        // The bound is not generous either: the fit would be broken if it were far from tight.
        assertTrue(worst > 0.9 * BoxPlusCorrection.MAX_ERROR, "largest error is " + worst);
    }

    @Test
    void staysConstantAndTinyBeyondItsRange() {
        float last = BoxPlusCorrection.of(12f);
        assertEquals(4.5e-7f, last, 1e-8f);
        assertEquals(last, BoxPlusCorrection.of(13f));
        assertEquals(last, BoxPlusCorrection.of(1e30f));
        assertEquals(last, BoxPlusCorrection.of(Float.POSITIVE_INFINITY));
    }

    @Test
    void neverRisesByMoreThanARounding() {
        float least = Float.POSITIVE_INFINITY;
        for (int i = 0; i <= 1_300_000; i++) {
            float value = BoxPlusCorrection.of(i * 1e-5f);
            assertTrue(value <= least + 1.2e-7f, "at x = " + i * 1e-5f + ": " + value + " after " + least);
            least = Math.min(least, value);
        }
    }

    @Test
    void anArrayGetsTheSameBitsAsSingleValues() {
        float[] values = new float[517];
        float[] expected = new float[values.length];
        for (int i = 0; i < values.length; i++) {
            values[i] = i * 0.031f;
            expected[i] = i < 510 ? BoxPlusCorrection.of(values[i]) : values[i];
        }
        BoxPlusCorrection.replace(values, 510);
        for (int i = 0; i < values.length; i++) {
            assertEquals(Float.floatToRawIntBits(expected[i]), Float.floatToRawIntBits(values[i]), "value number " + i);
        }
    }
}
