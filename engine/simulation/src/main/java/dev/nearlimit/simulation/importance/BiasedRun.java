package dev.nearlimit.simulation.importance;

import dev.nearlimit.codes.batch.FrameBatch;
import dev.nearlimit.simulation.RunControl;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.concurrent.ExecutionException;
import java.util.concurrent.ExecutorService;
import java.util.concurrent.Executors;
import java.util.concurrent.Future;
import java.util.function.Supplier;

/**
 * One run at one point, shared by its threads: hands out blocks of frames in order, takes them in any order and adds them
 * up in theirs, so that rounding is the same for any number of threads.
 */
final class BiasedRun {
    private static final int FRAMES_PER_BLOCK = 8 * FrameBatch.FRAMES;

    private final Supplier<BiasedFrameWorker> workers;
    private final long frames;
    private final RunControl control;
    private final Map<Long, WeightTally> waiting = new HashMap<>();
    private WeightTally total = WeightTally.NONE;
    private long nextToHandOut;
    private long nextToCount;
    private boolean ended;

    BiasedRun(Supplier<BiasedFrameWorker> workers, long frames, RunControl control) {
        this.workers = workers;
        this.frames = frames;
        this.control = control;
    }

    /** Runs to the end; an interrupt ends it early but leaves no thread behind. */
    WeightTally onThreads(int threads) {
        ExecutorService helpers = Executors.newCachedThreadPool(task -> {
            Thread thread = new Thread(task, "importance-sampling");
            thread.setDaemon(true);
            return thread;
        });
        try {
            List<Future<?>> started = new ArrayList<>();
            for (int t = 1; t < threads; t++) {
                started.add(helpers.submit(this::work));
            }
            work();
            started.forEach(this::await);
            return total();
        } finally {
            end();
            helpers.shutdown();
        }
    }

    private void await(Future<?> helper) {
        boolean interrupted = false;
        while (true) {
            try {
                helper.get();
                break;
            } catch (InterruptedException e) {
                interrupted = true;
                end();
            } catch (ExecutionException e) {
                if (e.getCause() instanceof RuntimeException cause) {
                    throw cause;
                }
                throw new IllegalStateException("a worker failed", e.getCause());
            }
        }
        if (interrupted) {
            Thread.currentThread().interrupt();
        }
    }

    private void work() {
        try {
            BiasedFrameWorker worker = workers.get();
            for (long block = handOut(); block >= 0; block = handOut()) {
                Optional<WeightTally> tally = compute(worker, block);
                if (tally.isEmpty()) {
                    end();
                } else {
                    count(block, tally.get());
                }
            }
        } catch (RuntimeException | Error e) {
            end();
            throw e;
        }
    }

    /** One block; empty if the run was told to end before it was done. */
    private Optional<WeightTally> compute(BiasedFrameWorker worker, long block) {
        long first = block * FRAMES_PER_BLOCK;
        long end = Math.min(frames, first + FRAMES_PER_BLOCK);
        WeightTally tally = WeightTally.NONE;
        for (long at = first; at < end; at += FrameBatch.FRAMES) {
            if (control.stopRequested()) {
                return Optional.empty();
            }
            tally = tally.then(worker.compute(at, (int) Math.min(FrameBatch.FRAMES, end - at)));
        }
        return Optional.of(tally);
    }

    private synchronized long handOut() {
        if (ended || nextToHandOut * FRAMES_PER_BLOCK >= frames || control.stopRequested()) {
            return -1;
        }
        return nextToHandOut++;
    }

    private synchronized void count(long block, WeightTally tally) {
        waiting.put(block, tally);
        for (WeightTally next = waiting.remove(nextToCount); next != null; next = waiting.remove(nextToCount)) {
            nextToCount++;
            total = total.then(next);
        }
        control.progress().counted(total.frames(), total.errors());
    }

    private synchronized void end() {
        ended = true;
    }

    private synchronized WeightTally total() {
        return total;
    }
}
