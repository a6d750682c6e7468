package dev.nearlimit.decoders.hard;

import dev.nearlimit.codes.batch.FrameBatch;
import dev.nearlimit.codes.coset.CosetLeaders;

/** Syndromes of the 64 frames of a batch as numbers, for looking them up in a table of coset leaders. */
final class SyndromeBatch {
    private final CosetLeaders leaders;
    private final long[] words;
    private final int[] ofFrame = new int[FrameBatch.FRAMES];

    SyndromeBatch(CosetLeaders leaders) {
        this.leaders = leaders;
        this.words = new long[leaders.syndromeBits()];
    }

    /** The syndrome of each frame, in an array that is overwritten by the next call. */
    int[] of(long[] bits) {
        leaders.syndromeMatrix().multiplyBatch(bits, words);
        for (int f = 0; f < FrameBatch.FRAMES; f++) {
            int syndrome = 0;
            for (int r = 0; r < words.length; r++) {
                syndrome |= (int) (words[r] >>> f & 1L) << r;
            }
            ofFrame[f] = syndrome;
        }
        return ofFrame;
    }
}
