package dev.nearlimit.simulation;

import dev.nearlimit.journal.ContentHash;
import dev.nearlimit.journal.Journal;
import dev.nearlimit.simulation.link.Link;
import dev.nearlimit.simulation.link.Payload;
import java.util.HashMap;
import java.util.Map;
import java.util.Optional;

/**
 * One run of one point, shared by its threads: hands out block numbers in order, takes finished blocks in any order and
 * counts them in theirs. A block that was begun is finished and kept even when the rule is met meanwhile.
 */
final class PointRun {
    private final SchemeBench bench;
    private final PointStreams streams;
    private final Journal journal;
    private final ContentHash job;
    private final RunControl control;
    private final BlockTally tally;
    private final long blocksAtMost;

    private final PrefixCounter counter;
    private final Map<Long, Block> waiting = new HashMap<>();
    private long nextToHandOut;
    private long nextToCount;
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
    void countKept() {
        for (long block = handOut(); block >= 0; block = handOut()) {
            Optional<byte[]> kept = journal.find(job, block);
            if (kept.isEmpty()) {
                handBack();
                return;
            }
            tally.found(job, block);
            count(block, Block.fromBytes(kept.get()));
        }
    }

    /** Takes back the number handed out last. */
    private synchronized void handBack() {
        nextToHandOut--;
    }

    /** Whether nothing is left to do. */
    synchronized boolean met() {
        return counter.met();
    }

    /** Works until the run ends; what goes wrong is kept for {@link #outcome()}. */
    void work() {
        try {
            FrameWorker worker = bench.take();
            PointWorker chain = new PointWorker(worker);
            for (long block = handOut(); block >= 0; block = handOut()) {
                Optional<Block> result = chain.findOrCompute(block);
                if (result.isEmpty()) {
                    end();
                } else {
                    count(block, result.get());
                }
            }
            bench.giveBack(worker);
        } catch (RuntimeException | Error e) {
            fail(e);
        }
    }

    /** A worker with this point's payload and link. */
    private final class PointWorker {
        private final FrameWorker worker;
        private final Payload payload = streams.newPayload();
        private final Link link = streams.newLink();

        PointWorker(FrameWorker worker) {
            this.worker = worker;
        }

        Optional<Block> findOrCompute(long number) {
            Optional<byte[]> kept = journal.find(job, number);
            if (kept.isPresent()) {
                tally.found(job, number);
                return Optional.of(Block.fromBytes(kept.get()));
            }
            Optional<Block> block = worker.compute(number, payload, link, control);
            if (block.isPresent()) {
                journal.keep(job, number, block.get().toBytes());
                tally.computed(job, number, bench.framesPerBlock());
            }
            return block;
        }
    }

    private synchronized long handOut() {
        if (ended || counter.met() || nextToHandOut >= blocksAtMost || control.stopRequested()) {
            return -1;
        }
        return nextToHandOut++;
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
            PointCounts counts = counter.counts();
            control.progress().counted(counts.frames(), counts.frameErrors());
        }
    }

    synchronized void end() {
        ended = true;
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
