package dev.nearlimit.simulation;

import dev.nearlimit.codes.batch.FrameBatch;
import dev.nearlimit.journal.ContentHash;
import dev.nearlimit.journal.Journal;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.concurrent.ExecutionException;
import java.util.concurrent.ExecutorService;
import java.util.concurrent.Executors;
import java.util.concurrent.Future;

/**
 * Measures schemes point by point on several threads.
 *
 * <p>Frames are computed in numbered blocks, kept in the journal, and counted in frame order up to the exact frame at
 * which the stopping rule is met; so counts depend on neither threads nor block size, and a later run with a tighter
 * rule goes on from the blocks that are there. Runs may be started from several threads at once. Idle helper threads
 * end by themselves and do not keep the process alive.
 */
public final class Simulator {
    /** Schemes whose decoders are kept for a later point. */
    private static final int BENCHES_KEPT = 8;

    private final int threads;
    private final Journal journal;
    private final int framesPerBlock;
    private final BlockTally tally = new BlockTally();
    private final ExecutorService helpers = Executors.newCachedThreadPool(task -> {
        Thread thread = new Thread(task, "simulation");
        thread.setDaemon(true);
        return thread;
    });
    private final Map<Scheme, SchemeBench> benches = new LinkedHashMap<>(16, 0.75f, true) {
        private static final long serialVersionUID = 1L;

        @Override
        protected boolean removeEldestEntry(Map.Entry<Scheme, SchemeBench> eldest) {
            return size() > BENCHES_KEPT;
        }
    };

    /**
     * A simulator whose blocks take some tens of milliseconds.
     *
     * @param threads threads that work on a point, at least 1
     * @param journal where finished blocks are kept and looked for
     */
    public Simulator(int threads, Journal journal) {
        this(threads, journal, 0);
    }

    /**
     * A simulator with a stated block size.
     *
     * @param framesPerBlock frames in a block, a multiple of 64; 0 for a size by the scheme's cost
     */
    public Simulator(int threads, Journal journal, int framesPerBlock) {
        if (threads < 1) {
            throw new InvalidSimulationException("threads is " + threads + ", must be at least 1");
        }
        if (framesPerBlock < 0 || framesPerBlock % FrameBatch.FRAMES != 0) {
            throw new InvalidSimulationException(
                    "frames per block is " + framesPerBlock + ", must be a multiple of " + FrameBatch.FRAMES);
        }
        this.threads = threads;
        this.journal = journal;
        this.framesPerBlock = framesPerBlock;
    }

    /**
     * Counts frames and errors of a scheme at a point.
     *
     * @param seed the user's seed; the same seed gives the same frames
     * @param rule when the point is finished
     * @param control how the run is watched and ended early
     * @return counts up to the frame that met the rule; after an early end, of all frames without a gap, marked incomplete
     * @throws InvalidSimulationException if the point does not fit the channel
     * @throws dev.nearlimit.decoders.InvalidDecoderException if the decoder does not fit the code or the quantiser
     */
    public PointCounts run(Scheme scheme, Point point, long seed, StoppingRule rule, RunControl control) {
        return measure(scheme, point, seed, rule, control).counts();
    }

    /**
     * As {@link #run}, with all that was seen beside the counts: histograms, and which frames failed.
     *
     * @throws InvalidSimulationException if the point does not fit the channel
     * @throws dev.nearlimit.decoders.InvalidDecoderException if the decoder does not fit the code or the quantiser
     */
    public PointOutcome measure(Scheme scheme, Point point, long seed, StoppingRule rule, RunControl control) {
        PointStreams streams = new PointStreams(scheme, point, seed);
        SchemeBench bench = bench(scheme);
        ContentHash job = bench.jobKey(point, seed);
        journal.describe(job, bench.description(point, seed));
        PointRun run = new PointRun(bench, streams, journal, job, rule, control, tally);
        run.countKept();
        if (run.met()) {
            return run.outcome();
        }
        List<Future<?>> started = new ArrayList<>();
        for (int t = 1; t < threads; t++) {
            started.add(helpers.submit(run::work));
        }
        run.work();
        await(started, run);
        run.close();
        return run.outcome();
    }

    /** Where the blocks came from, over all runs so far. */
    public BlockOrigins blocks() {
        return tally.origins();
    }

    /** Threads that work on a point. */
    public int threads() {
        return threads;
    }

    private SchemeBench bench(Scheme scheme) {
        synchronized (benches) {
            return benches.computeIfAbsent(scheme, s -> new SchemeBench(s, framesPerBlock));
        }
    }

    /** Waits for every helper; an interrupt ends the run early but never leaves a helper behind. */
    private static void await(List<Future<?>> started, PointRun run) {
        boolean interrupted = false;
        for (Future<?> helper : started) {
            while (true) {
                try {
                    helper.get();
                    break;
                } catch (InterruptedException e) {
                    interrupted = true;
                    run.end();
                } catch (ExecutionException e) {
                    throw new IllegalStateException("a worker let an exception through", e);
                }
            }
        }
        if (interrupted) {
            Thread.currentThread().interrupt();
        }
    }
}
