package dev.nearlimit.decoders;

import dev.nearlimit.decoders.batch.DecodedBatch;
import dev.nearlimit.decoders.batch.LlrBatch;

/**
 * A decoder for one code with its working memory. Not shared by threads: each worker makes its own. A call allocates
 * nothing, and the result of a frame never depends on the other frames of its batch nor on earlier batches.
 */
public interface Decoder {
    /**
     * Decodes all 64 lanes of a batch.
     *
     * @param received LLRs in nats; not changed. Decoders of fixed word length read its levels, hard-decision decoders
     *     the signs of its values
     * @param decoded receives bits, iterations and declared failures, all overwritten
     */
    void decode(LlrBatch received, DecodedBatch decoded);
}
