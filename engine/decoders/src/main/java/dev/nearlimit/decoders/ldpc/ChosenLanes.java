package dev.nearlimit.decoders.ldpc;

import dev.nearlimit.codes.batch.FrameBatch;
import java.util.Arrays;

/** Some of the 64 lanes, and what a decoder does to them when their frames begin. Rows are 64 lanes each. */
final class ChosenLanes {
    private final int[] lane = new int[FrameBatch.FRAMES];
    private int count;

    /** Chooses the lanes for the calls that follow. */
    void choose(long lanes) {
        count = 0;
        for (long rest = lanes; rest != 0; rest &= rest - 1) {
            lane[count++] = Long.numberOfTrailingZeros(rest);
        }
    }

    /** Sets every row's chosen lanes to 0. */
    void clear(float[] rows) {
        if (count == FrameBatch.FRAMES) {
            Arrays.fill(rows, 0f);
            return;
        }
        for (int row = 0; row < rows.length; row += FrameBatch.FRAMES) {
            for (int i = 0; i < count; i++) {
                rows[row + lane[i]] = 0f;
            }
        }
    }

    /** Sets every row's chosen lanes to 0. */
    void clear(int[] rows) {
        if (count == FrameBatch.FRAMES) {
            Arrays.fill(rows, 0);
            return;
        }
        for (int row = 0; row < rows.length; row += FrameBatch.FRAMES) {
            for (int i = 0; i < count; i++) {
                rows[row + lane[i]] = 0;
            }
        }
    }

    /** Copies every row's chosen lanes, limited to -limit .. limit; -0 becomes +0. */
    void copyLimited(float[] from, float limit, float[] to) {
        for (int row = 0; row < to.length; row += FrameBatch.FRAMES) {
            for (int i = 0; i < count; i++) {
                int at = row + lane[i];
                to[at] = Math.max(-limit, Math.min(limit, from[at])) + 0f;
            }
        }
    }

    /** Copies every row's chosen lanes. */
    void copy(byte[] from, int[] to) {
        for (int row = 0; row < to.length; row += FrameBatch.FRAMES) {
            for (int i = 0; i < count; i++) {
                to[row + lane[i]] = from[row + lane[i]];
            }
        }
    }

    /** Copies every row's chosen lanes. */
    void copy(byte[] from, short[] to) {
        for (int row = 0; row < to.length; row += FrameBatch.FRAMES) {
            for (int i = 0; i < count; i++) {
                to[row + lane[i]] = from[row + lane[i]];
            }
        }
    }

    /** A row of masks, all ones where a lane is not chosen, repeated over the whole array. */
    void keepOthers(byte[] masks) {
        Arrays.fill(masks, (byte) -1);
        for (int row = 0; row < masks.length; row += FrameBatch.FRAMES) {
            for (int i = 0; i < count; i++) {
                masks[row + lane[i]] = 0;
            }
        }
    }

    /** A row of masks, all ones where a lane is not chosen, repeated over the whole array. */
    void keepOthers(short[] masks) {
        Arrays.fill(masks, (short) -1);
        for (int row = 0; row < masks.length; row += FrameBatch.FRAMES) {
            for (int i = 0; i < count; i++) {
                masks[row + lane[i]] = 0;
            }
        }
    }
}
