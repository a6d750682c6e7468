package dev.nearlimit.codes.field;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Random;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

class BinaryFieldTest {
    /** Shift and add, without tables. */
    private static int slowProduct(int a, int b, int m, int polynomial) {
        long product = 0;
        for (int i = 0; i < m; i++) {
            if ((b >> i & 1) != 0) {
                product ^= (long) a << i;
            }
        }
        for (int i = 2 * m - 2; i >= m; i--) {
            if ((product >> i & 1) != 0) {
                product ^= (long) polynomial << (i - m);
            }
        }
        return (int) product;
    }

    @ParameterizedTest
    @ValueSource(ints = {2, 3, 4, 5, 6, 7, 8, 9, 10, 11, 12, 13, 14, 15, 16})
    void tablesAgreeWithShiftAndAdd(int m) {
        BinaryField field = BinaryField.ofDegree(m);
        Random random = new Random(m);
        for (int trial = 0; trial < 2000; trial++) {
            int a = random.nextInt(1 << m);
            int b = random.nextInt(1 << m);
            String message = field + ": a = " + a + ", b = " + b + " (seed " + m + ")";
            int product = field.multiply(a, b);
            assertEquals(slowProduct(a, b, m, field.polynomial()), product, message);
            if (b != 0) {
                assertEquals(a, field.divide(product, b), message);
                assertEquals(1, field.multiply(b, field.inverse(b)), message);
                assertEquals(b, field.alpha(field.log(b)), message);
                assertEquals(field.multiply(b, field.multiply(b, b)), field.power(b, 3), message);
                assertEquals(field.inverse(field.multiply(b, b)), field.power(b, -2), message);
            }
        }
    }

    @ParameterizedTest
    @ValueSource(ints = {2, 3, 4, 5, 6, 7, 8, 10})
    void minimalPolynomialsVanishExactlyOnTheirCosetAndMultiplyToAll(int m) {
        BinaryField field = BinaryField.ofDegree(m);
        BinaryPolynomial product = BinaryPolynomial.one();
        for (int[] coset : CyclotomicCosets.all(field.order())) {
            BinaryPolynomial minimal = field.minimalPolynomial(coset[0]);
            assertEquals(coset.length, minimal.degree(), field.toString());
            boolean[] isRoot = new boolean[field.order()];
            for (int member : coset) {
                isRoot[member] = true;
            }
            for (int exponent = 0; exponent < field.order(); exponent++) {
                assertEquals(
                        isRoot[exponent],
                        field.evaluate(minimal, field.alpha(exponent)) == 0,
                        field + ": alpha^" + exponent + " in " + minimal);
            }
            product = product.multiply(minimal);
        }
        assertEquals(BinaryPolynomial.ofExponents(field.order(), 0), product);
    }

    @ParameterizedTest
    // Octal minimal polynomials of alpha^i in GF(2^4) and GF(2^6): Lin and Costello 2004, Appendix B, from memory.
    @CsvSource({"4,1,23", "4,3,37", "4,5,7", "4,7,31", "6,1,103", "6,3,127", "6,5,147", "6,7,111", "6,9,15", "6,21,7"})
    void minimalPolynomialsAreTheTextbooks(int m, int exponent, String octal) {
        assertEquals(
                Long.parseLong(octal, 8),
                BinaryField.ofDegree(m).minimalPolynomial(exponent).toLong());
    }

    @Test
    void polynomialsThatMakeNoFieldAreRefused() {
        // x^4 + x^3 + x^2 + x + 1 is irreducible, its root has order 5; x^4 + x^2 + 1 is a square.
        assertThrows(IllegalArgumentException.class, () -> BinaryField.ofPolynomial(0x1F));
        assertThrows(IllegalArgumentException.class, () -> BinaryField.ofPolynomial(0x15));
        assertThrows(IllegalArgumentException.class, () -> BinaryField.ofPolynomial(0x12));
        assertThrows(IllegalArgumentException.class, () -> BinaryField.ofPolynomial(0));
        assertThrows(IllegalArgumentException.class, () -> BinaryField.ofPolynomial(-1));
        assertThrows(IllegalArgumentException.class, () -> BinaryField.ofDegree(17));
    }

    @Test
    void zeroHasNoInverse() {
        BinaryField field = BinaryField.ofDegree(4);
        assertThrows(ArithmeticException.class, () -> field.inverse(0));
        assertThrows(ArithmeticException.class, () -> field.divide(3, 0));
        assertThrows(ArithmeticException.class, () -> field.power(0, -1));
        assertEquals(1, field.power(0, 0));
        assertEquals(0, field.divide(0, 3));
    }

    @Test
    void cosetsAreTheTextbooks() {
        // Modulo 15: MacWilliams and Sloane 1977, ch. 4 sec. 3 (common practice).
        int[][] expected = {{0}, {1, 2, 4, 8}, {3, 6, 9, 12}, {5, 10}, {7, 11, 13, 14}};
        assertArrayEquals(expected, CyclotomicCosets.all(15).toArray(int[][]::new));
        assertTrue(CyclotomicCosets.all(23).size() == 3, "23 has 0 and two cosets of 11");
        assertThrows(IllegalArgumentException.class, () -> CyclotomicCosets.coset(14, 1));
    }
}
