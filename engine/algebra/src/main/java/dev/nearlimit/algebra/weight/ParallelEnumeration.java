package dev.nearlimit.algebra.weight;

import java.util.concurrent.CancellationException;
import java.util.concurrent.ExecutionException;
import java.util.concurrent.ExecutorCompletionService;
import java.util.concurrent.ExecutorService;
import java.util.concurrent.Executors;
import java.util.concurrent.Future;
import java.util.concurrent.TimeUnit;
import java.util.concurrent.atomic.AtomicInteger;

/**
 * Shares the parts of one enumeration out to threads, each with its own kernel and totals. Sums of integers do not care
 * about order, so the result is the same for any number of threads.
 */
final class ParallelEnumeration {
    private static final long LISTENER_INTERVAL_MS = 100;

    private final WordKernel.Basis basis;
    private final AtomicInteger nextPart = new AtomicInteger();
    private final AtomicInteger partsDone = new AtomicInteger();
    private volatile boolean ended;

    private ParallelEnumeration(WordKernel.Basis basis) {
        this.basis = basis;
    }

    /**
     * Enumerates all words.
     *
     * @param n length
     * @param words basis words, packed
     * @param threads at least 1
     * @param listener called from the calling thread, about ten times a second and at the end
     */
    static WordTotals run(int n, long[][] words, int threads, EnumerationListener listener) {
        if (threads < 1) {
            throw new IllegalArgumentException("number of threads is " + threads + ", must be at least 1");
        }
        return new ParallelEnumeration(new WordKernel.Basis(n, words)).run(threads, listener);
    }

    private WordTotals run(int threads, EnumerationListener listener) {
        int workers = Math.min(threads, basis.parts());
        ExecutorService pool = Executors.newFixedThreadPool(workers, task -> {
            Thread thread = new Thread(task, "weight-enumeration");
            thread.setDaemon(true);
            return thread;
        });
        try {
            ExecutorCompletionService<WordTotals> finished = new ExecutorCompletionService<>(pool);
            for (int worker = 0; worker < workers; worker++) {
                finished.submit(this::work);
            }
            return collect(finished, workers, listener);
        } catch (InterruptedException interrupted) {
            Thread.currentThread().interrupt();
            throw ended();
        } finally {
            ended = true;
            pool.shutdownNow();
        }
    }

    private WordTotals work() {
        WordTotals totals = new WordTotals(new long[basis.n() + 1], new long[basis.n() + 1]);
        WordKernel kernel = new WordKernel(basis);
        for (int part = nextPart.getAndIncrement(); part < basis.parts() && !ended; part = nextPart.getAndIncrement()) {
            kernel.enumerate(part, totals.counts(), totals.messageWeights());
            partsDone.incrementAndGet();
        }
        return totals;
    }

    private WordTotals collect(
            ExecutorCompletionService<WordTotals> finished, int workers, EnumerationListener listener)
            throws InterruptedException {
        WordTotals sum = new WordTotals(new long[basis.n() + 1], new long[basis.n() + 1]);
        int working = workers;
        while (working > 0) {
            Future<WordTotals> one = finished.poll(LISTENER_INTERVAL_MS, TimeUnit.MILLISECONDS);
            if (one != null) {
                add(one, sum);
                working--;
            }
            if (!listener.proceed(partsDone.get() * basis.wordsPerPart(), basis.parts() * basis.wordsPerPart())) {
                throw ended();
            }
        }
        return sum;
    }

    private static void add(Future<WordTotals> finished, WordTotals sum) throws InterruptedException {
        try {
            WordTotals totals = finished.get();
            for (int w = 0; w < sum.counts().length; w++) {
                sum.counts()[w] += totals.counts()[w];
                sum.messageWeights()[w] += totals.messageWeights()[w];
            }
        } catch (ExecutionException failed) {
            throw new IllegalStateException("enumeration failed", failed.getCause());
        }
    }

    private CancellationException ended() {
        return new CancellationException("enumeration ended after " + partsDone.get() * basis.wordsPerPart() + " of "
                + basis.parts() * basis.wordsPerPart() + " words");
    }
}
