package dev.nearlimit.numerics.random;

/**
 * The random streams of all frames of one point for one purpose: frame f has the same stream for everyone, for ever,
 * whichever lane, thread or machine takes it. Keeps scratch memory, so each thread makes its own.
 *
 * <p>With P(c0, c1, c2, c3; k0, k1) for {@link Philox4x32} and low/high for the halves of a 64-bit number:
 *
 * <ul>
 *   <li>The stream key is the first two words of P(low(point), high(point), stream, 0; low(seed), high(seed)), where
 *       stream is 1 for payload, 2 for noise, 3 for fading and 4 for selection. The map is one to one before it is cut to 64 bits, so two
 *       pairs of point and stream share a key with probability 2^-64.
 *   <li>The starting state of frame f is two blocks under that key: s0 (low half first) and s1 from
 *       P(low(f), high(f), 0, 0), s2 and s3 from P(low(f), high(f), 1, 0). As P is one to one, the blocks differ, so no
 *       state is all zero, and no two frames of a stream start alike.
 *   <li>A number that belongs to position i of frame f and lies outside the stream is the first two words, low half
 *       first, of P(low(f), high(f), i, 1).
 * </ul>
 */
public final class FrameStreams {
    /** Frames whose states stand side by side. */
    public static final int LANES = 64;
    /** Words of the generator's state in each lane. */
    public static final int STATE_WORDS = 4;
    /** Raised whenever a frame's streams change. */
    public static final int REVISION = 1;

    private static final int STARTING_STATE = 0;
    private static final int ASIDE = 1;

    private final int key0;
    private final int key1;
    private final int[] image = new int[4];

    /**
     * The streams of one point.
     *
     * @param seed the user's seed
     * @param point what tells the point from others, such as Eb/N0 in micro-dB
     * @param stream what the numbers are for
     */
    public FrameStreams(long seed, long point, Stream stream) {
        Philox4x32.block((int) point, (int) (point >>> 32), stream.number(), 0, (int) seed, (int) (seed >>> 32), image);
        this.key0 = image[0];
        this.key1 = image[1];
    }

    /**
     * Starting states of 64 frames in a row.
     *
     * @param firstFrame number of the frame in lane 0
     * @param state receives 4*64 words, word w of lane l at 64*w + l
     */
    public void start(long firstFrame, long[] state) {
        for (int lane = 0; lane < LANES; lane++) {
            long frame = firstFrame + lane;
            block(frame, 0, STARTING_STATE);
            state[lane] = pair(0);
            state[LANES + lane] = pair(2);
            block(frame, 1, STARTING_STATE);
            state[2 * LANES + lane] = pair(0);
            state[3 * LANES + lane] = pair(2);
        }
    }

    /** 64 bits that belong to a position of a frame and are no part of its stream. */
    public long aside(long frame, int position) {
        block(frame, position, ASIDE);
        return pair(0);
    }

    private void block(long frame, int index, int kind) {
        Philox4x32.block((int) frame, (int) (frame >>> 32), index, kind, key0, key1, image);
    }

    private long pair(int first) {
        return (image[first] & 0xFFFFFFFFL) | ((long) image[first + 1] << 32);
    }
}
