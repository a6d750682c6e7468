package dev.nearlimit.journal;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.Random;
import java.util.concurrent.ExecutionException;
import java.util.concurrent.ExecutorService;
import java.util.concurrent.Executors;
import java.util.concurrent.Future;
import org.junit.jupiter.api.Test;

/** What every journal that keeps anything does. */
abstract class JournalContract {
    static final ContentHash JOB = ContentHash.builder().add("job", 1).build();
    static final ContentHash OTHER = ContentHash.builder().add("job", 2).build();

    abstract Journal journal();

    @Test
    void findsWhatWasKeptAndNothingElse() {
        Journal journal = journal();
        assertEquals(Optional.empty(), journal.find(JOB, 0));
        journal.keep(JOB, 0, new byte[] {1, 2, 3});
        journal.keep(JOB, Long.MAX_VALUE, new byte[0]);
        assertArrayEquals(new byte[] {1, 2, 3}, journal.find(JOB, 0).orElseThrow());
        assertArrayEquals(new byte[0], journal.find(JOB, Long.MAX_VALUE).orElseThrow());
        assertEquals(Optional.empty(), journal.find(JOB, 1));
        assertEquals(Optional.empty(), journal.find(OTHER, 0));
    }

    @Test
    void keepingTwiceIsHarmless() {
        Journal journal = journal();
        journal.keep(JOB, 5, new byte[] {7});
        journal.keep(JOB, 5, new byte[] {7});
        assertArrayEquals(new byte[] {7}, journal.find(JOB, 5).orElseThrow());
    }

    @Test
    void arraysAreNotShared() {
        Journal journal = journal();
        byte[] content = {1};
        journal.keep(JOB, 0, content);
        content[0] = 2;
        journal.find(JOB, 0).orElseThrow()[0] = 3;
        assertArrayEquals(new byte[] {1}, journal.find(JOB, 0).orElseThrow());
    }

    @Test
    void severalThreadsLoseNothing() throws InterruptedException, ExecutionException {
        Journal journal = journal();
        int threads = 4;
        int pieces = 200;
        ExecutorService workers = Executors.newFixedThreadPool(threads);
        List<Future<?>> running = new ArrayList<>();
        for (int t = 0; t < threads; t++) {
            int first = t;
            running.add(workers.submit(() -> {
                // Neighbours overlap, as two runs of the same job do.
                for (int i = first * pieces / 2; i < first * pieces / 2 + pieces; i++) {
                    if (journal.find(JOB, i).isEmpty()) {
                        journal.keep(JOB, i, content(i));
                    }
                }
            }));
        }
        for (Future<?> worker : running) {
            worker.get();
        }
        workers.shutdown();
        for (int i = 0; i < (threads + 1) * pieces / 2; i++) {
            assertArrayEquals(content(i), journal.find(JOB, i).orElseThrow(), "piece " + i);
        }
    }

    /** What piece i contains: bytes that depend on i alone, of a length up to 2000. */
    static byte[] content(long i) {
        Random random = new Random(i);
        byte[] content = new byte[random.nextInt(2000)];
        random.nextBytes(content);
        return content;
    }
}
