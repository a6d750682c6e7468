package dev.nearlimit.limits;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.math.BigDecimal;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

class HardDecisionTest {
    /** Es/N0 in dB, crossover probability and capacity, evaluated apart from this project in 40-digit arithmetic. */
    @ParameterizedTest
    @CsvSource({
        "-30, 0.48216470413516005748, 0.00091803091559913761635",
        "-20, 0.4437685419908575539, 0.0091428669374182901184",
        "-10, 0.3273604230092885147, 0.087793232270064811234",
        "-3, 0.15836831880959789772, 0.36960827369514644821",
        "-0.86, 0.10011451443331358898, 0.53064150931467599877",
        "-0.85, 0.099855588156271373743, 0.53146234834672446985",
        "0, 0.078649603525142565329, 0.60259698071533060945",
        "3, 0.02287840756108532716, 0.84268957971212061757",
        "8, 0.00019090777407599316468, 0.99736597025243021206",
        "12, 9.0060103506287324346e-9, 0.99999974630825569952",
    })
    void agreesWithFortyDigits(double esn0Db, double crossover, double capacity) {
        double esn0 = Decibels.toLinear(esn0Db);
        assertEquals(1, HardDecisionAwgn.crossover(esn0) / crossover, 1e-12);
        assertEquals(1, HardDecisionAwgn.capacity(esn0) / capacity, 1e-11);
    }

    @Test
    void capacityIsOneLessTheEntropy() {
        for (double p = 0.001; p < 0.5; p += 0.001) {
            double entropy = -(p * Math.log(p) + (1 - p) * Math.log(1 - p)) / Math.log(2);
            assertEquals(1 - entropy, BinarySymmetricChannel.capacity(p), 2e-15, "p = " + p);
            assertEquals(BinarySymmetricChannel.capacity(p), BinarySymmetricChannel.capacity(1 - p), 1e-14);
        }
        assertEquals(1, BinarySymmetricChannel.capacity(0));
        assertEquals(1, BinarySymmetricChannel.capacity(1));
        assertEquals(0, BinarySymmetricChannel.capacity(0.5));
    }

    @Test
    void keepsItsAccuracyNextToOneHalf() {
        // 1 - h((1-d)/2) = sum over j of d^(2j) / (2 ln 2 j (2j-1)); two terms suffice for d = 1e-6.
        double bias = new BigDecimal("1")
                .subtract(new BigDecimal(0.4999995).multiply(BigDecimal.valueOf(2)))
                .doubleValue();
        double series = bias * bias / (2 * Math.log(2)) * (1 + bias * bias / 6);
        assertEquals(1, BinarySymmetricChannel.capacity(0.4999995) / series, 1e-12);
    }

    @ParameterizedTest
    @ValueSource(doubles = {1e-8, 0.01, 0.25, 0.49999, 0.5, 0.50001, 0.9, 0.999, 1 - 1e-12})
    void largestCrossoverUndoesCapacity(double rate) {
        double p = BinarySymmetricChannel.largestCrossover(rate);
        assertTrue(p > 0 && p < 0.5, "p = " + p);
        assertEquals(rate, BinarySymmetricChannel.capacity(p), 1e-13);
    }

    @ParameterizedTest
    @ValueSource(doubles = {1e-6, 0.01, 0.3, 0.499999, 0.5, 0.6, 0.9, 0.999, 1 - 1e-9})
    void leastEbn0UndoesCapacity(double rate) {
        double esn0 = rate * Decibels.toLinear(HardDecisionAwgn.leastEbn0Db(rate));
        assertEquals(1, HardDecisionAwgn.capacity(esn0) / rate, 1e-11);
        assertEquals(
                1, HardDecisionAwgn.crossover(esn0) / BinarySymmetricChannel.largestCrossover(rate), 1e-6, "crossover");
    }

    @Test
    void costsAFactorOfHalfPiAtLowRates() {
        // common practice: hard decisions lose pi/2, 1.96 dB, at low signal-to-noise ratio
        assertEquals(10 * Math.log10(Math.PI / 2 * Math.log(2)), HardDecisionAwgn.leastEbn0Db(1e-9), 1e-6);
    }

    @Test
    void neverBeatsSoftDecision() {
        double last = 0;
        for (double db = -40; db <= 13; db += 0.05) {
            double esn0 = Decibels.toLinear(db);
            double hard = HardDecisionAwgn.capacity(esn0);
            assertTrue(hard > last, "does not grow at " + db + " dB");
            assertTrue(hard < BinaryInputAwgn.capacity(esn0) * (1 + 1e-12), "beats soft at " + db + " dB");
            assertEquals(BinarySymmetricChannel.capacity(HardDecisionAwgn.crossover(esn0)), hard, 1e-14);
            last = hard;
        }
        assertEquals(0, HardDecisionAwgn.capacity(0));
        assertEquals(0.5, HardDecisionAwgn.crossover(0));
    }

    @Test
    void refusesWhatCannotBe() {
        assertEquals(
                "crossover probability is 1.5, must be in [0, 1]",
                assertThrows(InvalidLimitException.class, () -> BinarySymmetricChannel.capacity(1.5))
                        .getMessage());
        assertThrows(InvalidLimitException.class, () -> BinarySymmetricChannel.capacity(Double.NaN));
        assertThrows(InvalidLimitException.class, () -> BinarySymmetricChannel.largestCrossover(1));
        assertThrows(InvalidLimitException.class, () -> HardDecisionAwgn.leastEbn0Db(0));
        assertThrows(InvalidLimitException.class, () -> HardDecisionAwgn.capacity(Double.NaN));
    }
}
