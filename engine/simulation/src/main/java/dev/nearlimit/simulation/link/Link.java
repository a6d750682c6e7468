package dev.nearlimit.simulation.link;

import dev.nearlimit.codes.batch.FrameBatch;
import dev.nearlimit.decoders.batch.LlrBatch;

/**
 * Carries 64 codewords to a receiver and hands over its LLRs. What happens to a frame is a function of its number and
 * its bits alone. Holds buffers, so each thread makes its own; a call allocates nothing.
 */
public interface Link {
    /** Raised whenever a received value may change for the same codeword and noise. */
    int REVISION = 1;

    /** Positions that can be sent in one call; their values fit in the first-level cache. */
    int MOST_POSITIONS = 32;

    /** Goes to the start of 64 frames in a row, the first of them in lane 0. */
    void start(long firstFrame);

    /**
     * Sends the next positions of a batch.
     *
     * @param codeword n words, bit f of word i being code bit i of frame f
     * @param first the first position; that after the last of the call before
     * @param count positions, even unless they are the last; at most {@link #MOST_POSITIONS}
     * @param values receives LLRs in nats: that of position i of frame f at {@code at} + 64*(i - first) + f
     * @param at where they begin
     */
    void carry(long[] codeword, int first, int count, float[] values, int at);

    /**
     * Sends a whole batch.
     *
     * @param firstFrame number of the frame in lane 0
     * @param received receives n*64 LLRs in nats
     */
    default void carry(long firstFrame, long[] codeword, LlrBatch received) {
        start(firstFrame);
        for (int first = 0; first < received.n(); first += MOST_POSITIONS) {
            int count = Math.min(MOST_POSITIONS, received.n() - first);
            carry(codeword, first, count, received.values(), first * FrameBatch.FRAMES);
        }
    }
}
