package dev.nearlimit.limits;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

class UncodedBinaryTest {
    /** Common practice: 9.6 dB at 1e-5, 10.5 dB at 1e-6, 12.0 dB at 1e-8. */
    @ParameterizedTest
    @CsvSource({"1e-5, 9.6", "1e-6, 10.5", "1e-8, 12.0"})
    void agreesWithCommonPractice(double ber, double ebn0Db) {
        assertEquals(ebn0Db, UncodedBinary.ebn0DbForBitErrorRate(ber), 0.05);
    }

    @ParameterizedTest
    @ValueSource(doubles = {0.499, 0.1, 1e-3, 1e-6, 1e-12, 1e-15, 1e-40, 1e-300})
    void ebn0UndoesBitErrorRate(double ber) {
        assertEquals(1, UncodedBinary.bitErrorRate(UncodedBinary.ebn0DbForBitErrorRate(ber)) / ber, 1e-11);
    }

    @Test
    void fallsFromOneHalf() {
        assertEquals(0.5, UncodedBinary.bitErrorRate(-300), 1e-14);
        double last = 1;
        for (double db = -30; db < 28; db += 0.1) {
            double ber = UncodedBinary.bitErrorRate(db);
            assertTrue(ber < last && ber > 0, "at " + db + " dB");
            last = ber;
        }
    }

    @ParameterizedTest
    @ValueSource(doubles = {0, 0.5, 1, -1e-3, Double.NaN})
    void refusesWhatIsNoBitErrorRate(double ber) {
        InvalidLimitException refused =
                assertThrows(InvalidLimitException.class, () -> UncodedBinary.ebn0DbForBitErrorRate(ber));
        assertEquals("bit error rate is " + ber + ", must lie between 0 and 0.5, both excluded", refused.getMessage());
        assertThrows(InvalidLimitException.class, () -> UncodedBinary.bitErrorRate(Double.NaN));
    }
}
