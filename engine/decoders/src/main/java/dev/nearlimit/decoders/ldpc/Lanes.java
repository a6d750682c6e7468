package dev.nearlimit.decoders.ldpc;

import dev.nearlimit.codes.batch.FrameBatch;
import dev.nearlimit.decoders.RefillingDecoder;
import dev.nearlimit.decoders.batch.BatchSource;
import dev.nearlimit.decoders.batch.DecodedBatch;
import dev.nearlimit.decoders.batch.FinishedFrames;
import dev.nearlimit.decoders.batch.LlrBatch;
import java.util.Arrays;

/**
 * Which frame each of the 64 lanes is at, and for how many iterations. Lane f takes frame f of one batch after the other.
 * Lanes that have ended wait until a few can start together, since starting costs a pass over all positions.
 */
final class Lanes {
    /** Lanes that start together at least, while others run. */
    private static final int START_TOGETHER = 8;

    private final LlrBatch[] underWay = new LlrBatch[RefillingDecoder.BATCHES_UNDER_WAY];
    /** The batch that a running lane is at, or that a waiting lane wants next. */
    private final long[] batch = new long[FrameBatch.FRAMES];

    private final int[] taken = new int[FrameBatch.FRAMES];
    private long batches;
    private boolean exhausted;
    private long running;
    /** Waiting lanes that have been looked at in this round of starting. */
    private long lookedAt;

    private LlrBatch toStart;

    /** All lanes wait for the first batch. */
    void start() {
        Arrays.fill(batch, 0);
        batches = 0;
        exhausted = false;
        running = 0;
        lookedAt = 0;
    }

    /** Lanes with a frame. */
    long running() {
        return running;
    }

    /** Running lanes that have taken so many iterations. */
    long atIteration(int iterations) {
        long found = 0;
        for (long rest = running; rest != 0; rest &= rest - 1) {
            int lane = Long.numberOfTrailingZeros(rest);
            if (taken[lane] == iterations) {
                found |= 1L << lane;
            }
        }
        return found;
    }

    void countIteration() {
        for (int lane = 0; lane < taken.length; lane++) {
            taken[lane]++;
        }
    }

    /**
     * Sets some waiting lanes running, all with frames of {@link #batchToStart()}; 0 when no more can or should start
     * now, which ends the round.
     */
    long nextToStart(BatchSource source) {
        if (lookedAt == 0 && running != 0 && Long.bitCount(~running) < START_TOGETHER) {
            return 0;
        }
        for (long rest = ~running & ~lookedAt; rest != 0; rest = ~running & ~lookedAt) {
            long wanted = batch[Long.numberOfTrailingZeros(rest)];
            long lanes = at(wanted, rest);
            lookedAt |= lanes;
            if (wanted < batches || fetch(source)) {
                running |= lanes;
                for (long some = lanes; some != 0; some &= some - 1) {
                    taken[Long.numberOfTrailingZeros(some)] = 0;
                }
                toStart = underWay[slot(wanted)];
                return lanes;
            }
        }
        lookedAt = 0;
        toStart = null;
        return 0;
    }

    LlrBatch batchToStart() {
        return toStart;
    }

    /** Those of some lanes that are at a batch. */
    private long at(long number, long among) {
        long lanes = 0;
        for (long rest = among; rest != 0; rest &= rest - 1) {
            int lane = Long.numberOfTrailingZeros(rest);
            if (batch[lane] == number) {
                lanes |= 1L << lane;
            }
        }
        return lanes;
    }

    /** Takes another batch from the source, if it has one and the oldest of those under way is done with. */
    private boolean fetch(BatchSource source) {
        if (exhausted || oldest() <= batches - underWay.length) {
            return false;
        }
        LlrBatch next = source.next();
        exhausted = next == null;
        if (exhausted) {
            return false;
        }
        underWay[slot(batches)] = next;
        batches++;
        return true;
    }

    private long oldest() {
        long least = batch[0];
        for (long number : batch) {
            least = Math.min(least, number);
        }
        return least;
    }

    private int slot(long number) {
        return (int) (number % underWay.length);
    }

    /** Hands over lanes that have ended, batch by batch; they wait for their next frames. */
    void end(long lanes, DecodedBatch ended, FinishedFrames finished) {
        for (long rest = lanes; rest != 0; rest &= rest - 1) {
            int lane = Long.numberOfTrailingZeros(rest);
            ended.iterations()[lane] = taken[lane];
        }
        running &= ~lanes;
        for (long rest = lanes; rest != 0; ) {
            long number = batch[Long.numberOfTrailingZeros(rest)];
            long together = at(number, rest);
            finished.accept(number, together, ended);
            for (long some = together; some != 0; some &= some - 1) {
                batch[Long.numberOfTrailingZeros(some)] = number + 1;
            }
            rest &= ~together;
        }
    }
}
