package dev.nearlimit.numerics.random;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.HashSet;
import java.util.Set;
import org.junit.jupiter.api.Test;

class FrameStreamsTest {
    private static final long SEED = 0x0123456789abcdefL;
    private static final long POINT = -1_590_000L;

    /** The rule in the Javadoc, worked through by hand for one frame with a number beyond 32 bits. */
    @Test
    void startingStateFollowsTheStatedRule() {
        long frame = (5L << 32) + 77;
        int[] key = new int[4];
        Philox4x32.block((int) POINT, (int) (POINT >> 32), 2, 0, 0x89abcdef, 0x01234567, key);
        int[] first = new int[4];
        int[] second = new int[4];
        int[] aside = new int[4];
        Philox4x32.block(77, 5, 0, 0, key[0], key[1], first);
        Philox4x32.block(77, 5, 1, 0, key[0], key[1], second);
        Philox4x32.block(77, 5, 3, 1, key[0], key[1], aside);

        FrameStreams streams = new FrameStreams(SEED, POINT, Stream.NOISE);
        long[] state = new long[256];
        int lane = 13;
        streams.start(frame - lane, state);
        assertEquals(join(first[0], first[1]), state[lane]);
        assertEquals(join(first[2], first[3]), state[64 + lane]);
        assertEquals(join(second[0], second[1]), state[128 + lane]);
        assertEquals(join(second[2], second[3]), state[192 + lane]);
        assertEquals(join(aside[0], aside[1]), streams.aside(frame, 3));
    }

    /** Pinned: a change here changes every result ever made and needs a new revision. */
    @Test
    void firstStatesStayWhatTheyAre() {
        assertEquals(1, FrameStreams.REVISION);
        long[] state = new long[256];
        new FrameStreams(1, 2_000_000, Stream.PAYLOAD).start(0, state);
        assertEquals("adf0d2b5b843d80a", Long.toHexString(state[0]));
        new FrameStreams(1, 2_000_000, Stream.NOISE).start(0, state);
        assertEquals("4885c769ece8fa4d", Long.toHexString(state[192 + 63]));
        new FrameStreams(1, 2_000_000, Stream.FADING).start(0, state);
        assertEquals("a4ed342e4e4d1b33", Long.toHexString(state[64 + 5]));
    }

    @Test
    void laneDoesNotMatter() {
        FrameStreams streams = new FrameStreams(9, 0, Stream.NOISE);
        long[] a = new long[256];
        long[] b = new long[256];
        streams.start(0, a);
        streams.start(40, b);
        for (int word = 0; word < 4; word++) {
            assertEquals(a[64 * word + 50], b[64 * word + 10]);
        }
    }

    /** Seeds, points, streams and frames that differ in one bit share no state word. */
    @Test
    void nothingCollides() {
        Set<Long> seen = new HashSet<>();
        int made = 0;
        long[] state = new long[256];
        for (long seed : new long[] {0, 1, 1L << 32, -1}) {
            for (long point : new long[] {0, 1, -1, 1L << 32, 1_000_000}) {
                for (Stream stream : Stream.values()) {
                    FrameStreams streams = new FrameStreams(seed, point, stream);
                    for (long frame : new long[] {0, 64, 1L << 32}) {
                        streams.start(frame, state);
                        for (long word : state) {
                            seen.add(word);
                            made++;
                        }
                    }
                }
            }
        }
        // 46080 words of 64 bits: two alike by chance with probability 46080^2 / 2^65 = 6e-11.
        assertTrue(seen.size() == made, made - seen.size() + " words seen twice");
    }

    private static long join(int low, int high) {
        return (low & 0xFFFFFFFFL) | ((long) high << 32);
    }
}
