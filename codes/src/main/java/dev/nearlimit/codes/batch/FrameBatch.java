package dev.nearlimit.codes.batch;

/** The number of frames in a batch and the layout rules that every room shares. */
public final class FrameBatch {
    /** Frames in a batch: one per bit of a {@code long}. */
    public static final int FRAMES = 64;

    private FrameBatch() {}

    /**
     * Index of a soft value in a position-major array of {@code n * FRAMES} values.
     *
     * @param position bit position in the codeword, 0 .. n-1
     * @param frame frame in the batch, 0 .. 63
     */
    public static int softIndex(int position, int frame) {
        return position * FRAMES + frame;
    }

    /** Mask with ones for the first {@code frames} lanes; {@code frames} is 0 .. 64. */
    public static long laneMask(int frames) {
        if (frames < 0 || frames > FRAMES) {
            throw new IllegalArgumentException("frames is " + frames + ", must be 0 .. " + FRAMES);
        }
        return frames == FRAMES ? -1L : (1L << frames) - 1;
    }

    /**
     * Copies the bits of one frame out of a batch.
     *
     * @param batch n words, bit f of word i being bit i of frame f
     * @param frame frame, 0 .. 63
     * @param packed receives the frame's bits, 64 a word, bit i at word i/64 bit i%64; is cleared first
     */
    public static void extractFrame(long[] batch, int frame, long[] packed) {
        java.util.Arrays.fill(packed, 0L);
        for (int i = 0; i < batch.length; i++) {
            packed[i >> 6] |= ((batch[i] >>> frame) & 1L) << (i & 63);
        }
    }

    /** The inverse of {@link #extractFrame}: writes one frame's packed bits into its lane, leaving other lanes alone. */
    public static void insertFrame(long[] packed, int frame, long[] batch) {
        long lane = 1L << frame;
        for (int i = 0; i < batch.length; i++) {
            long bit = (packed[i >> 6] >>> (i & 63)) & 1L;
            batch[i] = (batch[i] & ~lane) | (bit << frame);
        }
    }
}
