package dev.nearlimit.simulation.statistics;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import dev.nearlimit.simulation.InvalidSimulationException;
import dev.nearlimit.simulation.PointCounts;
import dev.nearlimit.simulation.StoppingRule;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

class RelativeWidthTest {
    /** Whatever the rate, the interval is as narrow as was asked for; at a small rate one error fewer would not do. */
    @ParameterizedTest
    @ValueSource(doubles = {3, 1, 0.5, 0.2, 0.1, 0.05})
    void intervalIsAsNarrowAsAskedFor(double width) {
        long r = RelativeWidth.frameErrors(width);
        for (double rate : new double[] {1e-9, 1e-6, 1e-3, 0.01, 0.1, 0.3, 0.6, 0.9, 1}) {
            long frames = Math.max(r, Math.round(r / rate));
            assertTrue(relativeWidth(r, frames) <= width * (1 + 1e-9), "rate " + rate + ", " + r + " errors");
        }
        if (r > 1) {
            assertTrue(relativeWidth(r - 1, Math.round(r / 1e-9)) > width, "one fewer than " + r + " errors");
        }
    }

    private static double relativeWidth(long r, long frames) {
        Interval interval = new ErrorRateIntervals()
                .frameErrorRate(new PointCounts(frames, r, 0, 0, 0, 0, true), new StoppingRule(Long.MAX_VALUE, r));
        return (interval.high() - interval.low()) / ((double) r / frames);
    }

    /** The normal approximation, 2 * 1.96 / sqrt(r) (common practice), is near for many errors. */
    @Test
    void manyErrorsFollowTheNormalApproximation() {
        assertEquals(1, RelativeWidth.frameErrors(0.01) * 0.01 * 0.01 / Math.pow(2 * 1.959964, 2), 0.001);
        assertEquals(1, RelativeWidth.frameErrors(0.001) * 0.001 * 0.001 / Math.pow(2 * 1.959964, 2), 0.001);
    }

    @ParameterizedTest
    @ValueSource(doubles = {0, -1, 0.0009, 4.1, Double.NaN, Double.POSITIVE_INFINITY})
    void whatIsNoWidthIsRefused(double width) {
        assertEquals(
                "relative width is " + width + ", must be 0.001 to 4",
                assertThrows(InvalidSimulationException.class, () -> RelativeWidth.frameErrors(width))
                        .getMessage());
    }
}
