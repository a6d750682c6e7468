package dev.nearlimit.simulation;

import dev.nearlimit.journal.Claim;
import dev.nearlimit.journal.ContentHash;
import dev.nearlimit.journal.Journal;
import java.util.ArrayDeque;
import java.util.Map;
import java.util.Optional;
import java.util.TreeMap;

/**
 * The numbers of a point's blocks that a run may compute, claimed from the journal in stretches of about a quarter of a
 * second, so that runs of the same point in several processes share the work. Blocks that somebody else has under way
 * are awaited, and taken over if that somebody is gone. Which run computes a block is a matter of time; what the block
 * contains is not. Not shared by threads.
 */
final class BlockLease {
    private static final long STRETCH_NS = 250_000_000;
    private static final int FIRST_BLOCKS = 4;
    private static final int MOST_BLOCKS = 256;

    private final Journal journal;
    private final ContentHash job;
    private final long end;
    /** Blocks left out because they were kept or under way elsewhere: first block to the one after the last. */
    private final TreeMap<Long, Long> awaited = new TreeMap<>();
    /** Claims of which some blocks may not have been counted yet. */
    private final ArrayDeque<Claim> claims = new ArrayDeque<>();

    /** Claimed blocks that were not handed out yet: the next one of each stretch and the one after its last. */
    private final ArrayDeque<long[]> stretches = new ArrayDeque<>();

    private long beyond;
    private int blocks = FIRST_BLOCKS;
    private long lastNs = System.nanoTime();

    /**
     * A lease on nothing yet.
     *
     * @param first block to begin with
     * @param end block after the last that the run may need
     */
    BlockLease(Journal journal, ContentHash job, long first, long end) {
        this.journal = journal;
        this.job = job;
        this.beyond = first;
        this.end = end;
    }

    /** The next claimed block below a limit, or -1 if there is none. */
    long next(long limit) {
        long[] stretch = stretches.peek();
        if (stretch == null || stretch[0] >= limit) {
            return -1;
        }
        long block = stretch[0]++;
        if (stretch[0] == stretch[1]) {
            stretches.remove();
        }
        return block;
    }

    /** Whether somebody else is to deliver this block. */
    boolean awaits(long block) {
        Map.Entry<Long, Long> range = awaited.floorEntry(block);
        return range != null && block < range.getValue();
    }

    /** Whether nothing is left to hand out, to claim or to await. */
    boolean usedUp() {
        return beyond >= end && stretches.isEmpty() && awaited.isEmpty();
    }

    /** Notes that the first of the awaited blocks has arrived. */
    void arrived(long block) {
        long rangeEnd = awaited.remove(block);
        await(block + 1, rangeEnd);
    }

    private void await(long first, long last) {
        if (first < last) {
            awaited.put(first, last);
        }
    }

    /**
     * Claims the next stretch; first of all, blocks that nobody delivers any more, since counting waits for them.
     *
     * @param counted blocks counted so far
     * @param limit block that is too far ahead to begin with
     * @return whether a block was claimed
     */
    boolean extend(long counted, long limit) {
        claims.removeIf(claim -> claim.end() <= counted);
        adaptLength();
        return claimAbandoned() || (beyond < Math.min(limit, end) && claimNew());
    }

    private boolean claimAbandoned() {
        Map.Entry<Long, Long> range = awaited.firstEntry();
        if (range == null) {
            return false;
        }
        Optional<Claim> claim = journal.claim(job, range.getKey(), range.getValue(), blocks);
        if (claim.isEmpty()) {
            return false;
        }
        awaited.remove(range.getKey());
        await(range.getKey(), claim.get().first());
        await(claim.get().end(), range.getValue());
        take(claim.get());
        return true;
    }

    private boolean claimNew() {
        Optional<Claim> claim = journal.claim(job, beyond, end, blocks);
        await(beyond, claim.map(Claim::first).orElse(end));
        beyond = claim.map(Claim::end).orElse(end);
        claim.ifPresent(this::take);
        return claim.isPresent();
    }

    private void take(Claim claim) {
        claims.add(claim);
        stretches.push(new long[] {claim.first(), claim.end()});
    }

    private void adaptLength() {
        long nowNs = System.nanoTime();
        long tookNs = nowNs - lastNs;
        lastNs = nowNs;
        if (tookNs < STRETCH_NS / 2) {
            blocks = Math.min(MOST_BLOCKS, 2 * blocks);
        } else if (tookNs > 2 * STRETCH_NS) {
            blocks = Math.max(1, blocks / 2);
        }
    }

    /** Gives back what was claimed and not kept. */
    void release() {
        claims.forEach(journal::release);
        claims.clear();
        stretches.clear();
    }
}
