package dev.nearlimit.numerics.kernels;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;

import java.util.ArrayList;
import java.util.List;
import java.util.Random;
import java.util.concurrent.ExecutorService;
import java.util.concurrent.Executors;
import java.util.concurrent.Future;
import org.junit.jupiter.api.Test;

/** One set of kernels serves all threads, so that it may keep nothing of a call. */
class SharedKernelsTest {
    private static final int ROWS = 16;
    private static final int ROUNDS = 3000;

    @Test
    void threadsDoNotDisturbEachOthersNoise() throws Exception {
        NoiseKernels shared = new PlainNoiseKernels();
        int threads = 4;
        ExecutorService pool = Executors.newFixedThreadPool(threads);
        try {
            List<Future<int[]>> together = new ArrayList<>();
            for (int t = 0; t < threads; t++) {
                long seed = t;
                together.add(pool.submit(() -> digest(shared, seed)));
            }
            for (int t = 0; t < threads; t++) {
                assertArrayEquals(
                        digest(new PlainNoiseKernels(), t), together.get(t).get(), "thread " + t);
            }
        } finally {
            pool.shutdownNow();
        }
    }

    private static int[] digest(NoiseKernels kernels, long seed) {
        long[] state = new Random(seed).longs(4L * 64).toArray();
        int[] high = new int[ROWS * 64];
        int[] low = new int[ROWS * 64];
        int[] sums = new int[2];
        for (int round = 0; round < ROUNDS; round++) {
            kernels.halves(state, high, low, ROWS);
            for (int i = 0; i < high.length; i++) {
                sums[0] = 31 * sums[0] + high[i];
                sums[1] = 31 * sums[1] + low[i];
            }
        }
        return sums;
    }
}
