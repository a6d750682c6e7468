package dev.nearlimit.simulation;

import java.util.Arrays;

/** Collects the frames of a block one after another. Reused from block to block. */
final class BlockRecorder {
    private int[] failed = new int[64];
    private int[] bitErrors = new int[64];
    private boolean[] undetected = new boolean[64];
    private int failures;
    private final int[] iterations;

    /** For blocks of so many frames; without iterations where the decoder does not iterate. */
    BlockRecorder(int frames, boolean iterates) {
        this.iterations = new int[iterates ? frames : 0];
    }

    void clear() {
        failures = 0;
    }

    /** A failed frame; frames come in ascending order. */
    void fail(int frame, int wrongBits, boolean unnoticed) {
        if (failures == failed.length) {
            failed = Arrays.copyOf(failed, 2 * failures);
            bitErrors = Arrays.copyOf(bitErrors, 2 * failures);
            undetected = Arrays.copyOf(undetected, 2 * failures);
        }
        failed[failures] = frame;
        bitErrors[failures] = wrongBits;
        undetected[failures++] = unnoticed;
    }

    /** Iterations of 64 frames from {@code first} on. */
    void iterations(int first, int[] ofLane) {
        if (iterations.length > 0) {
            System.arraycopy(ofLane, 0, iterations, first, ofLane.length);
        }
    }

    Block toBlock(int frames) {
        return new Block(
                frames,
                Arrays.copyOf(failed, failures),
                Arrays.copyOf(bitErrors, failures),
                Arrays.copyOf(undetected, failures),
                iterations.clone());
    }
}
