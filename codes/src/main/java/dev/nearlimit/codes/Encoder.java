package dev.nearlimit.codes;

/**
 * Maps information bits to codewords, 64 frames at a time. Encoders keep no state between calls and may be shared by
 * threads; a call allocates nothing.
 */
public interface Encoder {
    /**
     * Encodes a batch.
     *
     * @param information k words, bit f of word i being information bit i of frame f
     * @param codeword receives n words in transmitted order
     */
    void encode(long[] information, long[] codeword);
}
