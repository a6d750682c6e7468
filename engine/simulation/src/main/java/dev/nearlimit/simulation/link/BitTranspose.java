package dev.nearlimit.simulation.link;

/**
 * Transposes a 64 x 64 bit matrix in place, swapping ever smaller blocks across the diagonal: six rounds of 32 pairs of
 * words. It turns 64 bits of each of 64 frames into 64 words of one bit a frame.
 */
final class BitTranspose {
    private BitTranspose() {}

    /** Bit c of word r becomes bit r of word c. */
    static void transpose(long[] words) {
        long mask = 0x00000000FFFFFFFFL;
        for (int size = 32; size != 0; size >>= 1) {
            for (int upper = 0; upper < 64; upper = ((upper | size) + 1) & ~size) {
                int lower = upper + size;
                long swap = ((words[upper] >>> size) ^ words[lower]) & mask;
                words[upper] ^= swap << size;
                words[lower] ^= swap;
            }
            mask ^= mask << (size >> 1);
        }
    }
}
