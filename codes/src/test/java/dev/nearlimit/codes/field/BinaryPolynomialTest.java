package dev.nearlimit.codes.field;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Random;
import java.util.stream.IntStream;
import java.util.stream.LongStream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

class BinaryPolynomialTest {
    static LongStream seeds() {
        return LongStream.range(1, 101);
    }

    private static BinaryPolynomial random(Random random) {
        int degree = random.nextInt(200);
        return BinaryPolynomial.ofExponents(IntStream.rangeClosed(0, degree)
                .filter(e -> random.nextBoolean())
                .toArray());
    }

    /** The product by the definition: every pair of powers. */
    private static BinaryPolynomial naiveProduct(BinaryPolynomial f, BinaryPolynomial g) {
        int[] exponents = IntStream.rangeClosed(0, f.degree())
                .filter(f::coefficient)
                .flatMap(i -> IntStream.rangeClosed(0, g.degree())
                        .filter(g::coefficient)
                        .map(j -> i + j))
                .toArray();
        return BinaryPolynomial.ofExponents(exponents);
    }

    @ParameterizedTest
    @MethodSource("seeds")
    void productQuotientAndRemainderAgree(long seed) {
        Random random = new Random(seed);
        BinaryPolynomial f = random(random);
        BinaryPolynomial g = random(random).add(BinaryPolynomial.ofExponents(random.nextInt(150)));
        String message = "seed " + seed + ": f = " + f + ", g = " + g;
        assertEquals(naiveProduct(f, g), f.multiply(g), message);
        assertEquals(f.multiply(g), g.multiply(f), message);
        if (!g.isZero()) {
            BinaryPolynomial rest = f.remainder(g);
            assertTrue(rest.degree() < g.degree(), message);
            assertEquals(f, f.quotient(g).multiply(g).add(rest), message);
        }
    }

    @ParameterizedTest
    @MethodSource("seeds")
    void gcdDividesBothAndHoldsTheCommonFactor(long seed) {
        Random random = new Random(seed);
        BinaryPolynomial common = random(random).add(BinaryPolynomial.ofExponents(200));
        BinaryPolynomial f = random(random).multiply(common);
        BinaryPolynomial g =
                random(random).add(BinaryPolynomial.ofExponents(201)).multiply(common);
        BinaryPolynomial gcd = f.gcd(g);
        String message = "seed " + seed;
        assertTrue(f.remainder(gcd).isZero(), message);
        assertTrue(g.remainder(gcd).isZero(), message);
        assertTrue(gcd.remainder(common).isZero(), message);
    }

    @Test
    void smallOnesReadAsPrinted() {
        BinaryPolynomial f = BinaryPolynomial.of(0x13);
        assertEquals("x^4 + x + 1", f.toString());
        assertEquals(4, f.degree());
        assertEquals(3, f.weight());
        assertEquals(f, BinaryPolynomial.ofExponents(0, 4, 1));
        assertEquals(-1, BinaryPolynomial.zero().degree());
        assertEquals("0", f.add(f).toString());
        assertEquals(63, BinaryPolynomial.of(Long.MIN_VALUE).degree());
        assertThrows(ArithmeticException.class, () -> f.remainder(BinaryPolynomial.zero()));
        assertThrows(
                ArithmeticException.class,
                () -> BinaryPolynomial.ofExponents(64).toLong());
    }
}
