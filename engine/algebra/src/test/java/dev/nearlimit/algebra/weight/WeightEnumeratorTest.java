package dev.nearlimit.algebra.weight;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.math.BigInteger;
import org.junit.jupiter.api.Test;

class WeightEnumeratorTest {

    @Test
    void saysWhatItIs() {
        WeightEnumerator hamming = WeightEnumerator.of(1, 0, 0, 7, 7, 0, 0, 1);
        assertEquals(7, hamming.n());
        assertEquals(4, hamming.k());
        assertEquals(BigInteger.valueOf(16), hamming.total());
        assertEquals(3, hamming.minimumDistance());
        assertArrayEquals(new int[] {0, 3, 4, 7}, hamming.weights());
        assertEquals("(7,4): A_0=1 A_3=7 A_4=7 A_7=1", hamming.toString());
    }

    @Test
    void refusesCountsThatNoLinearCodeHas() {
        assertThrows(IllegalArgumentException.class, () -> WeightEnumerator.of(2, 2));
        assertThrows(IllegalArgumentException.class, () -> WeightEnumerator.of(1, -1, 4));
        assertThrows(IllegalArgumentException.class, () -> WeightEnumerator.of(1));
        String message = assertThrows(IllegalArgumentException.class, () -> WeightEnumerator.of(1, 0, 2))
                .getMessage();
        assertTrue(message.contains("add up to 3"), message);
    }

    @Test
    void zeroCodeHasNoMinimumDistance() {
        WeightEnumerator zero = WeightEnumerator.of(1, 0, 0);
        assertEquals(0, zero.k());
        assertThrows(IllegalStateException.class, zero::minimumDistance);
    }

    @Test
    void informationWeightsAreChecked() {
        WeightEnumerator code = WeightEnumerator.of(1, 0, 1);
        assertThrows(
                IllegalArgumentException.class,
                () -> InformationWeightEnumerator.exact(code, BigInteger.ZERO, BigInteger.ZERO));
        assertThrows(
                IllegalArgumentException.class,
                () -> InformationWeightEnumerator.exact(code, BigInteger.ZERO, BigInteger.ZERO, BigInteger.TWO));
        assertEquals(1.0, InformationWeightEnumerator.proportional(code).meanInformationFraction(2));
        assertEquals(0.0, InformationWeightEnumerator.proportional(code).meanInformationFraction(1));
        assertTrue(InformationWeightEnumerator.proportional(code).total(2).isEmpty());
    }
}
