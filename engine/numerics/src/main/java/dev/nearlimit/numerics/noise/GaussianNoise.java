package dev.nearlimit.numerics.noise;

import dev.nearlimit.numerics.kernels.Kernels;
import dev.nearlimit.numerics.kernels.NoiseKernels;
import dev.nearlimit.numerics.kernels.Radius;
import dev.nearlimit.numerics.random.FrameStreams;

/**
 * Gaussian samples of mean 0 and variance 1 for 64 frames: dimension d of frame f is a function of the frame's stream
 * alone. Draw j of the stream makes dimensions 2j (radius times cosine, before the quarter turn) and 2j + 1. A radius
 * draw in the tail is refined with {@link FrameStreams#aside}(frame, j), never from the stream, so that lanes stay in
 * step. Holds buffers, so each thread makes its own; a call allocates nothing.
 */
public final class GaussianNoise {
    /** Raised whenever a sample changes. */
    public static final int REVISION = 1;

    private static final int LANES = FrameStreams.LANES;
    /** 16 rows: 8 KB of draws, 4 KB each of halves and radii, 8 KB of samples stay in the first-level cache. */
    private static final int ROWS = 16;

    private final FrameStreams streams;
    private final NoiseKernels kernels;
    private final long[] state = new long[FrameStreams.STATE_WORDS * LANES];
    private final long[] draws = new long[ROWS * LANES];
    private final int[] high = new int[ROWS * LANES];
    private final int[] low = new int[ROWS * LANES];
    private final float[] radius = new float[ROWS * LANES];
    private final float[] pairs = new float[2 * ROWS * LANES];

    /** Noise from these streams; they must not be shared with another thread. */
    public GaussianNoise(FrameStreams streams) {
        this(streams, Kernels.noise());
    }

    GaussianNoise(FrameStreams streams, NoiseKernels kernels) {
        this.streams = streams;
        this.kernels = kernels;
    }

    /**
     * The first samples of 64 frames.
     *
     * @param firstFrame number of the frame in lane 0
     * @param samples receives dimension d of lane f at 64*d + f
     * @param dimensions samples a frame; of an odd number the last draw's second sample is dropped
     */
    public void fill(long firstFrame, float[] samples, int dimensions) {
        streams.start(firstFrame, state);
        for (int done = 0; done < dimensions; done += 2 * ROWS) {
            int wanted = Math.min(2 * ROWS, dimensions - done);
            nextPairs(firstFrame, done / 2, (wanted + 1) / 2);
            System.arraycopy(pairs, 0, samples, done * LANES, wanted * LANES);
        }
    }

    private void nextPairs(long firstFrame, int firstPair, int rows) {
        int count = rows * LANES;
        kernels.fill(state, draws, rows);
        kernels.split(draws, high, low, count);
        kernels.radius(high, radius, count);
        if (kernels.anyInTail(high, count)) {
            refine(firstFrame, firstPair, count);
        }
        kernels.rotate(low, radius, pairs, count);
    }

    private void refine(long firstFrame, int firstPair, int count) {
        for (int i = 0; i < count; i++) {
            int cell = Radius.cell(high[i]);
            if (cell < Radius.REFINED_CELLS) {
                int position = firstPair + i / LANES;
                radius[i] = Radius.refined(cell, streams.aside(firstFrame + i % LANES, position));
            }
        }
    }
}
