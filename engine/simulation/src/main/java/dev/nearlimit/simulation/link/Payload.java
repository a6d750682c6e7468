package dev.nearlimit.simulation.link;

import dev.nearlimit.codes.batch.FrameBatch;
import dev.nearlimit.numerics.noise.UniformDraws;

/**
 * Random information bits: information bit i of a frame is bit i mod 64 (bit 0 the least) of draw i / 64 of the frame's
 * payload stream. Holds a buffer, so each thread makes its own; a call allocates nothing.
 */
public final class Payload {
    /** Raised whenever an information bit changes. */
    public static final int REVISION = 1;

    private final UniformDraws draws;
    private final long[] block = new long[FrameBatch.FRAMES];

    /** Bits from these payload streams. */
    public Payload(UniformDraws draws) {
        this.draws = draws;
    }

    /**
     * The information bits of 64 frames.
     *
     * @param firstFrame number of the frame in lane 0
     * @param information receives k words, one for each of its elements
     */
    public void fill(long firstFrame, long[] information) {
        draws.start(firstFrame);
        for (int first = 0; first < information.length; first += Long.SIZE) {
            draws.next(block, 1);
            BitTranspose.transpose(block);
            System.arraycopy(block, 0, information, first, Math.min(Long.SIZE, information.length - first));
        }
    }
}
