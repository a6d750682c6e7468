package dev.nearlimit.simulation;

import dev.nearlimit.journal.ContentHash;
import java.util.BitSet;
import java.util.HashMap;
import java.util.Map;

/**
 * Counts where a simulator's blocks came from. A block that a search comes back to counts once, as what it was at
 * first: one bit a block is remembered, so that days of work take a few megabytes.
 */
final class BlockTally {
    private final Map<ContentHash, BitSet> seen = new HashMap<>();
    private long computed;
    private long found;
    private long framesComputed;

    synchronized void computed(ContentHash job, long block, int frames) {
        see(job, block);
        computed++;
        framesComputed += frames;
    }

    synchronized void found(ContentHash job, long block) {
        if (see(job, block)) {
            found++;
        }
    }

    /** Whether the block is seen for the first time. */
    private boolean see(ContentHash job, long block) {
        BitSet blocks = seen.computeIfAbsent(job, key -> new BitSet());
        int number = Math.toIntExact(block);
        boolean first = !blocks.get(number);
        blocks.set(number);
        return first;
    }

    synchronized BlockOrigins origins() {
        return new BlockOrigins(computed, found, framesComputed);
    }
}
