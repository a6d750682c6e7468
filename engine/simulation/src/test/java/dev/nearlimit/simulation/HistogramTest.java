package dev.nearlimit.simulation;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.Arrays;
import java.util.SplittableRandom;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

class HistogramTest {
    /** Against the sorted list of what was counted. */
    @ParameterizedTest
    @ValueSource(longs = {1, 2, 3, 4, 5, 6, 7, 8})
    void summaryIsThatOfTheList(long seed) {
        SplittableRandom random = new SplittableRandom(seed);
        int[] values = random.ints(1 + random.nextInt(200), 0, 1 + random.nextInt(90))
                .sorted()
                .toArray();
        Histogram.Counter counter = new Histogram.Counter();
        for (int value : values) {
            counter.add(value);
        }
        Histogram histogram = counter.toHistogram();
        String message = "seed " + seed;
        assertEquals(values.length, histogram.total(), message);
        assertEquals(values[values.length - 1], histogram.largest(), message);
        assertEquals(Arrays.stream(values).average().orElseThrow(), histogram.mean(), 1e-12, message);
        for (double share : new double[] {1e-9, 0.25, 0.5, 0.9, 1}) {
            int rank = Math.max(1, (int) Math.ceil(share * values.length));
            assertEquals(values[rank - 1], histogram.quantile(share), message + ", share " + share);
        }
        assertEquals(Arrays.stream(values).filter(v -> v >= 3 && v <= 40).count(), histogram.count(3, 40), message);
        assertEquals(Arrays.stream(values).filter(v -> v == 7).count(), histogram.count(7), message);
    }

    @Test
    void nothingHasNoMean() {
        Histogram nothing = new Histogram.Counter().toHistogram();
        assertEquals(Double.NaN, nothing.mean());
        assertEquals(-1, nothing.quantile(0.5));
        assertEquals(-1, nothing.largest());
        assertEquals(Histogram.of(0, 0), nothing);
    }
}
