package dev.nearlimit.decoders.batch;

/** Takes what a decoder has decided, in the order in which frames end. */
@FunctionalInterface
public interface FinishedFrames {
    /**
     * Frames of one batch that have ended.
     *
     * @param batch number of the batch, counted from 0 in the order of the source
     * @param lanes the lanes that have ended; each lane of a batch is handed over once
     * @param decoded bits, iterations and declared failures, meaningful for these lanes alone and only during the call
     */
    void accept(long batch, long lanes, DecodedBatch decoded);
}
