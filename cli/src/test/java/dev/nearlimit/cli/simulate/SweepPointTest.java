package dev.nearlimit.cli.simulate;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import dev.nearlimit.simulation.FailedFrames;
import dev.nearlimit.simulation.Histogram;
import dev.nearlimit.simulation.Point;
import dev.nearlimit.simulation.PointCounts;
import dev.nearlimit.simulation.PointOutcome;
import dev.nearlimit.simulation.StoppingRule;
import java.util.List;
import java.util.stream.LongStream;
import org.junit.jupiter.api.Test;

/** Comparisons within a sweep, on failures made up for the purpose. */
final class SweepPointTest {
    private static final int FRAMES = 10_000;

    private static MeasuredPoint measured(double ebn0Db, int frames, LongStream failed) {
        long[] failures = failed.toArray();
        PointCounts counts = new PointCounts(frames, failures.length, 0, 0, 0, 0, true);
        PointOutcome outcome =
                new PointOutcome(counts, Histogram.of(), Histogram.of(), FailedFrames.of(frames, failures));
        return MeasuredPoint.of(
                Point.ofEbn0Db(ebn0Db), outcome, PointStop.FRAMES, new StoppingRule(frames, Long.MAX_VALUE), 10);
    }

    private static SweepPoint point(double ebn0Db, MeasuredPoint... measured) {
        return new SweepPoint(Point.ofEbn0Db(ebn0Db), List.of(measured));
    }

    @Test
    void bestIsTheLowestRateAndTiesAreCorrectedForAllPairs() {
        SweepPoint point = point(
                1,
                measured(1, FRAMES, LongStream.range(0, 110)),
                measured(1, FRAMES, LongStream.range(0, 100)),
                // Fails the best's frames and 7 more: p = 2^-6 = 0.0156, which 3 pairs make 0.047, 6 pairs 0.094.
                measured(1, FRAMES, LongStream.range(0, 107)));
        assertEquals(1, point.best());
        assertEquals(10, point.againstBest(0).onlyFirst());
        assertEquals(0, point.againstBest(0).onlySecond());
        assertEquals(1.1, point.timesBest(0), 1e-12);
        assertTrue(point.tied(1));
        assertFalse(point.tied(0));
        assertFalse(point.tied(2));
        SweepPoint wider = point(
                1,
                point.measured().get(0),
                point.measured().get(1),
                point.measured().get(2),
                measured(1, FRAMES, LongStream.range(0, 200)));
        assertTrue(wider.tied(2));
    }

    /** A point that ended earlier is compared over its own frames alone. */
    @Test
    void comparisonEndsWhereTheShorterRunEnded() {
        SweepPoint point =
                point(1, measured(1, 50, LongStream.range(0, 30)), measured(1, FRAMES, LongStream.range(20, 120)));
        assertEquals(1, point.best());
        assertEquals(50, point.againstBest(0).frames());
        assertEquals(20, point.againstBest(0).onlyFirst());
        assertEquals(20, point.againstBest(0).onlySecond());
        assertEquals(10, point.againstBest(0).both());
    }

    /** The best falls by a factor of 100 a dB; rates in between lie on the straight line of log FER, by construction. */
    @Test
    void lossIsReadOffTheCurveOfTheBest() {
        List<SweepPoint> points = List.of(
                point(
                        1,
                        measured(1, FRAMES, LongStream.range(0, 1000)),
                        measured(1, FRAMES, LongStream.range(0, 2000))),
                point(2, measured(2, FRAMES, LongStream.range(0, 10)), measured(2, FRAMES, LongStream.range(0, 100))),
                point(3, measured(3, FRAMES, LongStream.empty()), measured(3, FRAMES, LongStream.range(0, 10))));
        SweepLoss loss = new SweepLoss(points);
        assertEquals(0, loss.ofCombination(0, 1));
        assertEquals(0.5, loss.ofCombination(1, 1), 1e-12);
        assertEquals(1, loss.ofCombination(1, 2), 1e-12);
        // At the first point the best has no higher rate measured: nothing is extrapolated.
        assertTrue(Double.isNaN(loss.ofCombination(1, 0)));
    }

    @Test
    void withoutErrorsThereIsNoRatio() {
        SweepPoint point =
                point(1, measured(1, FRAMES, LongStream.empty()), measured(1, FRAMES, LongStream.range(0, 5)));
        assertEquals(0, point.best());
        assertTrue(Double.isNaN(point.timesBest(1)));
        assertTrue(point.tied(1));
    }
}
