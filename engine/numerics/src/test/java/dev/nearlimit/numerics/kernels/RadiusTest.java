package dev.nearlimit.numerics.kernels;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.SplittableRandom;
import org.apache.commons.math3.special.Erf;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

class RadiusTest {
    /** Against StrictMath over all exponents and densely over mantissas. */
    @Test
    void logarithmIsAsAccurateAsStated() {
        for (int exponent = -64; exponent <= 30; exponent++) {
            for (int i = 0; i < 5_000; i++) {
                float w = Float.intBitsToFloat(((exponent + 127) << 23) + (int) (i * (0x800000L / 5_000)) + i % 7);
                double exact = StrictMath.log((double) w * 0x1p-31);
                double error = Math.abs(Radius.logarithmOfScaled(w) - exact);
                assertTrue(error < 2e-7 + 0x1p-23 * Math.abs(exact), () -> "w " + w + ", error " + error);
            }
        }
        assertEquals(0f, Radius.ofScaled(0x1p31f));
    }

    @Test
    void sineAndCosineAreAsAccurateAsSinglePrecisionAllows() {
        for (int i = -100_000; i <= 100_000; i++) {
            float t = (float) (i * (Math.PI / 4 / 100_000));
            assertEquals(StrictMath.sin(t), PlainNoiseKernels.sine(t, t * t), 1.0e-7, () -> "t " + t);
            assertEquals(StrictMath.cos(t), PlainNoiseKernels.cosine(t * t), 1.2e-7, () -> "t " + t);
        }
    }

    /** Inside the tail the radius follows its 95 bits and never grows with u. */
    @Test
    void refinedRadiusIsFineAndMonotone() {
        float before = Float.POSITIVE_INFINITY;
        for (int cell = 0; cell < Radius.REFINED_CELLS; cell++) {
            for (int i = 0; i < 256; i++) {
                long bits = ((long) i << 56) | 0x123456789abcdL;
                double u = (cell + (bits >>> 11) * 0x1p-53) * 0x1p-31;
                float radius = Radius.refined(cell, bits);
                assertEquals(StrictMath.sqrt(-2 * StrictMath.log(u)), radius, 2e-6, "cell " + cell + ", part " + i);
                assertTrue(radius <= before, "cell " + cell + ", part " + i);
                before = radius;
            }
        }
        double largest = StrictMath.sqrt(2 * 95 * StrictMath.log(2));
        assertEquals(largest, Radius.refined(0, 0), 1e-5);
    }

    /**
     * The probability of a sample beyond x, integrated over the construction itself rather than drawn: for each of 2^14
     * evenly spread angles the share of radius draws that reach x, found by bisection over cells and bits. Nothing is
     * random here. Beyond 5.9 sigma every draw that counts is a refined one.
     */
    @ParameterizedTest
    @ValueSource(doubles = {5.9, 6, 6.5, 7, 7.5, 8, 9, 10})
    void tailIsThatOfTheNormalDistribution(double x) {
        PlainNoiseKernels kernels = new PlainNoiseKernels();
        int angles = 1 << 14;
        int[] low = new int[angles];
        float[] ones = new float[angles];
        float[] unit = new float[2 * angles];
        for (int i = 0; i < angles; i++) {
            low[i] = (i << 18) + (1 << 17);
            ones[i] = 1f;
        }
        kernels.rotate(low, ones, unit, 0, angles);
        double above = 0;
        double below = 0;
        for (float s : unit) {
            if (s > 0) {
                above += shareOfRadiiBeyond(x / s);
            } else {
                below += shareOfRadiiBeyond(x / -s);
            }
        }
        double exact = Erf.erfc(x / Math.sqrt(2)) / 2;
        assertEquals(1, above / unit.length / exact, 2e-4, "upper tail at " + x);
        assertEquals(1, below / unit.length / exact, 2e-4, "lower tail at " + x);
    }

    /** Share of (cell, bits) whose radius exceeds r; the radius falls as u grows. */
    private static double shareOfRadiiBeyond(double r) {
        double share = 0;
        for (int cell = 0; cell < Radius.REFINED_CELLS; cell++) {
            if (Radius.refined(cell, -1L) > r) {
                share += 0x1p-31;
                continue;
            }
            long reached = 0;
            for (int bit = 63; bit >= 0; bit--) {
                long candidate = reached | (1L << bit);
                if (Radius.refined(cell, candidate) > r) {
                    reached = candidate;
                }
            }
            return share + ((reached >>> 1) * 0x1p-63 + 0x1p-64) * 0x1p-31;
        }
        throw new AssertionError("radius " + r + " lies outside the refined tail");
    }

    @Test
    void cellsMeetWithoutGap() {
        // The first cell that is not refined continues where the last refined one ends.
        float last = Radius.refined(Radius.REFINED_CELLS - 1, -1L);
        float next = Radius.ofDraw(Radius.REFINED_CELLS << 1);
        assertTrue(last > next && last - next < 0.002f, last + " then " + next);
    }

    @Test
    void findsTailDrawsAndNothingElse() {
        PlainNoiseKernels kernels = new PlainNoiseKernels();
        SplittableRandom random = new SplittableRandom(4);
        int[] high = random.ints(128, 128, Integer.MAX_VALUE).toArray();
        high[3] = -1;
        high[4] = Integer.MIN_VALUE;
        high[5] = 128;
        assertEquals(false, kernels.radius(high, new float[128], new float[128], 128));
        for (int draw : new int[] {0, 1, 127}) {
            high[77] = draw;
            assertEquals(true, kernels.radius(high, new float[128], new float[128], 128), "draw " + draw);
        }
    }
}
