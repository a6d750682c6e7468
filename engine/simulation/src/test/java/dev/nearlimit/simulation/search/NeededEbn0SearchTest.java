package dev.nearlimit.simulation.search;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import dev.nearlimit.simulation.InvalidSimulationException;
import dev.nearlimit.simulation.PointCounts;
import dev.nearlimit.simulation.StoppingRule;
import java.util.SplittableRandom;
import java.util.function.DoubleUnaryOperator;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

class NeededEbn0SearchTest {
    /** A waterfall that bends: FER 1e-3 at exactly 3 dB, slope -2.5 and bend -1 decade a squared dB there. */
    private static final DoubleUnaryOperator WATERFALL =
            db -> Math.min(1, Math.pow(10, -3 - 2.5 * (db - 3) - 0.5 * (db - 3) * Math.abs(db - 3)));

    /** Draws frame errors of a known error rate, one frame after the other, as a simulation would. */
    private static final class KnownRate implements ErrorRateMeter {
        private final DoubleUnaryOperator fer;
        private final long seed;
        private long framesSpent;

        KnownRate(DoubleUnaryOperator fer, long seed) {
            this.fer = fer;
            this.seed = seed;
        }

        @Override
        public PointCounts measure(long microDb, StoppingRule rule) {
            SplittableRandom random = new SplittableRandom(seed * 1_000_003 + microDb);
            double p = fer.applyAsDouble(microDb / 1e6);
            long frames = 0;
            long errors = 0;
            while (frames < rule.maxFrames() && errors < rule.frameErrors()) {
                frames++;
                errors += random.nextDouble() < p ? 1 : 0;
            }
            framesSpent += frames;
            return new PointCounts(frames, errors, 3 * errors, 9 * errors, errors, 0, true);
        }
    }

    /**
     * Curves steep and shallow, bent and straight, all with FER 1e-2 at 3 dB; the slope is in decades a dB. The 95 %
     * interval may miss with 5 %; more than 44 misses in 400 seeded searches would then come with a probability below
     * 1e-6 (binomial tail). Coarse and refined answers are held to it alike.
     */
    @ParameterizedTest
    @ValueSource(doubles = {0.4, 1.0, 2.5, 5.0})
    void intervalCoversTheTruthAsOftenAsItSays(double slope) {
        DoubleUnaryOperator fer = db -> Math.min(1, Math.pow(10, -2 - slope * (db - 3)));
        int missedCoarse = 0;
        int missedRefined = 0;
        for (int seed = 0; seed < 400; seed++) {
            NeededEbn0Search search = new NeededEbn0Search(new KnownRate(fer, seed), 1e-2, 1_000_000);
            missedCoarse += missed(search.bracket(1.0, 15, 32), 3.0);
            missedRefined += missed(search.refine(60), 3.0);
        }
        assertTrue(missedCoarse <= 44, missedCoarse + " of 400 coarse intervals missed at slope " + slope);
        assertTrue(missedRefined <= 44, missedRefined + " of 400 refined intervals missed at slope " + slope);
    }

    private static int missed(NeededEbn0 found, double truth) {
        return found.lowDb() > truth || found.highDb() < truth ? 1 : 0;
    }

    /** A point that was cut short says nothing about the target, however few errors it shows. */
    @Test
    void aPointCutShortDecidesNothing() {
        KnownRate meter = new KnownRate(WATERFALL, 1);
        ErrorRateMeter cut = (microDb, rule) ->
                microDb < 2_000_000 ? meter.measure(microDb, rule) : new PointCounts(64, 0, 0, 0, 0, 0, false);
        NeededEbn0 found = new NeededEbn0Search(cut, 1e-3, 1_000_000).bracket(1.0, 12, 32);
        assertFalse(found.complete());
        assertFalse(found.bracketed());
        assertEquals(Double.POSITIVE_INFINITY, found.highDb());
    }

    @ParameterizedTest
    @ValueSource(longs = {1, 2, 3, 4, 5})
    void refiningNarrowsTheInterval(long seed) {
        NeededEbn0Search search = new NeededEbn0Search(new KnownRate(WATERFALL, seed), 1e-3, 1_000_000);
        NeededEbn0 coarse = search.bracket(1.0, 12, 32);
        NeededEbn0 refined = search.refine(400);
        assertTrue(coarse.bracketed() && refined.bracketed(), "seed " + seed);
        assertTrue(
                refined.highDb() - refined.lowDb() < coarse.highDb() - coarse.lowDb(),
                "seed " + seed + ": " + coarse + " then " + refined);
        assertEquals(3.0, refined.ebn0Db(), 0.06, "seed " + seed);
        assertEquals(
                200_000, refined.bracketHigh().microDb() - refined.bracketLow().microDb(), "seed " + seed);
    }

    @Test
    void startsAboveTheAnswerAndComesDown() {
        NeededEbn0 found =
                new NeededEbn0Search(new KnownRate(db -> Math.pow(10, -db), 7), 1e-2, 1_000_000).bracket(6.0, 12, 32);
        assertTrue(found.bracketed());
        assertTrue(found.lowDb() < 2.0 && found.highDb() > 2.0, found.toString());
    }

    @Test
    void saysThatTheTargetWasNeverMet() {
        NeededEbn0 found = new NeededEbn0Search(new KnownRate(db -> 0.1, 7), 1e-3, 100_000).bracket(0, 3, 32);
        assertFalse(found.bracketed());
        assertEquals(Double.POSITIVE_INFINITY, found.highDb());
        assertEquals(3.0, found.bracketLow().ebn0Db(), 1e-9);
    }

    @Test
    void spendsFewFramesOnTheBracket() {
        KnownRate meter = new KnownRate(WATERFALL, 3);
        new NeededEbn0Search(meter, 1e-3, 1_000_000).bracket(1.0, 12, 32);
        // Up to four points at or below the target take 32 / 1e-3 frames each; all others are cheaper.
        assertTrue(meter.framesSpent < 160_000, meter.framesSpent + " frames");
    }

    @Test
    void refusesATargetThatIsNoErrorRate() {
        for (double target : new double[] {0, 1, -1, 2, Double.NaN}) {
            InvalidSimulationException refused = assertThrows(
                    InvalidSimulationException.class,
                    () -> new NeededEbn0Search((microDb, rule) -> null, target, 1000));
            assertEquals("target FER is " + target + ", must lie between 0 and 1", refused.getMessage());
        }
    }
}
