package dev.nearlimit.decoders.batch;

import dev.nearlimit.codes.batch.FrameBatch;

/**
 * Log-likelihood ratios of 64 frames, position-major: frame f of position i is at {@code 64*i + f}. Positive means 0;
 * an LLR of exactly 0 decides 0.
 */
public final class LlrBatch {
    private final int n;
    private final float[] values;
    private final byte[] levels;

    /** A batch for codewords of n bits, all zero. */
    public LlrBatch(int n) {
        this(n, true);
    }

    private LlrBatch(int n, boolean withValues) {
        if (n < 1) {
            throw new IllegalArgumentException("n is " + n + ", must be at least 1");
        }
        this.n = n;
        this.levels = new byte[Math.multiplyExact(n, FrameBatch.FRAMES)];
        this.values = new float[withValues ? levels.length : 0];
    }

    /** A batch without values, a fifth of the memory, for decoders that read nothing but levels. */
    public static LlrBatch ofLevels(int n) {
        return new LlrBatch(n, false);
    }

    /** Codeword length in bits. */
    public int n() {
        return n;
    }

    /**
     * The n*64 LLRs in nats, the live array. Behind a quantiser these are the values that its levels stand for, so that
     * a floating-point decoder sees what a quantised receiver would hand it. Empty in a batch of levels alone.
     */
    public float[] values() {
        return values;
    }

    /** The n*64 quantiser levels, the live array; meaningful only when a quantiser filled it. */
    public byte[] levels() {
        return levels;
    }

    /** Hard decisions: bit f of {@code bits[i]} is 1 exactly where the LLR is negative. */
    public void hardDecisions(long[] bits) {
        for (int i = 0; i < n; i++) {
            long word = 0;
            int at = i * FrameBatch.FRAMES;
            for (int f = 0; f < FrameBatch.FRAMES; f++) {
                if (values[at + f] < 0f) {
                    word |= 1L << f;
                }
            }
            bits[i] = word;
        }
    }
}
