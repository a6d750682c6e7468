package dev.nearlimit.numerics.functions;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.Random;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

class ExponentialTest {
    @ParameterizedTest
    @ValueSource(longs = {1, 2, 3})
    void agreesWithTheLibrary(long seed) {
        Random random = new Random(seed);
        for (int i = 0; i < 100_000; i++) {
            double x = (random.nextDouble() * 2 - 1) * (i % 2 == 0 ? 708 : 3);
            assertEquals(1, Exponential.of(x) / StrictMath.exp(x), 1e-15, "seed " + seed + ", exp(" + x + ")");
        }
    }

    @Test
    void endsAreExact() {
        assertEquals(1, Exponential.of(0));
        assertEquals(1, Exponential.of(-0.0));
        assertEquals(0, Exponential.of(-709));
        assertEquals(0, Exponential.of(Double.NEGATIVE_INFINITY));
        // e to the digits of a double: common practice.
        assertEquals(2.718281828459045, Exponential.of(1), 5e-16);
    }
}
