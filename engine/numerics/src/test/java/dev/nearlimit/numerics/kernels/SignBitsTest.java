package dev.nearlimit.numerics.kernels;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.Random;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

class SignBitsTest {
    @ParameterizedTest
    @ValueSource(ints = {1, 2, 63, 64, 65, 200})
    void everySignComesToItsBit(int rows) {
        Random random = new Random(rows);
        byte[] values = new byte[64 * rows];
        random.nextBytes(values);
        long[] bits = random.longs(rows).toArray();
        SignBits.gather(values, bits, random.longs(512).toArray());
        for (int i = 0; i < values.length; i++) {
            assertEquals(values[i] < 0 ? 1 : 0, bits[i / 64] >>> (i % 64) & 1, "value " + i + ", seed " + rows);
        }
    }
}
