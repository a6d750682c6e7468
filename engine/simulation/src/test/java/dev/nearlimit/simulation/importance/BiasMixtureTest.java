package dev.nearlimit.simulation.importance;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import dev.nearlimit.codes.batch.FrameBatch;
import dev.nearlimit.limits.GaussianTail;
import java.util.List;
import java.util.Random;
import java.util.stream.DoubleStream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

class BiasMixtureTest {
    /** Two-sided 3.8e-8 for a normal mean. */
    private static final double SIGMAS = 5.5;

    private static final int N = 12;
    private static final List<ErrorSet> SETS =
            List.of(ErrorSet.of(0, 3, 5), ErrorSet.of(1, 2, 3, 11), ErrorSet.of(7), ErrorSet.of(2, 3, 4, 5, 6, 8));

    /** Straight from the definition: normal densities, sample by sample. */
    @ParameterizedTest
    @ValueSource(longs = {1, 2, 3, 4, 5})
    void weightIsTheRatioOfDensities(long seed) {
        Random random = new Random(seed);
        double sigma = 0.5 + random.nextDouble();
        double[] shifts = {0.5, 1.25};
        BiasMixture mixture = new BiasMixture(weights(SETS), shifts, sigma);
        double[] noise = random.doubles(N, -3, 3).toArray();
        double trueDensity = 1;
        for (double z : noise) {
            trueDensity *= normal(z);
        }
        double biased = 0;
        double[] sums = new double[SETS.size() * FrameBatch.FRAMES];
        int lane = random.nextInt(FrameBatch.FRAMES);
        for (int j = 0; j < SETS.size(); j++) {
            ErrorSet set = SETS.get(j);
            for (int i = 0; i < set.weight(); i++) {
                sums[FrameBatch.softIndex(j, lane)] += noise[set.position(i)];
            }
            for (double shift : shifts) {
                double density = 1;
                for (int i = 0; i < N; i++) {
                    density *= normal(noise[i] + (contains(set, i) ? (float) (shift / sigma) : 0));
                }
                biased += density / (SETS.size() * shifts.length);
            }
        }
        assertEquals(Math.log(trueDensity / biased), mixture.logWeight(sums, lane), 1e-10, "seed " + seed);
    }

    /** Weights have mean 1 under the noise that they are for, whatever was sent: nothing is restricted here. */
    @ParameterizedTest
    @ValueSource(longs = {1, 2, 3})
    void weightsOfBiasedNoiseHaveMeanOne(long seed) {
        BiasMixture mixture = new BiasMixture(weights(SETS), new double[] {0.5, 1}, 1.3);
        double[] weight = sample(seed, 400, mixture, SETS, false);
        double mean = DoubleStream.of(weight).average().orElseThrow();
        double variance =
                DoubleStream.of(weight).map(w -> (w - mean) * (w - mean)).sum() / weight.length;
        assertEquals(1, mean, SIGMAS * Math.sqrt(variance / weight.length), "seed " + seed);
        // The bound must say something: a tenth of a weight, not ten.
        assertTrue(Math.sqrt(variance / weight.length) < 0.02);
    }

    /** One set of weight w leans half way with probability Q(sqrt(w) / (2 sigma)), down to where only logarithms reach. */
    @ParameterizedTest
    @CsvSource({"6, 1.0", "6, 0.3", "6, 0.1", "1, 0.05", "12, 0.09"})
    void probabilityOfLeaningIsThatOfAGaussian(int weight, double sigma) {
        List<ErrorSet> one =
                List.of(ErrorSet.of(java.util.stream.IntStream.range(0, weight).toArray()));
        BiasMixture mixture = new BiasMixture(weights(one), new double[] {0.5, 0.75, 1}, sigma);
        double[] weights = sample(9, 600, mixture, one, true);
        double mean = DoubleStream.of(weights).average().orElseThrow();
        double squares = DoubleStream.of(weights).map(w -> w * w).average().orElseThrow();
        double exact = GaussianTail.q(Math.sqrt(weight) / 2 / sigma);
        double error = Math.sqrt((squares - mean * mean) / weights.length);
        assertEquals(1, mean / exact, SIGMAS * error / exact);
        assertTrue(error < 0.05 * exact, "relative error " + error / exact);
    }

    @Test
    void noFrameHalfWayWeighsMoreThanTheBound() {
        for (double sigma : new double[] {0.2, 0.5, 1}) {
            BiasMixture mixture = new BiasMixture(weights(SETS), new double[] {0.5, 0.75, 1.5}, sigma);
            double bound = mixture.largestWeightHalfWay();
            double largest =
                    DoubleStream.of(sample(4, 200, mixture, SETS, true)).max().orElseThrow();
            assertTrue(largest <= bound, largest + " above " + bound);
            assertTrue(largest > 0);
        }
    }

    /** Each frame's distribution is drawn evenly: 36 counts, chi-square quantile at 1e-7 of 35 degrees is 104. */
    @Test
    void distributionsAreDrawnEquallyOften() {
        List<ErrorSet> sets =
                java.util.stream.IntStream.range(0, N).mapToObj(ErrorSet::of).toList();
        // Shifts so large that each frame shows which distribution it came from.
        BiasMixture mixture = new BiasMixture(weights(sets), new double[] {100, 200, 300}, 1);
        BiasedNoise noise = new BiasedNoise(5, 0, mixture, sets, N);
        float[] samples = new float[N * FrameBatch.FRAMES];
        int[] counts = new int[3 * N];
        int batches = 600;
        for (int b = 0; b < batches; b++) {
            noise.fill(64L * b, new long[N], samples);
            for (int i = 0; i < samples.length; i++) {
                int shift = Math.round(-samples[i] / 100);
                if (shift > 0) {
                    counts[3 * (i / FrameBatch.FRAMES) + shift - 1]++;
                }
            }
        }
        double expected = 64.0 * batches / counts.length;
        double chiSquare = 0;
        for (int count : counts) {
            chiSquare += (count - expected) * (count - expected) / expected;
        }
        assertTrue(chiSquare < 104, "chi-square " + chiSquare);
        assertEquals(64 * batches, java.util.stream.IntStream.of(counts).sum());
    }

    /** Weights of frames of random words; 0 where leaning is asked for and the frame does not. */
    private static double[] sample(long seed, int batches, BiasMixture mixture, List<ErrorSet> sets, boolean leaning) {
        BiasedNoise noise = new BiasedNoise(seed, 1_000_000, mixture, sets, N);
        Random random = new Random(seed);
        float[] samples = new float[N * FrameBatch.FRAMES];
        double[] weights = new double[batches * FrameBatch.FRAMES];
        for (int b = 0; b < batches; b++) {
            long[] codeword = random.longs(N).toArray();
            noise.fill((long) b * FrameBatch.FRAMES, codeword, samples);
            double[] sums = noise.sums(codeword, samples);
            for (int f = 0; f < FrameBatch.FRAMES; f++) {
                boolean counts = !leaning;
                for (int j = 0; j < sets.size(); j++) {
                    counts |= mixture.lean(j, sums[FrameBatch.softIndex(j, f)]) >= 0.5;
                }
                weights[b * FrameBatch.FRAMES + f] = counts ? Math.exp(mixture.logWeight(sums, f)) : 0;
            }
        }
        return weights;
    }

    private static int[] weights(List<ErrorSet> sets) {
        return sets.stream().mapToInt(ErrorSet::weight).toArray();
    }

    private static boolean contains(ErrorSet set, int position) {
        for (int i = 0; i < set.weight(); i++) {
            if (set.position(i) == position) {
                return true;
            }
        }
        return false;
    }

    private static double normal(double z) {
        return Math.exp(-0.5 * z * z) / Math.sqrt(2 * Math.PI);
    }
}
