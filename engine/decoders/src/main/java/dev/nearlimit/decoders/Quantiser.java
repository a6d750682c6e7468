package dev.nearlimit.decoders;

import dev.nearlimit.decoders.batch.LlrBatch;

/** How an LLR becomes what the decoder sees; part of a scheme, because a product ships with it. */
public interface Quantiser {
    /** The designator with every default spelled out: {@code none} or {@code uniform:word=6,step=0.25,rise=mid-tread}. */
    String designator();

    /** Bits of a level; 0 where values pass unquantised. */
    int wordBits();

    /** Fills the batch's levels from its values and overwrites the values with what the levels stand for. */
    void apply(LlrBatch batch);
}
