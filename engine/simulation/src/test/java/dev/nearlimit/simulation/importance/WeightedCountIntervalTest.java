package dev.nearlimit.simulation.importance;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import dev.nearlimit.simulation.statistics.Interval;
import java.util.Random;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class WeightedCountIntervalTest {
    /** Equal weights make it the exact Poisson interval of F. Garwood, Biometrika 28, 1936 (two decimals, from memory). */
    @ParameterizedTest
    @CsvSource({"1, 0.03, 5.57", "5, 1.62, 11.67", "10, 4.80, 18.39", "20, 12.22, 30.89", "100, 81.36, 121.63"})
    void equalWeightsGiveThePoissonInterval(int errors, double low, double high) {
        double weight = 1e-7;
        WeightTally tally = WeightTally.NONE.withFrames(1000);
        for (int i = 0; i < errors; i++) {
            tally = tally.withError(weight);
        }
        Interval interval = WeightedCountInterval.of(tally, 1, 0.95);
        assertEquals(low, interval.low() * 1000 / weight, 5.1e-3);
        assertEquals(high, interval.high() * 1000 / weight, 5.1e-3);
    }

    @Test
    void withoutErrorsTheLargestPossibleWeightCounts() {
        Interval interval = WeightedCountInterval.of(WeightTally.NONE.withFrames(1000), 1e-4, 0.95);
        assertEquals(0, interval.low());
        // -ln 0.025 events at most.
        assertEquals(3.6889 * 1e-7, interval.high(), 1e-11);
        assertEquals(new Interval(0, 1), WeightedCountInterval.of(WeightTally.NONE, 1, 0.95));
    }

    /**
     * Weights exp(2 u) of events of probability 1/4: their mean is 1/4 (e^2 - 1)/2. Of 4000 runs at least 95 % must
     * cover it; fewer than 93.2 % would, by a binomial tail, happen with probability below 1e-6 if it were exactly 95 %.
     */
    @ParameterizedTest
    @CsvSource({"40", "400"})
    void coversAsOftenAsItSays(int frames) {
        Random random = new Random(frames);
        double truth = 0.25 * (Math.exp(2) - 1) / 2;
        int covered = 0;
        for (int run = 0; run < 4000; run++) {
            WeightTally tally = WeightTally.NONE.withFrames(frames);
            for (int f = 0; f < frames; f++) {
                if (random.nextInt(4) == 0) {
                    tally = tally.withError(Math.exp(2 * random.nextDouble()));
                }
            }
            // Scaled down, so that the interval is not cut off at 1.
            WeightTally small = new WeightTally(
                    tally.frames(), tally.errors(), tally.sum() / 100, tally.squares() / 1e4, tally.largest() / 100);
            covered += WeightedCountInterval.of(small, 1, 0.95).contains(truth / 100) ? 1 : 0;
        }
        assertTrue(covered > 3728, "covered " + covered + " of 4000");
    }
}
