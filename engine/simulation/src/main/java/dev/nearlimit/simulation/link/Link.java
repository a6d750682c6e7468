package dev.nearlimit.simulation.link;

import dev.nearlimit.decoders.batch.LlrBatch;

/**
 * Carries 64 codewords to a receiver and hands over its LLRs. What happens to a frame is a function of its number and
 * its bits alone. Holds buffers, so each thread makes its own; a call allocates nothing.
 */
public interface Link {
    /** Raised whenever a received value may change for the same codeword and noise. */
    int REVISION = 1;

    /**
     * Sends a batch.
     *
     * @param firstFrame number of the frame in lane 0
     * @param codeword n words, bit f of word i being code bit i of frame f
     * @param received receives n*64 LLRs in nats
     */
    void carry(long firstFrame, long[] codeword, LlrBatch received);
}
