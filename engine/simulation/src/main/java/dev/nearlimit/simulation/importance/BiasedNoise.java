package dev.nearlimit.simulation.importance;

import dev.nearlimit.codes.batch.FrameBatch;
import dev.nearlimit.numerics.noise.GaussianNoise;
import dev.nearlimit.numerics.random.FrameStreams;
import dev.nearlimit.numerics.random.Stream;
import java.util.Arrays;
import java.util.List;

/**
 * Noise of 64 frames, each biased towards one set. The noise before the bias is that of the same frames in a plain
 * simulation. Frame f takes distribution floor(C (u / 2^63)), u being the upper 63 bits of the number that its selection
 * stream keeps aside at position 0. Holds buffers, so each thread makes its own; a call allocates nothing.
 */
final class BiasedNoise {
    private final GaussianNoise noise;
    private final FrameStreams selection;
    private final BiasMixture mixture;
    private final List<ErrorSet> sets;
    /** Samples times the sent signs. */
    private final double[] turned;

    private final double[] sums;

    /** @param n length of the code */
    BiasedNoise(long seed, long ebn0MicroDb, BiasMixture mixture, List<ErrorSet> sets, int n) {
        this.noise = new GaussianNoise(new FrameStreams(seed, ebn0MicroDb, Stream.NOISE));
        this.selection = new FrameStreams(seed, ebn0MicroDb, Stream.SELECTION);
        this.mixture = mixture;
        this.sets = sets;
        this.turned = new double[n * FrameBatch.FRAMES];
        this.sums = new double[sets.size() * FrameBatch.FRAMES];
    }

    /**
     * Noise of unit variance about its biased mean.
     *
     * @param codeword n words, bit f of word i being code bit i of frame f
     * @param samples receives n*64 samples
     */
    void fill(long firstFrame, long[] codeword, float[] samples) {
        noise.fill(firstFrame, samples, codeword.length);
        for (int f = 0; f < FrameBatch.FRAMES; f++) {
            int distribution = distributionOf(firstFrame + f);
            ErrorSet set = sets.get(mixture.set(distribution));
            float shift = mixture.noiseShift(distribution);
            for (int i = 0; i < set.weight(); i++) {
                int position = set.position(i);
                boolean one = (codeword[position] >>> f & 1) != 0;
                samples[FrameBatch.softIndex(position, f)] += one ? shift : -shift;
            }
        }
    }

    private int distributionOf(long frame) {
        return (int) Math.multiplyHigh(selection.aside(frame, 0) >>> 1, 2L * mixture.size());
    }

    /**
     * Sums over every set of the samples times the sent signs.
     *
     * @param samples as {@link #fill} left them
     * @return the live array, lane f of set j at 64*j + f
     */
    double[] sums(long[] codeword, float[] samples) {
        for (int i = 0; i < codeword.length; i++) {
            turn(codeword[i], samples, FrameBatch.softIndex(i, 0));
        }
        Arrays.fill(sums, 0);
        for (int j = 0; j < sets.size(); j++) {
            ErrorSet set = sets.get(j);
            for (int i = 0; i < set.weight(); i++) {
                add(FrameBatch.softIndex(set.position(i), 0), FrameBatch.softIndex(j, 0));
            }
        }
        return sums;
    }

    private void turn(long bits, float[] samples, int at) {
        for (int f = 0; f < FrameBatch.FRAMES; f++) {
            turned[at + f] = (1 - 2 * (int) (bits >>> f & 1)) * samples[at + f];
        }
    }

    private void add(int from, int to) {
        for (int f = 0; f < FrameBatch.FRAMES; f++) {
            sums[to + f] += turned[from + f];
        }
    }
}
