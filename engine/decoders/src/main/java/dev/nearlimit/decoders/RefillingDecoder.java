package dev.nearlimit.decoders;

import dev.nearlimit.decoders.batch.BatchSource;
import dev.nearlimit.decoders.batch.FinishedFrames;

/**
 * A decoder whose lanes go on to their next frame while others are still at their last, so that a slow frame holds up
 * its own lane and no other. Lane f takes frame f of every batch, in order. What a frame becomes is what
 * {@link Decoder#decode} makes of it.
 */
public interface RefillingDecoder extends Decoder {
    /** Batches that may have unfinished frames at a time; before another is asked for, the oldest has been handed over. */
    int BATCHES_UNDER_WAY = 4;

    /** Decodes all batches of a source; on return every frame of every batch has been handed over. */
    void decode(BatchSource source, FinishedFrames finished);
}
