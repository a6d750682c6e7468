package dev.nearlimit.simulation;

import dev.nearlimit.journal.ContentHash;
import dev.nearlimit.journal.Journal;
import dev.nearlimit.simulation.link.Link;
import dev.nearlimit.simulation.link.Payload;
import java.util.HashMap;
import java.util.Map;
import java.util.Optional;

/**
 * One run of one point, shared by its threads: hands out numbers of blocks that the journal gives it to compute, takes
 * finished blocks in any order and counts them in theirs, with those that other runs of the same point have put into the
 * journal meanwhile. A block that was begun is finished and kept even when the rule is met meanwhile.
 */
final class PointRun {
    /** How far blocks may be computed ahead of one that is missing; keeps memory flat where somebody else holds it. */
    private static final long MOST_BLOCKS_AHEAD = 1024;

    /** How often the journal is asked for a block that somebody else has under way [ms]. */
    private static final long POLL_MS = 50;

    private static final long NONE = -1;

    private final SchemeBench bench;
    private final PointStreams streams;
    private final Journal journal;
    private final ContentHash job;
    private final RunControl control;
    private final BlockTally tally;
    private final long blocksAtMost;

    private final PrefixCounter counter;
    private final Map<Long, Block> waiting = new HashMap<>();
    private long nextToCount;
    private BlockLease lease;
    private Throwable failure;
    private boolean ended;

    PointRun(
            SchemeBench bench,
            PointStreams streams,
            Journal journal,
            ContentHash job,
            StoppingRule rule,
            RunControl control,
            BlockTally tally) {
        this.bench = bench;
        this.streams = streams;
        this.journal = journal;
        this.job = job;
        this.counter = new PrefixCounter(rule);
        this.control = control;
        this.tally = tally;
        this.blocksAtMost = (rule.maxFrames() - 1) / bench.framesPerBlock() + 1;
    }

    /**
     * Counts the blocks that the journal has from the first one on. Called before any thread works, so that a point that
     * needs nothing more makes no thread run ahead.
     */
    synchronized void countKept() {
        boolean found = true;
        while (found && !counter.met() && !control.stopRequested()) {
            found = countKept(nextToCount);
        }
        lease = new BlockLease(journal, job, nextToCount, blocksAtMost);
    }

    /** Counts a block if the journal has it. */
    private boolean countKept(long block) {
        Optional<byte[]> kept = journal.find(job, block);
        if (kept.isEmpty()) {
            return false;
        }
        tally.found(job, block);
        count(block, Block.fromBytes(kept.get()));
        return true;
    }

    /** Whether nothing is left to do. */
    synchronized boolean met() {
        return counter.met();
    }

    /** Works until the run ends; what goes wrong is kept for {@link #outcome()}. */
    void work() {
        try {
            FrameWorker worker = bench.take();
            Feed feed = new Feed(streams.newPayload(), streams.newLink());
            while (feed.await()) {
                worker.run(feed, feed.payload, feed.link, control);
            }
            bench.giveBack(worker);
        } catch (RuntimeException | Error e) {
            fail(e);
        }
    }

    /** What one worker gets its blocks from and delivers them to, with its payload and link. */
    private final class Feed implements FrameWorker.BlockFeed {
        private final Payload payload;
        private final Link link;
        private long awaited = NONE;

        Feed(Payload payload, Link link) {
            this.payload = payload;
            this.link = link;
        }

        /** Waits for a block to compute; false when there will be none. */
        boolean await() {
            awaited = nextToCompute(true);
            return awaited != NONE;
        }

        @Override
        public long next() {
            if (awaited == NONE) {
                return nextToCompute(false);
            }
            long block = awaited;
            awaited = NONE;
            return block;
        }

        private long nextToCompute(boolean mayWait) {
            long block = handOut(mayWait);
            while (block != NONE && countKept(block)) {
                block = handOut(mayWait);
            }
            return block;
        }

        @Override
        public void done(long number, Block block) {
            journal.keep(job, number, block.toBytes());
            tally.computed(job, number, bench.framesPerBlock());
            count(number, block);
        }
    }

    /**
     * The next block to compute. Where nothing is left but what other runs of this point have under way, waits for them;
     * but a worker that has frames of its own under way must not, since those runs may be waiting for these.
     */
    private synchronized long handOut(boolean mayWait) {
        while (!ended && !control.stopRequested()) {
            while (lease.awaits(nextToCount) && !counter.met() && countAwaited()) {
                // Each round counts one block more.
            }
            if (counter.met() || lease.usedUp()) {
                break;
            }
            long limit = nextToCount + MOST_BLOCKS_AHEAD;
            long block = lease.next(limit);
            if (block != NONE) {
                return block;
            }
            if (!lease.extend(nextToCount, limit)) {
                if (!mayWait) {
                    break;
                }
                pause();
            }
        }
        return NONE;
    }

    private boolean countAwaited() {
        long block = nextToCount;
        boolean found = countKept(block);
        if (found) {
            lease.arrived(block);
        }
        return found;
    }

    private void pause() {
        try {
            wait(POLL_MS);
        } catch (InterruptedException e) {
            // Asked next whether to stop, the run finds its thread interrupted.
            Thread.currentThread().interrupt();
        }
    }

    private synchronized void count(long number, Block block) {
        waiting.put(number, block);
        boolean counted = false;
        for (Block next = waiting.remove(nextToCount); next != null; next = waiting.remove(nextToCount)) {
            nextToCount++;
            if (!counter.met()) {
                counter.add(next);
                counted = true;
            }
        }
        if (counted) {
            notifyAll();
            PointCounts counts = counter.counts();
            control.progress().counted(counts.frames(), counts.frameErrors());
        }
    }

    synchronized void end() {
        ended = true;
    }

    /** Called once all threads have stopped working: gives back what was not computed and has the journal write. */
    synchronized void close() {
        try {
            lease.release();
            journal.flush();
        } catch (RuntimeException e) {
            fail(e);
        }
    }

    private synchronized void fail(Throwable thrown) {
        if (failure == null) {
            failure = thrown;
        }
        ended = true;
    }

    /** What was counted, once all threads have stopped working; throws what any of them threw. */
    synchronized PointOutcome outcome() {
        if (failure instanceof RuntimeException e) {
            throw e;
        }
        if (failure instanceof Error e) {
            throw e;
        }
        return counter.outcome();
    }
}
