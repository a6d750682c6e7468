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
    /** 16 rows: 4 KB each of halves and radii, 8 KB of samples stay in the first-level cache. */
    private static final int ROWS = 16;

    private final FrameStreams streams;
    private final NoiseKernels kernels;
    private final long[] state = new long[FrameStreams.STATE_WORDS * LANES];
    private final long[] straight = new long[state.length];
    private final int[] high = new int[ROWS * LANES];
    private final int[] low = new int[ROWS * LANES];
    private final float[] radius = new float[ROWS * LANES];
    private final float[] scratch = new float[ROWS * LANES];
    private final float[] lastPair = new float[2 * LANES];
    private long frame;
    private int pairsDone;

    /** Noise from these streams; they must not be shared with another thread. */
    public GaussianNoise(FrameStreams streams) {
        this(streams, Kernels.noise());
    }

    GaussianNoise(FrameStreams streams, NoiseKernels kernels) {
        this.streams = streams;
        this.kernels = kernels;
    }

    /** Goes to the first dimension of 64 frames in a row, the first of them in lane 0. */
    public void start(long firstFrame) {
        streams.start(firstFrame, straight);
        for (int i = 0; i < state.length; i += LANES) {
            for (int lane = 0; lane < LANES; lane += 2) {
                state[i + lane / 2] = straight[i + lane];
                state[i + LANES / 2 + lane / 2] = straight[i + lane + 1];
            }
        }
        frame = firstFrame;
        pairsDone = 0;
    }

    /**
     * The next dimensions of the 64 frames.
     *
     * @param samples receives the d-th of these dimensions of lane f at {@code at} + 64*d + f
     * @param at where they begin
     * @param dimensions samples a frame; of an odd number the last draw's second sample is dropped
     */
    public void next(float[] samples, int at, int dimensions) {
        for (int done = 0; done < dimensions; done += 2 * ROWS) {
            int wanted = Math.min(2 * ROWS, dimensions - done);
            drawRadii((wanted + 1) / 2);
            kernels.rotate(low, radius, samples, at + done * LANES, wanted / 2 * LANES);
            if (wanted % 2 != 0) {
                int pair = wanted / 2 * LANES;
                System.arraycopy(low, pair, low, 0, LANES);
                System.arraycopy(radius, pair, radius, 0, LANES);
                kernels.rotate(low, radius, lastPair, 0, LANES);
                System.arraycopy(lastPair, 0, samples, at + (done + wanted - 1) * LANES, LANES);
            }
        }
    }

    /**
     * The first samples of 64 frames: {@link #start} and {@link #next} in one.
     *
     * @param firstFrame number of the frame in lane 0
     * @param samples receives dimension d of lane f at 64*d + f
     * @param dimensions samples a frame
     */
    public void fill(long firstFrame, float[] samples, int dimensions) {
        start(firstFrame);
        next(samples, 0, dimensions);
    }

    private void drawRadii(int rows) {
        int count = rows * LANES;
        kernels.halves(state, high, low, rows);
        if (kernels.radius(high, radius, scratch, count)) {
            refine(count);
        }
        pairsDone += rows;
    }

    private void refine(int count) {
        for (int i = 0; i < count; i++) {
            int cell = Radius.cell(high[i]);
            if (cell < Radius.REFINED_CELLS) {
                radius[i] = Radius.refined(cell, streams.aside(frame + i % LANES, pairsDone + i / LANES));
            }
        }
    }
}
