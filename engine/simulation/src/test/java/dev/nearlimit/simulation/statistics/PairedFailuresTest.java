package dev.nearlimit.simulation.statistics;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import dev.nearlimit.simulation.FailedFrames;
import java.util.SplittableRandom;
import java.util.stream.LongStream;
import org.apache.commons.math3.stat.inference.AlternativeHypothesis;
import org.apache.commons.math3.stat.inference.BinomialTest;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

class PairedFailuresTest {
    @ParameterizedTest
    @ValueSource(longs = {1, 2, 3, 4, 5, 6})
    void framesThatOnlyOneFailedAreCounted(long seed) {
        SplittableRandom random = new SplittableRandom(seed);
        int frames = 1000;
        boolean[][] failed = new boolean[2][frames];
        int[] counted = {frames - random.nextInt(500), frames - random.nextInt(500)};
        for (int f = 0; f < frames; f++) {
            failed[0][f] = random.nextInt(5) == 0;
            failed[1][f] = random.nextInt(3) == 0 ? failed[0][f] : random.nextInt(7) == 0;
        }
        long[] count = new long[4];
        for (int f = 0; f < Math.min(counted[0], counted[1]); f++) {
            count[(failed[0][f] ? 1 : 0) + (failed[1][f] ? 2 : 0)]++;
        }
        assertEquals(
                new PairedFailures(Math.min(counted[0], counted[1]), count[3], count[1], count[2]),
                PairedFailures.of(set(failed[0], counted[0]), set(failed[1], counted[1])),
                "seed " + seed);
    }

    private static FailedFrames set(boolean[] failed, int counted) {
        return FailedFrames.of(
                counted,
                LongStream.range(0, counted).filter(f -> failed[(int) f]).toArray());
    }

    /** The library's binomial test is the judge, but for an even split, whose middle it counts twice. */
    @ParameterizedTest
    @CsvSource({"0, 0", "1, 0", "3, 3", "0, 5", "12, 4", "40, 41", "100, 60", "2, 900"})
    void signTestIsThatOfAFairCoin(int onlyFirst, int onlySecond) {
        double expected = onlyFirst == onlySecond
                ? 1
                : new BinomialTest()
                        .binomialTest(onlyFirst + onlySecond, onlyFirst, 0.5, AlternativeHypothesis.TWO_SIDED);
        assertEquals(
                expected,
                new PairedFailures(10_000, 7, onlyFirst, onlySecond).signTest(),
                1e-9 * Math.max(expected, 1e-3));
    }

    @Test
    void farTailsKeepTheirSize() {
        // 2 * 2^-1000, from the definition.
        assertEquals(1, new PairedFailures(5000, 0, 0, 1000).signTest() / Math.pow(2, -999), 1e-9);
    }

    /**
     * Two schemes of equal worth, the count ended by the tenth failure of either, a third of the failures common: p below
     * 0.05 comes up in at most 5 % of 20000 trials. True 5 % would go beyond 5.8 % with probability below 1e-6.
     */
    @Test
    void endingOnFailuresDoesNotFeignDifferences() {
        SplittableRandom random = new SplittableRandom(11);
        int alarms = 0;
        for (int trial = 0; trial < 20_000; trial++) {
            long[] only = new long[2];
            long both = 0;
            while (Math.max(only[0], only[1]) + both < 10) {
                if (random.nextInt(3) == 0) {
                    both++;
                } else {
                    only[random.nextInt(2)]++;
                }
            }
            alarms += new PairedFailures(1000, both, only[0], only[1]).signTest() <= 0.05 ? 1 : 0;
        }
        assertTrue(alarms <= 0.058 * 20_000, alarms + " false alarms in 20000");
        assertTrue(alarms > 0);
    }
}
