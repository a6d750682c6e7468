package dev.nearlimit.limits;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

class BinaryInputAwgnTest {
    /** Es/N0 in dB, C, 1 - C and V of the definition, evaluated apart from this project in 30-digit arithmetic. */
    @ParameterizedTest
    @CsvSource({
        "-20, 0.014284558300406719, 0.98571544169959328, 0.040410699307364642",
        "-10, 0.1314160823528472, 0.8685839176471528, 0.31641800871040861",
        "-3, 0.48671359211034389, 0.51328640788965611, 0.65971237804661147",
        "0, 0.72145159079038813, 0.27854840920961187, 0.53327194047856348",
        "3, 0.91235211690594076, 0.087647883094059239, 0.22323906034161625",
        "10, 0.99998332824040258, 1.6671759597422834e-5, 5.839256211483228e-5",
        "15, 0.99999999999999594, 4.0604605869074355e-15, 1.5478064831607703e-14",
        "20, 1.0, 4.7044099225681157617e-45, 1.8517941328023187303e-44",
    })
    void agreesWithThirtyDigits(double esn0Db, double capacity, double loss, double dispersion) {
        double esn0 = Decibels.toLinear(esn0Db);
        assertEquals(1, BinaryInputAwgn.capacity(esn0) / capacity, 1e-12);
        assertEquals(1, BinaryInputAwgn.loss(esn0) / loss, 1e-11);
        assertEquals(1, BinaryInputAwgn.dispersion(esn0) / dispersion, 1e-11);
    }

    @Test
    void agreesWithTheSlowTwin() {
        for (double db = -20; db <= 20; db += 0.8) {
            double esn0 = Decibels.toLinear(db);
            assertEquals(TrapezoidTwin.capacity(esn0), BinaryInputAwgn.capacity(esn0), 1e-11, "Es/N0 = " + db + " dB");
            assertEquals(
                    TrapezoidTwin.dispersion(esn0), BinaryInputAwgn.dispersion(esn0), 1e-11, "Es/N0 = " + db + " dB");
        }
    }

    @Test
    void twoFormsMeet() {
        double below = Math.nextDown(1.0);
        assertEquals(BinaryInputAwgn.capacity(below), BinaryInputAwgn.capacity(1), 1e-14);
        assertEquals(BinaryInputAwgn.dispersion(below), BinaryInputAwgn.dispersion(1), 1e-14);
    }

    @Test
    void growsAndStaysBelowFreeInput() {
        double last = 0;
        for (double db = -60; db <= 14; db += 0.05) {
            double esn0 = Decibels.toLinear(db);
            double capacity = BinaryInputAwgn.capacity(esn0);
            assertTrue(capacity > last, "does not grow at " + db + " dB");
            assertTrue(capacity <= 1);
            assertTrue(capacity <= ShannonLimit.capacity(esn0) * (1 + 1e-12), "above Shannon at " + db + " dB");
            last = capacity;
        }
    }

    @Test
    void endsAreExact() {
        assertEquals(0, BinaryInputAwgn.capacity(0));
        assertEquals(0, BinaryInputAwgn.dispersion(0));
        assertEquals(1, BinaryInputAwgn.capacity(1e6));
        // C ~ g/ln 2 and V ~ 2 g/ln^2 2 as g tends to 0.
        assertEquals(1, BinaryInputAwgn.capacity(1e-9) * Math.log(2) / 1e-9, 1e-8);
        assertEquals(1, BinaryInputAwgn.dispersion(1e-9) * Math.pow(Math.log(2), 2) / 2e-9, 1e-8);
    }

    @ParameterizedTest
    @ValueSource(doubles = {1e-6, 0.01, 0.1, 0.3, 0.499999, 0.5, 0.500001, 0.75, 0.9, 0.99, 0.999, 1 - 1e-9})
    void leastEbn0UndoesCapacity(double rate) {
        double esn0 = rate * Decibels.toLinear(BinaryInputAwgn.leastEbn0Db(rate));
        assertEquals(1, BinaryInputAwgn.capacity(esn0) / rate, 1e-11);
        assertEquals(1, BinaryInputAwgn.loss(esn0) / (1 - rate), 1e-6);
    }

    @Test
    void limitsAreOrderedAtEveryRate() {
        double last = Double.NEGATIVE_INFINITY;
        for (int i = 1; i < 1000; i++) {
            double rate = i / 1000.0;
            double soft = BinaryInputAwgn.leastEbn0Db(rate);
            assertTrue(soft > last, "does not grow at rate " + rate);
            assertTrue(ShannonLimit.leastEbn0Db(rate) < soft + 1e-9, "below Shannon at rate " + rate);
            assertTrue(soft < HardDecisionAwgn.leastEbn0Db(rate), "above hard decision at rate " + rate);
            last = soft;
        }
    }

    @ParameterizedTest
    @ValueSource(doubles = {0, 1, -0.5, 2, Double.NaN, Double.NEGATIVE_INFINITY})
    void refusesARateOutsideTheUnitInterval(double rate) {
        InvalidLimitException refused =
                assertThrows(InvalidLimitException.class, () -> BinaryInputAwgn.leastEbn0Db(rate));
        assertEquals("rate is " + rate + ", must lie between 0 and 1, both excluded", refused.getMessage());
    }

    @ParameterizedTest
    @ValueSource(doubles = {-1e-9, Double.NaN, Double.POSITIVE_INFINITY})
    void refusesWhatIsNoEnergy(double esn0) {
        InvalidLimitException refused = assertThrows(InvalidLimitException.class, () -> BinaryInputAwgn.capacity(esn0));
        assertEquals("Es/N0 is " + esn0 + ", must be a finite ratio of at least 0", refused.getMessage());
        assertThrows(InvalidLimitException.class, () -> BinaryInputAwgn.dispersion(esn0));
    }
}
