package dev.nearlimit.limits;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

class ShannonLimitTest {
    private static final double ULTIMATE_DB = 10 * Math.log10(Math.log(2));

    @Test
    void passesThroughItsRoundValues() {
        // 2^(2R) - 1 over 2R: R = 1/2 gives 1, R = 1 gives 3/2, R = 2 gives 15/4.
        assertEquals(0, ShannonLimit.leastEbn0Db(0.5), 1e-14);
        assertEquals(10 * Math.log10(1.5), ShannonLimit.leastEbn0Db(1), 1e-14);
        assertEquals(10 * Math.log10(3.75), ShannonLimit.leastEbn0Db(2), 1e-14);
        assertEquals(0.5, ShannonLimit.capacity(0.5), 1e-15);
        assertEquals(0, ShannonLimit.capacity(0));
        // common practice: -1.59 dB
        assertEquals(-1.59, ShannonLimit.leastEbn0Db(1e-12), 0.005);
        assertEquals(ULTIMATE_DB, ShannonLimit.leastEbn0Db(1e-12), 1e-11);
    }

    @ParameterizedTest
    @ValueSource(doubles = {1e-6, 1e-3, 0.1, 0.5, 0.9, 1, 3, 10, 100, 600, 2000})
    void efficiencyUndoesLeastEbn0(double rate) {
        double ebn0Db = ShannonLimit.leastEbn0Db(rate);
        // Near -1.59 dB the rate is the small difference of two Eb/N0.
        assertEquals(1, ShannonLimit.efficiencyAt(ebn0Db) / rate, 1e-12 + 1e-15 / rate);
    }

    @Test
    void atTheEfficiencyCapacityIsUsedUp() {
        for (double ebn0Db = -1.5; ebn0Db < 40; ebn0Db += 0.37) {
            double rate = ShannonLimit.efficiencyAt(ebn0Db);
            assertEquals(1, ShannonLimit.capacity(rate * Decibels.toLinear(ebn0Db)) / rate, 1e-11, ebn0Db + " dB");
        }
    }

    @Test
    void nothingPassesBelowTheUltimateLimit() {
        assertEquals(0, ShannonLimit.efficiencyAt(-1.5918));
        assertEquals(0, ShannonLimit.efficiencyAt(-100));
        double last = 0;
        for (double ebn0Db = ULTIMATE_DB + 1e-15; ebn0Db < 30; ebn0Db = ebn0Db + 1e-6 + (ebn0Db - ULTIMATE_DB) * 0.5) {
            double rate = ShannonLimit.efficiencyAt(ebn0Db);
            assertTrue(rate >= last, "falls at " + ebn0Db + " dB");
            last = rate;
        }
    }

    @ParameterizedTest
    @ValueSource(doubles = {0, -1, Double.NaN, Double.POSITIVE_INFINITY})
    void refusesWhatIsNoRate(double rate) {
        InvalidLimitException refused = assertThrows(InvalidLimitException.class, () -> ShannonLimit.leastEbn0Db(rate));
        assertEquals("rate is " + rate + ", must be a finite number above 0", refused.getMessage());
    }

    @ParameterizedTest
    @ValueSource(doubles = {Double.NaN, Double.POSITIVE_INFINITY, Double.NEGATIVE_INFINITY})
    void refusesWhatIsNoEbn0(double ebn0Db) {
        InvalidLimitException refused =
                assertThrows(InvalidLimitException.class, () -> ShannonLimit.efficiencyAt(ebn0Db));
        assertEquals("Eb/N0 in dB is " + ebn0Db + ", must be a finite number", refused.getMessage());
    }
}
