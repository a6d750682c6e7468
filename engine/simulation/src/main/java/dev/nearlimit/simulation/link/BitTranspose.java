package dev.nearlimit.simulation.link;

/**
 * Transposes a 64 x 64 bit matrix in place, swapping ever smaller blocks across the diagonal: six rounds of 32 word
 * pairs. It turns 64 bits of each of 64 frames into 64 words of one bit a frame.
 */
final class BitTranspose {
    private BitTranspose() {}

    /**
     * Bit c of word r becomes bit r of word c.
     *
     * @param words 64 words from {@code offset} on
     */
    static void transpose(long[] words, int offset) {
        long mask = 0x00000000FFFFFFFFL;
        for (int size = 32; size != 0; size >>= 1) {
            for (int r = 0; r < 64; r = ((r | size) + 1) & ~size) {
                int upper = offset + r;
                int lower = upper + size;
                long swap = ((words[upper] >>> size) ^ words[lower]) & mask;
                words[upper] ^= swap << size;
                words[lower] ^= swap;
            }
            mask ^= mask << (size >> 1);
        }
    }
}
