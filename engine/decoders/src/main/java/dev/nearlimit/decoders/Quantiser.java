package dev.nearlimit.decoders;

import dev.nearlimit.decoders.batch.LlrBatch;

/** How an LLR becomes what the decoder sees; part of a scheme, because a product ships with it. */
public interface Quantiser {
    /** The designator with every default spelled out: {@code none} or {@code uniform:word=6,step=0.25,rise=mid-tread}. */
    String designator();

    /** Bits of a level; 0 where values pass unquantised. */
    int wordBits();

    /**
     * Magnitude of the outermost level, in the integers of {@link dev.nearlimit.decoders.batch.LlrBatch#levels()}; 0
     * where values pass unquantised. Unless overridden that of a mid-tread quantiser, 2^(b-1)-1.
     */
    default int largestLevel() {
        return wordBits() == 0 ? 0 : (1 << (wordBits() - 1)) - 1;
    }

    /**
     * Quantises values in place, a whole number of rows of 64 frames.
     *
     * @param values LLRs from {@code at} on; receives what the levels stand for
     * @param at where they begin
     * @param count how many, a multiple of 64
     * @param levels receives the levels from {@code levelsAt} on; left alone where values pass unquantised
     * @param levelsAt where the levels go
     */
    void apply(float[] values, int at, int count, byte[] levels, int levelsAt);

    /** Fills the batch's levels from its values and overwrites the values with what the levels stand for. */
    default void apply(LlrBatch batch) {
        apply(batch.values(), 0, batch.values().length, batch.levels(), 0);
    }
}
