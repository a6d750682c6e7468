package dev.nearlimit.numerics.noise;

import dev.nearlimit.numerics.kernels.Kernels;
import dev.nearlimit.numerics.random.FrameStreams;

/**
 * 64-bit uniform draws for 64 frames, straight from their streams. Holds the streams' state, so each thread makes its
 * own; a call allocates nothing.
 */
public final class UniformDraws {
    private final FrameStreams streams;
    private final long[] state = new long[FrameStreams.STATE_WORDS * FrameStreams.LANES];

    /** Draws from these streams; they must not be shared with another thread. */
    public UniformDraws(FrameStreams streams) {
        this.streams = streams;
    }

    /** Goes to the start of the streams of 64 frames in a row, the first of them in lane 0. */
    public void start(long firstFrame) {
        streams.start(firstFrame, state);
    }

    /**
     * The next draws of each lane.
     *
     * @param draws receives draw s of lane l at 64*s + l
     * @param steps draws a lane
     */
    public void next(long[] draws, int steps) {
        Kernels.noise().fill(state, draws, steps);
    }
}
