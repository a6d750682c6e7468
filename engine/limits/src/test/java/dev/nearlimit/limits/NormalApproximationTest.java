package dev.nearlimit.limits;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.SplittableRandom;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.function.Executable;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

class NormalApproximationTest {
    @ParameterizedTest
    @ValueSource(longs = {1, 2, 3, 4, 5, 6, 7, 8})
    void leastEbn0UndoesFrameErrorRate(long seed) {
        SplittableRandom random = new SplittableRandom(seed);
        for (int i = 0; i < 20; i++) {
            int n = random.nextInt(8, 20_000);
            int k = random.nextInt((int) Math.ceil(0.5 * Math.log(n) / Math.log(2)) + 1, n + 1);
            double fer = Math.pow(10, -12 * random.nextDouble());
            String what = "seed " + seed + ": n = " + n + ", k = " + k + ", FER " + fer;
            double ebn0Db = NormalApproximation.leastEbn0Db(n, k, fer);
            assertEquals(1, NormalApproximation.frameErrorRate(n, k, ebn0Db) / fer, 1e-7, what);
        }
    }

    @ParameterizedTest
    @ValueSource(longs = {21, 22, 23, 24})
    void largestRateUsesUpWhatTheFormulaGrants(long seed) {
        SplittableRandom random = new SplittableRandom(seed);
        for (int i = 0; i < 10; i++) {
            int n = random.nextInt(64, 20_000);
            double fer = Math.pow(10, -12 * random.nextDouble());
            // The rate of this code is possible, but a far larger one may be too: energy a bit stays the same.
            int k = random.nextInt((int) Math.ceil(0.5 * Math.log(n) / Math.log(2)) + 1, n);
            double ebn0Db = NormalApproximation.leastEbn0Db(n, k, fer);
            double rate = NormalApproximation.largestRate(n, fer, ebn0Db);
            String what = "seed " + seed + ": n = " + n + ", k = " + k + ", FER " + fer + ", rate " + rate;
            assertTrue(rate >= (double) k / n - 1e-9, what);
            assertTrue(rate == 1 || Math.abs(granted(n, fer, rate, ebn0Db) - rate) < 1e-10, what);
            for (int step = 1; step <= 20; step++) {
                double larger = rate + (1 - rate) * step / 20;
                assertTrue(granted(n, fer, larger, ebn0Db) <= larger + 1e-10, what + ": " + larger + " is possible");
            }
        }
    }

    /** Bits a channel use, at the Es/N0 that a rate is given. */
    private static double granted(int n, double fer, double rate, double ebn0Db) {
        double esn0 = rate * Decibels.toLinear(ebn0Db);
        return BinaryInputAwgn.capacity(esn0)
                - Math.sqrt(BinaryInputAwgn.dispersion(esn0) / n) * GaussianTail.inverse(fer)
                + 0.5 * Math.log(n) / Math.log(2) / n;
    }

    @ParameterizedTest
    @ValueSource(longs = {11, 12, 13, 14})
    void frameErrorRateAgreesWithTheFormulaOnTheSlowTwin(long seed) {
        SplittableRandom random = new SplittableRandom(seed);
        for (int i = 0; i < 5; i++) {
            int n = random.nextInt(50, 2000);
            int k = random.nextInt(n / 4, n);
            double esn0 =
                    Decibels.toLinear(BinaryInputAwgn.leastEbn0Db((double) k / n) + 1.5 * random.nextDouble()) * k / n;
            double ebn0Db = Decibels.fromLinear(esn0 * n / k);
            double argument = (n * TrapezoidTwin.capacity(esn0) - k + 0.5 * Math.log(n) / Math.log(2))
                    / Math.sqrt(n * TrapezoidTwin.dispersion(esn0));
            double expected = GaussianTail.q(argument);
            assertEquals(
                    1,
                    NormalApproximation.frameErrorRate(n, k, ebn0Db) / expected,
                    1e-6,
                    "seed " + seed + ": n = " + n + ", k = " + k + ", Eb/N0 " + ebn0Db + " dB");
        }
    }

    @ParameterizedTest
    @CsvSource({"128, 64", "24, 12", "8, 2", "1944, 1620", "10, 10", "64, 4"})
    void frameErrorRateFalls(int n, int k) {
        double last = 1;
        for (double ebn0Db = -20; ebn0Db <= 40; ebn0Db += 0.25) {
            double fer = NormalApproximation.frameErrorRate(n, k, ebn0Db);
            assertTrue(fer <= last && fer >= 0, "FER " + fer + " after " + last + " at " + ebn0Db + " dB");
            last = fer;
        }
        assertEquals(0, last);
    }

    @Test
    void approachesCapacityWithLength() {
        double last = Double.POSITIVE_INFINITY;
        double limit = BinaryInputAwgn.leastEbn0Db(0.5);
        for (int n = 64; n <= 1 << 26; n *= 4) {
            double ebn0Db = NormalApproximation.leastEbn0Db(n, n / 2, 1e-4);
            assertTrue(ebn0Db < last && ebn0Db > limit, "n = " + n + ": " + ebn0Db + " dB");
            last = ebn0Db;
        }
        assertEquals(limit, last, 0.01);
    }

    @Test
    void liesBelowAProvenConverseAtShortLengths() {
        // Shannon's 1959 sphere-packing bound for n = 24, k = 12, FER 1e-6 is 5.866 dB (cone bound, Bell Syst. Tech. J.
        // 38; evaluated apart from this project): the approximation is no bound.
        assertTrue(NormalApproximation.leastEbn0Db(24, 12, 1e-6) < 5.866 - 0.1);
    }

    @Test
    void largestRateGrowsWithEbn0() {
        double last = 0;
        for (double ebn0Db = -3; ebn0Db < 12; ebn0Db += 0.2) {
            double rate = NormalApproximation.largestRate(500, 1e-3, ebn0Db);
            assertTrue(rate >= last && rate <= 1, "rate " + rate + " after " + last + " at " + ebn0Db + " dB");
            last = rate;
        }
        assertEquals(0, NormalApproximation.largestRate(500, 1e-3, -3));
        assertEquals(1, last);
    }

    @Test
    void largestRateAppearsWithoutAGap() {
        // Right above the least Eb/N0 of any rate only a narrow band of rates is possible, narrower than a search step.
        double least = Double.POSITIVE_INFINITY;
        for (int k = 8; k < 500; k += 2) {
            least = Math.min(least, NormalApproximation.leastEbn0Db(500, k, 1e-3));
        }
        assertTrue(NormalApproximation.largestRate(500, 1e-3, least + 1e-9) > 0);
        assertEquals(0, NormalApproximation.largestRate(500, 1e-3, least - 1e-2));
    }

    @Test
    void saysWhereItSaysNothing() {
        assertTrue(NormalApproximation.covers(3, 1));
        assertFalse(NormalApproximation.covers(5, 1));
        assertEquals(
                "the normal approximation says nothing for n = 5, k = 1: k must exceed 1/2 log2 n = 1.16",
                refusal(() -> NormalApproximation.leastEbn0Db(5, 1, 1e-3)));
        assertEquals(
                "the normal approximation reaches FER 0.001 at no Eb/N0 for n = 1, k = 1: too short",
                refusal(() -> NormalApproximation.leastEbn0Db(1, 1, 1e-3)));
    }

    @Test
    void refusesWhatCannotBe() {
        assertEquals(
                "n is 0, must be at least 1 channel use", refusal(() -> NormalApproximation.leastEbn0Db(0, 1, 0.1)));
        assertEquals(
                "k is 65, must be between 1 and n = 64", refusal(() -> NormalApproximation.leastEbn0Db(64, 65, 0.1)));
        for (double fer : new double[] {0, 1, -1, Double.NaN}) {
            assertEquals(
                    "FER is " + fer + ", must lie between 0 and 1, both excluded",
                    refusal(() -> NormalApproximation.leastEbn0Db(64, 32, fer)));
            assertThrows(InvalidLimitException.class, () -> NormalApproximation.largestRate(64, fer, 2));
        }
        assertThrows(InvalidLimitException.class, () -> NormalApproximation.frameErrorRate(64, 32, Double.NaN));
    }

    private static String refusal(Executable call) {
        return assertThrows(InvalidLimitException.class, call).getMessage();
    }
}
