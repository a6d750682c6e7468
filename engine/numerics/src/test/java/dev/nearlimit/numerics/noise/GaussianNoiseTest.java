package dev.nearlimit.numerics.noise;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import dev.nearlimit.numerics.kernels.Kernels;
import dev.nearlimit.numerics.kernels.NoiseKernels;
import dev.nearlimit.numerics.random.FrameStreams;
import dev.nearlimit.numerics.random.Stream;
import java.util.SplittableRandom;
import org.apache.commons.math3.special.Erf;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

class GaussianNoiseTest {
    /** Deviations beyond this many sigma have probability 3.8e-8 (two-sided), the false-alarm rate of one check. */
    private static final double SIGMAS = 5.5;

    @ParameterizedTest
    @CsvSource({"1, 0, 0, 1", "2, 1000000, 64, 2", "3, -5, 4294967290, 33", "-4, 7, 1000000007, 200"})
    void everyLaneEqualsItsTwinToTheBit(long seed, long point, long firstFrame, int dimensions) {
        FrameStreams streams = new FrameStreams(seed, point, Stream.NOISE);
        float[] samples = new float[64 * dimensions];
        new GaussianNoise(streams).fill(firstFrame, samples, dimensions);
        for (int lane = 0; lane < 64; lane++) {
            float[] twin = GaussianTwin.samples(streams, firstFrame + lane, dimensions);
            for (int d = 0; d < dimensions; d++) {
                assertEquals(
                        Float.floatToRawIntBits(twin[d]),
                        Float.floatToRawIntBits(samples[64 * d + lane]),
                        "seed " + seed + ", lane " + lane + ", dimension " + d);
            }
        }
    }

    /** Draws in the tail are forced, since one comes by only once in 3 * 10^7. */
    @ParameterizedTest
    @ValueSource(longs = {1, 2, 3})
    void drawsInTheTailAreRefinedByFrameAndPosition(long seed) {
        int rows = 40;
        SplittableRandom random = new SplittableRandom(seed);
        long[] forced = new long[64 * rows];
        for (int i = 0; i < forced.length; i++) {
            long draw = random.nextLong();
            forced[i] = random.nextInt(3) == 0 ? (draw & 0xFFFFFFFFL) | ((long) random.nextInt(140) << 32) : draw;
        }
        FrameStreams streams = new FrameStreams(seed, 12, Stream.NOISE);
        float[] samples = new float[128 * rows];
        new GaussianNoise(streams, new ForcedDraws(forced)).fill(640, samples, 2 * rows);
        for (int i = 0; i < forced.length; i++) {
            int row = i / 64;
            int lane = i % 64;
            float[] twin = GaussianTwin.pair(forced[i], streams.aside(640 + lane, row));
            assertEquals(twin[0], samples[128 * row + lane], "seed " + seed + ", draw " + i);
            assertEquals(twin[1], samples[128 * row + 64 + lane], "seed " + seed + ", draw " + i);
        }
    }

    @Test
    void fewerDimensionsAreAPrefixOfMore() {
        float[] few = new float[64 * 7];
        float[] many = new float[64 * 100];
        new GaussianNoise(new FrameStreams(5, 5, Stream.NOISE)).fill(0, few, 7);
        new GaussianNoise(new FrameStreams(5, 5, Stream.NOISE)).fill(0, many, 100);
        for (int i = 0; i < few.length; i++) {
            assertEquals(many[i], few[i]);
        }
    }

    /** Each axis on its own: an axis that takes only some of the quarter turns would still average right. */
    @ParameterizedTest
    @ValueSource(ints = {0, 1})
    void momentsOfEachAxisAreThoseOfTheNormalDistribution(int axis) {
        float[] samples = draw(11, 4000, 256);
        double[] sums = new double[5];
        long count = 0;
        for (int d = axis; d < 256; d += 2) {
            for (int block = 0; block < 4000 / 64; block++) {
                for (int lane = 0; lane < 64; lane++) {
                    double x = samples[(block * 256 + d) * 64 + lane];
                    double power = 1;
                    for (int m = 1; m <= 4; m++) {
                        power *= x;
                        sums[m] += power;
                    }
                    count++;
                }
            }
        }
        // Variances of x, x^2, x^3, x^4 for a normal x are 1, 2, 15, 96. Four checks on two axes: 3e-7 in all.
        double[] mean = {1, 0, 1, 0, 3};
        double[] variance = {0, 1, 2, 15, 96};
        for (int m = 1; m <= 4; m++) {
            assertEquals(mean[m], sums[m] / count, SIGMAS * Math.sqrt(variance[m] / count), "moment " + m);
        }
    }

    /** Counts beyond a threshold are binomial; ten checks of 3.8e-8 each (a little more where counts are small). */
    @Test
    void countsBeyondEachThresholdAreRight() {
        float[] samples = draw(12, 16_000, 256);
        for (double x : new double[] {0.1, 0.5, 1, 2, 3}) {
            long above = 0;
            long below = 0;
            for (float s : samples) {
                above += s > x ? 1 : 0;
                below += s < -x ? 1 : 0;
            }
            double q = Erf.erfc(x / Math.sqrt(2)) / 2;
            double expected = q * samples.length;
            double allowed = SIGMAS * Math.sqrt(expected * (1 - q));
            assertEquals(expected, above, allowed, "above " + x);
            assertEquals(expected, below, allowed, "below " + -x);
        }
    }

    /** The angle is even over 16 sectors: chi-square with 15 degrees of freedom exceeds 75 with probability 6e-10. */
    @Test
    void anglesAreEvenAroundTheCircle() {
        float[] samples = draw(13, 4032, 256);
        long[] sectors = new long[16];
        for (int row = 0; row < samples.length / 64; row += 2) {
            for (int lane = 0; lane < 64; lane++) {
                double angle = Math.atan2(samples[64 * row + 64 + lane], samples[64 * row + lane]);
                sectors[(int) Math.floor((angle + Math.PI) / (2 * Math.PI) * 16) & 15]++;
            }
        }
        double expected = samples.length / 2.0 / 16;
        double chiSquare = 0;
        for (long count : sectors) {
            chiSquare += (count - expected) * (count - expected) / expected;
        }
        assertTrue(chiSquare < 75, "chi-square " + chiSquare);
    }

    /** Products of independent normal samples have mean 0 and variance 1. Five checks of 3.8e-8 each. */
    @Test
    void framesPositionsStreamsPointsAndSeedsAreUncorrelated() {
        int dimensions = 4096;
        float[] base = one(1, 100, Stream.NOISE, 0, dimensions);
        uncorrelated("next frame", base, 0, base, 1, dimensions);
        uncorrelated("next position", base, 0, base, 64, dimensions);
        uncorrelated("fading stream", base, 0, one(1, 100, Stream.FADING, 0, dimensions), 0, dimensions);
        uncorrelated("next point", base, 0, one(1, 101, Stream.NOISE, 0, dimensions), 0, dimensions);
        uncorrelated("next seed", base, 0, one(2, 100, Stream.NOISE, 0, dimensions), 0, dimensions);
    }

    private static void uncorrelated(String what, float[] a, int fromA, float[] b, int fromB, int dimensions) {
        double sum = 0;
        int count = 64 * dimensions - Math.max(fromA, fromB);
        for (int i = 0; i < count; i++) {
            sum += (double) a[fromA + i] * b[fromB + i];
        }
        assertEquals(0, sum / count, SIGMAS / Math.sqrt(count), what);
    }

    private static float[] one(long seed, long point, Stream stream, long firstFrame, int dimensions) {
        float[] samples = new float[64 * dimensions];
        new GaussianNoise(new FrameStreams(seed, point, stream)).fill(firstFrame, samples, dimensions);
        return samples;
    }

    /** Batches of 64 frames one after another, each of so many dimensions. */
    private static float[] draw(long seed, int frames, int dimensions) {
        GaussianNoise noise = new GaussianNoise(new FrameStreams(seed, 0, Stream.NOISE));
        int batches = frames / 64;
        float[] all = new float[batches * 64 * dimensions];
        float[] batch = new float[64 * dimensions];
        for (int b = 0; b < batches; b++) {
            noise.fill(64L * b, batch, dimensions);
            System.arraycopy(batch, 0, all, b * batch.length, batch.length);
        }
        return all;
    }

    /** The plain kernels, but for draws that a test chooses. */
    private static final class ForcedDraws implements NoiseKernels {
        private final NoiseKernels plain = Kernels.noise();
        private final long[] forced;
        private int next;

        ForcedDraws(long[] forced) {
            this.forced = forced;
        }

        @Override
        public String name() {
            return "forced";
        }

        @Override
        public void fill(long[] state, long[] draws, int steps) {
            System.arraycopy(forced, next, draws, 0, 64 * steps);
            next += 64 * steps;
        }

        @Override
        public void halves(long[] state, int[] high, int[] low, int steps) {
            for (int i = 0; i < 64 * steps; i++) {
                long draw = forced[next++];
                high[i] = (int) (draw >>> 32);
                low[i] = (int) draw;
            }
        }

        @Override
        public boolean radius(int[] high, float[] radius, float[] scratch, int count) {
            return plain.radius(high, radius, scratch, count);
        }

        @Override
        public void rotate(int[] low, float[] radius, float[] samples, int at, int count) {
            plain.rotate(low, radius, samples, at, count);
        }
    }
}
