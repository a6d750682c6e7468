package dev.nearlimit.simulation.statistics;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import dev.nearlimit.simulation.InvalidSimulationException;
import dev.nearlimit.simulation.PointCounts;
import dev.nearlimit.simulation.StoppingRule;
import java.util.SplittableRandom;
import org.apache.commons.math3.distribution.BinomialDistribution;
import org.apache.commons.math3.stat.interval.ClopperPearsonInterval;
import org.apache.commons.math3.stat.interval.ConfidenceInterval;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class ErrorRateIntervalsTest {
    private static final ErrorRateIntervals INTERVALS = new ErrorRateIntervals();

    /** The library's Clopper-Pearson interval is the judge where its absolute accuracy of 1e-9 suffices. */
    @ParameterizedTest
    @CsvSource({"1, 10", "3, 17", "10, 100", "99, 100", "50, 100000"})
    void fixedNumberOfFramesGivesClopperAndPearson(int errors, int frames) {
        ConfidenceInterval judge = new ClopperPearsonInterval().createInterval(frames, errors, 0.95);
        Interval interval = INTERVALS.frameErrorRate(counts(frames, errors), new StoppingRule(frames, frames + 1L));
        assertEquals(judge.getLowerBound(), interval.low(), 1e-8);
        assertEquals(judge.getUpperBound(), interval.high(), 1e-8);
    }

    /** Without errors (1 - p)^N = alpha has a closed form, and so has p^N = alpha when every frame fails. */
    @ParameterizedTest
    @CsvSource({"1, 1e-12", "100, 1e-12", "1000000, 1e-9", "1000000000, 1e-7", "1000000000000, 1e-4"})
    void noErrorsGiveAnUpperBound(long frames, double error) {
        StoppingRule rule = new StoppingRule(frames, 100);
        Interval interval = INTERVALS.frameErrorRate(counts(frames, 0), rule);
        assertEquals(0, interval.low());
        assertEquals(1, interval.high() / -Math.expm1(Math.log(0.025) / frames), error);
        assertEquals(
                1,
                INTERVALS.frameErrorRateUpper(counts(frames, 0), rule) / -Math.expm1(Math.log(0.05) / frames),
                error);
        assertEquals(interval, INTERVALS.bitErrorRate(counts(frames, 0), 500));
        Interval all = INTERVALS.frameErrorRate(counts(frames, frames), new StoppingRule(frames, frames));
        assertEquals(1, all.high());
        assertEquals(Math.exp(Math.log(0.025) / frames), all.low(), 1e-12);
    }

    /** Far down, where p is small, the ends are Poisson limits: 10 events lie within 4.795 .. 18.390 (common practice). */
    @Test
    void smallRatesKeepTheirRelativeAccuracy() {
        long frames = 1_000_000_000_000L;
        Interval interval = INTERVALS.frameErrorRate(counts(frames, 10), new StoppingRule(frames, 100));
        assertEquals(4.795, interval.low() * frames, 5e-4);
        assertEquals(18.390, interval.high() * frames, 1e-3);
    }

    /**
     * Coverage for the composite rule, with no randomness: at each rate the probabilities of all outcomes whose interval
     * misses it add up to at most 5 %, on each side to at most 2.5 %.
     */
    @ParameterizedTest
    @CsvSource({"60, 1", "60, 5", "200, 10", "40, 40", "40, 41"})
    void intervalCoversEveryRate(int most, int errors) {
        StoppingRule rule = new StoppingRule(most, errors);
        for (double p : rates()) {
            double missedAbove = 0;
            double missedBelow = 0;
            double missedByUpper = 0;
            double all = 0;
            for (int frames = 1; frames <= most; frames++) {
                for (int e = 0; e <= Math.min(errors, frames); e++) {
                    double probability = probability(frames, e, rule, p);
                    if (probability > 0) {
                        Interval interval = INTERVALS.frameErrorRate(counts(frames, e), rule);
                        missedAbove += p > interval.high() ? probability : 0;
                        missedBelow += p < interval.low() ? probability : 0;
                        missedByUpper += p > INTERVALS.frameErrorRateUpper(counts(frames, e), rule) ? probability : 0;
                        all += probability;
                    }
                }
            }
            assertEquals(1, all, 1e-9, "outcomes at " + p);
            assertTrue(missedAbove <= 0.025 + 1e-9, "rate " + p + " missed above with " + missedAbove);
            assertTrue(missedBelow <= 0.025 + 1e-9, "rate " + p + " missed below with " + missedBelow);
            assertTrue(missedByUpper <= 0.05 + 1e-9, "rate " + p + " above the bound with " + missedByUpper);
        }
    }

    /** Probability of an outcome of the rule; 0 for what the rule cannot give. */
    private static double probability(int frames, int e, StoppingRule rule, double p) {
        if (e == rule.frameErrors()) {
            // The last frame is the r-th error.
            return p * new BinomialDistribution(frames - 1, p).probability(e - 1);
        }
        return frames == rule.maxFrames() ? new BinomialDistribution(frames, p).probability(e) : 0;
    }

    /** UER: outcomes have a second coordinate, the number of errors that went unnoticed. */
    @ParameterizedTest
    @CsvSource({"40, 4", "80, 8"})
    void undetectedBoundCoversEveryRate(int most, int errors) {
        StoppingRule rule = new StoppingRule(most, errors);
        for (double fer : new double[] {0.02, 0.1, 0.3, 0.7}) {
            for (double share : new double[] {0.01, 0.1, 0.3, 0.5, 0.8, 0.95, 1}) {
                double uer = fer * share;
                double missed = 0;
                for (int frames = 1; frames <= most; frames++) {
                    for (int e = 0; e <= Math.min(errors, frames); e++) {
                        double outcome = probability(frames, e, rule, fer);
                        for (int u = 0; outcome > 0 && u <= e; u++) {
                            PointCounts counts = new PointCounts(frames, e, 0, 0, u, 0, true);
                            if (uer > INTERVALS.undetectedErrorRateUpper(counts)) {
                                missed += outcome * new BinomialDistribution(e, share).probability(u);
                            }
                        }
                    }
                }
                assertTrue(missed <= 0.05 + 1e-9, "FER " + fer + ", share " + share + ": missed with " + missed);
            }
        }
    }

    /** Bursts of one size are single events: the interval is that of the FER, scaled. */
    @Test
    void burstsOfOneSizeScaleTheFrameInterval() {
        StoppingRule rule = new StoppingRule(1000, 1000);
        Interval fer = INTERVALS.frameErrorRate(counts(1000, 20), rule);
        Interval ber = INTERVALS.bitErrorRate(new PointCounts(1000, 20, 20 * 5, 20 * 25, 0, 0, true), 50);
        assertEquals(fer.low() / 10, ber.low(), 1e-12);
        assertEquals(fer.high() / 10, ber.high(), 1e-12);
    }

    /**
     * Bursts of geometric size, 12 bits on average, in 2 % of 1000 frames. The interval is approximate; over 4000 seeded
     * trials its coverage must not be below 92 %. A true coverage of 95 % falls there with probability below 1e-15.
     */
    @Test
    void burstsOfManySizesAreCovered() {
        SplittableRandom random = new SplittableRandom(5);
        int k = 200;
        int covered = 0;
        for (int trial = 0; trial < 4000; trial++) {
            long bits = 0;
            long squares = 0;
            int errors = 0;
            for (int f = 0; f < 1000; f++) {
                if (random.nextDouble() < 0.02) {
                    int burst = 1 + (int) (Math.log(1 - random.nextDouble()) / Math.log(1 - 1 / 12.0));
                    bits += burst;
                    squares += (long) burst * burst;
                    errors++;
                }
            }
            Interval interval = INTERVALS.bitErrorRate(new PointCounts(1000, errors, bits, squares, 0, 0, true), k);
            covered += interval.contains(0.02 * 12 / k) ? 1 : 0;
        }
        assertTrue(covered >= 0.92 * 4000, covered + " of 4000 covered");
        assertTrue(covered <= 0.99 * 4000, covered + " of 4000 covered: interval too wide to be of use");
    }

    @Test
    void confidenceWidensIntervals() {
        StoppingRule rule = new StoppingRule(1000, 1000);
        Interval narrow = new ErrorRateIntervals(0.9).frameErrorRate(counts(1000, 20), rule);
        Interval wide = new ErrorRateIntervals(0.99).frameErrorRate(counts(1000, 20), rule);
        assertTrue(wide.low() < narrow.low() && narrow.high() < wide.high());
        assertEquals(
                "confidence is 1.0, must be between 0 and 1",
                assertThrows(InvalidSimulationException.class, () -> new ErrorRateIntervals(1))
                        .getMessage());
    }

    @Test
    void nothingCountedSaysNothing() {
        StoppingRule rule = new StoppingRule(1000, 100);
        assertEquals(new Interval(0, 1), INTERVALS.frameErrorRate(counts(0, 0), rule));
        assertEquals(new Interval(0, 1), INTERVALS.bitErrorRate(counts(0, 0), 10));
        assertEquals(1, INTERVALS.undetectedErrorRateUpper(counts(0, 0)));
    }

    private static PointCounts counts(long frames, long errors) {
        return new PointCounts(frames, errors, 0, 0, 0, 0, true);
    }

    private static double[] rates() {
        return new double[] {1e-4, 0.003, 0.01, 0.02, 0.05, 0.1, 0.15, 0.2, 0.3, 0.4, 0.5, 0.65, 0.8, 0.9, 0.97, 0.999};
    }
}
