package dev.nearlimit.simulation;

import java.util.Arrays;

/**
 * Which frames of a point failed, so that schemes on common noise can be compared frame by frame. At most the first
 * {@value #MOST} are kept, which is plenty for a comparison and keeps memory flat however long a run lasts. Immutable.
 */
public final class FailedFrames {
    /** Failures that are kept. */
    static final int MOST = 1 << 17;

    /** Distances from one failed frame to the next, seven bits a byte, least first, the top bit saying that more follow. */
    private final byte[] distances;

    private final int size;
    private final long knownFrames;

    private FailedFrames(byte[] distances, int size, long knownFrames) {
        this.distances = distances;
        this.size = size;
        this.knownFrames = knownFrames;
    }

    /**
     * Frames of a point of which these failed.
     *
     * @param frames frames counted
     * @param failed numbers of failed frames, ascending, each below {@code frames}
     */
    public static FailedFrames of(long frames, long... failed) {
        Recorder recorder = new Recorder();
        for (long frame : failed) {
            recorder.add(frame);
        }
        return recorder.toFailedFrames(frames);
    }

    /** How many frames, counted from the first, are known to have failed or not: all that were counted, or fewer. */
    public long knownFrames() {
        return knownFrames;
    }

    /** Numbers of the failed frames among the first so many, ascending. */
    public long[] before(long frames) {
        long[] failed = new long[size];
        int count = 0;
        int at = 0;
        for (long frame = 0; count < size; count++) {
            int shift = 0;
            for (byte next = -1; next < 0; shift += 7) {
                next = distances[at++];
                frame += (next & 0x7FL) << shift;
            }
            if (frame >= frames) {
                break;
            }
            failed[count] = frame;
        }
        return Arrays.copyOf(failed, count);
    }

    @Override
    public boolean equals(Object other) {
        return other instanceof FailedFrames frames
                && knownFrames == frames.knownFrames
                && Arrays.equals(distances, frames.distances);
    }

    @Override
    public int hashCode() {
        return Arrays.hashCode(distances);
    }

    @Override
    public String toString() {
        return size + " failures in " + knownFrames + " frames";
    }

    /** Takes failures in frame order. Not shared by threads. */
    static final class Recorder {
        private byte[] distances = new byte[64];
        private int length;
        private int size;
        private long last;
        private long firstLost = Long.MAX_VALUE;

        void add(long frame) {
            if (size == MOST) {
                firstLost = Math.min(firstLost, frame);
                return;
            }
            if (length + 10 > distances.length) {
                distances = Arrays.copyOf(distances, 2 * distances.length);
            }
            long rest = frame - last;
            for (; rest > 0x7F; rest >>>= 7) {
                distances[length++] = (byte) (rest | 0x80);
            }
            distances[length++] = (byte) rest;
            last = frame;
            size++;
        }

        FailedFrames toFailedFrames(long frames) {
            return new FailedFrames(Arrays.copyOf(distances, length), size, Math.min(frames, firstLost));
        }
    }
}
