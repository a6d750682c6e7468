package dev.nearlimit.numerics.random;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.nio.ByteBuffer;
import java.util.SplittableRandom;
import java.util.random.RandomGenerator;
import java.util.random.RandomGeneratorFactory;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

class Xoshiro256PlusPlusTest {
    /**
     * The JDK's own generator of that name takes 32 seed bytes as its state: an independent judge of the twin. Bytes stay
     * below 128, because JDK 17 extends their signs when it joins them.
     */
    @ParameterizedTest
    @ValueSource(longs = {1, 2, 3})
    void twinAgreesWithTheJdk(long seed) {
        SplittableRandom random = new SplittableRandom(seed);
        long[] state = random.longs(4).map(word -> word & 0x7f7f7f7f7f7f7f7fL).toArray();
        ByteBuffer bytes = ByteBuffer.allocate(32);
        bytes.asLongBuffer().put(state);
        RandomGenerator judge = RandomGeneratorFactory.of("Xoshiro256PlusPlus").create(bytes.array());
        Xoshiro256PlusPlus twin = new Xoshiro256PlusPlus(state);
        for (int i = 0; i < 1000; i++) {
            assertEquals(judge.nextLong(), twin.next(), "seed " + seed + ", draw " + i);
        }
    }
}
