package dev.nearlimit.decoders.batch;

/** Hands out batches one after the other. */
@FunctionalInterface
public interface BatchSource {
    /**
     * The next batch, or null when there is no other. It must not change until all of its frames have been handed over.
     */
    LlrBatch next();
}
