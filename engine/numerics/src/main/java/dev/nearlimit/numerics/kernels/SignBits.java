package dev.nearlimit.numerics.kernels;

import static jdk.incubator.vector.VectorOperators.AND;
import static jdk.incubator.vector.VectorOperators.LSHR;
import static jdk.incubator.vector.VectorOperators.OR;

import jdk.incubator.vector.ByteVector;
import jdk.incubator.vector.LongVector;
import jdk.incubator.vector.VectorSpecies;

/**
 * Gathers the signs of 64 bytes into a word, for many rows. Seen as eight longs, a row has the signs of frames 8j .. 8j+7
 * at the tops of long j's bytes; moved down by 7 - j and put one over the other they are the wanted word with its eight
 * by eight bits transposed, which three exchanges put right (H. S. Warren, "Hacker's Delight", 2nd ed., section 7-3).
 */
final class SignBits {
    private static final VectorSpecies<Byte> BYTES = ByteVector.SPECIES_PREFERRED;
    private static final VectorSpecies<Long> LONGS = LongVector.SPECIES_PREFERRED;
    private static final int FRAMES = 64;
    private static final long TOPS = 0x8080808080808080L;
    /** 7 - j for each long of a row. */
    private static final long[] DOWN = {7, 6, 5, 4, 3, 2, 1, 0};

    private static final int ROWS = 64;

    private SignBits() {}

    /**
     * Bit f of bits[i] becomes 1 exactly where values[64*i + f] is negative.
     *
     * @param scratch {@value #ROWS} times 8 values whose contents do not matter
     */
    static void gather(byte[] values, long[] bits, long[] scratch) {
        for (int first = 0; first < bits.length; first += ROWS) {
            int rows = Math.min(ROWS, bits.length - first);
            moveDown(values, first, rows, scratch);
            merge(scratch, bits, first, rows);
            transpose(bits, first, rows);
        }
    }

    private static void moveDown(byte[] values, int first, int rows, long[] scratch) {
        for (int row = 0; row < rows; row++) {
            int at = (first + row) * FRAMES;
            LongVector merged = LongVector.zero(LONGS);
            for (int f = 0; f < FRAMES; f += BYTES.length()) {
                LongVector down = LongVector.fromArray(LONGS, DOWN, f / Long.BYTES);
                merged = ByteVector.fromArray(BYTES, values, at + f)
                        .reinterpretAsLongs()
                        .lanewise(AND, TOPS)
                        .lanewise(LSHR, down)
                        .lanewise(OR, merged);
            }
            merged.intoArray(scratch, row * LONGS.length());
        }
    }

    private static void merge(long[] scratch, long[] bits, int first, int rows) {
        int each = LONGS.length();
        if (each == 4) {
            // Written out for registers of 256 bits: a loop of four costs as much as all the rest.
            for (int row = 0; row < rows; row++) {
                int at = 4 * row;
                bits[first + row] = scratch[at] | scratch[at + 1] | scratch[at + 2] | scratch[at + 3];
            }
            return;
        }
        for (int row = 0; row < rows; row++) {
            long word = 0;
            for (int i = row * each; i < (row + 1) * each; i++) {
                word |= scratch[i];
            }
            bits[first + row] = word;
        }
    }

    private static void transpose(long[] bits, int first, int rows) {
        for (int i = first; i < first + rows; i++) {
            long x = bits[i];
            long swap = (x ^ (x >>> 7)) & 0x00AA00AA00AA00AAL;
            x ^= swap ^ (swap << 7);
            swap = (x ^ (x >>> 14)) & 0x0000CCCC0000CCCCL;
            x ^= swap ^ (swap << 14);
            swap = (x ^ (x >>> 28)) & 0x00000000F0F0F0F0L;
            bits[i] = x ^ swap ^ (swap << 28);
        }
    }
}
