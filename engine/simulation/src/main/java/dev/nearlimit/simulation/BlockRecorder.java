package dev.nearlimit.simulation;

import dev.nearlimit.codes.batch.FrameBatch;
import java.util.Arrays;

/** Collects what becomes of a block's frames, in whatever order they end. Reused from block to block. */
final class BlockRecorder {
    private final int frames;
    private final boolean iterates;
    /** Bit f of word b: frame 64b + f failed, or did so without a declared failure. */
    private final long[] failed;

    private final long[] undetected;
    private final int[] bitErrors;
    private final int[] iterations;
    private long number;
    private int framesLeft;

    /** For blocks of so many frames; without iterations where the decoder does not iterate. */
    BlockRecorder(int frames, boolean iterates) {
        this.frames = frames;
        this.iterates = iterates;
        this.failed = new long[frames / FrameBatch.FRAMES];
        this.undetected = new long[failed.length];
        this.bitErrors = new int[frames];
        this.iterations = new int[iterates ? frames : 0];
    }

    /** Begins a block. */
    void start(long block) {
        number = block;
        framesLeft = frames;
        Arrays.fill(failed, 0);
        Arrays.fill(undetected, 0);
    }

    long number() {
        return number;
    }

    /** A failed frame, counted within the block. */
    void fail(int frame, int wrongBits, boolean unnoticed) {
        int word = frame / FrameBatch.FRAMES;
        failed[word] |= 1L << frame;
        undetected[word] |= unnoticed ? 1L << frame : 0;
        bitErrors[frame] = wrongBits;
    }

    /** Frames that have ended, failed or not; true when they were the last of the block. */
    boolean ended(int firstFrame, long lanes, int[] iterationsOfLane) {
        if (iterates) {
            for (long rest = lanes; rest != 0; rest &= rest - 1) {
                int lane = Long.numberOfTrailingZeros(rest);
                iterations[firstFrame + lane] = iterationsOfLane[lane];
            }
        }
        framesLeft -= Long.bitCount(lanes);
        return framesLeft == 0;
    }

    Block toBlock() {
        int count = 0;
        for (long word : failed) {
            count += Long.bitCount(word);
        }
        int[] frame = new int[count];
        int[] wrong = new int[count];
        boolean[] unnoticed = new boolean[count];
        int next = 0;
        for (int word = 0; word < failed.length; word++) {
            for (long rest = failed[word]; rest != 0; rest &= rest - 1) {
                int lane = Long.numberOfTrailingZeros(rest);
                frame[next] = word * FrameBatch.FRAMES + lane;
                wrong[next] = bitErrors[frame[next]];
                unnoticed[next++] = (undetected[word] >>> lane & 1) != 0;
            }
        }
        return new Block(frames, frame, wrong, unnoticed, iterations.clone());
    }
}
