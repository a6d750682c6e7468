package dev.nearlimit.simulation;

import java.util.Arrays;
import java.util.SplittableRandom;

/** Random blocks for tests. */
final class Blocks {
    private Blocks() {}

    static Block random(SplittableRandom random, int frames) {
        double rate = random.nextInt(3) / 2.5;
        int[] failed = new int[frames];
        int count = 0;
        for (int f = 0; f < frames; f++) {
            if (random.nextDouble() < rate) {
                failed[count++] = f;
            }
        }
        int[] bitErrors = random.ints(count, 0, 500).toArray();
        boolean[] undetected = new boolean[count];
        for (int i = 0; i < count; i++) {
            undetected[i] = bitErrors[i] > 0 && random.nextBoolean();
        }
        int most = 1 << random.nextInt(8);
        int[] iterations = random.nextInt(4) == 0
                ? new int[0]
                : random.ints(frames, 2, 2 + most).toArray();
        return new Block(frames, Arrays.copyOf(failed, count), bitErrors, undetected, iterations);
    }
}
