package dev.nearlimit.decoders.batch;

import dev.nearlimit.codes.batch.FrameBatch;

/** What a decoder says about 64 frames: the codeword bits it decided for, and flags and iterations of each frame. */
public final class DecodedBatch {
    private final long[] bits;
    private final int[] iterations = new int[FrameBatch.FRAMES];
    private long declaredFailures;

    /** A result for codewords of n bits. */
    public DecodedBatch(int n) {
        this.bits = new long[n];
    }

    /** Decided bits of the codeword, one word a position, the live array. */
    public long[] bits() {
        return bits;
    }

    /** Iterations that each frame took, the live array; decoders that do not iterate leave 0. */
    public int[] iterations() {
        return iterations;
    }

    /** Lanes for which the decoder itself says that it failed: no codeword within reach, or a syndrome left over. */
    public long declaredFailures() {
        return declaredFailures;
    }

    public void setDeclaredFailures(long lanes) {
        this.declaredFailures = lanes;
    }

    /** Takes over what another batch of the same n says of some lanes. */
    public void take(long lanes, DecodedBatch from) {
        for (int i = 0; i < bits.length; i++) {
            bits[i] = (bits[i] & ~lanes) | (from.bits[i] & lanes);
        }
        for (long rest = lanes; rest != 0; rest &= rest - 1) {
            int lane = Long.numberOfTrailingZeros(rest);
            iterations[lane] = from.iterations[lane];
        }
        declaredFailures = (declaredFailures & ~lanes) | (from.declaredFailures & lanes);
    }
}
