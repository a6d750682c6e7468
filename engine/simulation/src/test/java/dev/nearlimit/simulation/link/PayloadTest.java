package dev.nearlimit.simulation.link;

import static org.junit.jupiter.api.Assertions.assertEquals;

import dev.nearlimit.numerics.noise.UniformDraws;
import dev.nearlimit.numerics.random.FrameStreams;
import dev.nearlimit.numerics.random.Stream;
import java.util.SplittableRandom;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

class PayloadTest {
    /** Bit by bit by the stated rule. */
    @ParameterizedTest
    @ValueSource(ints = {1, 63, 64, 65, 200})
    void bitsStandWhereStated(int k) {
        long[] information = new long[k];
        new Payload(draws()).fill(128, information);
        int steps = (k + 63) / 64;
        long[] drawn = new long[64 * steps];
        UniformDraws draws = draws();
        draws.start(128);
        draws.next(drawn, steps);
        for (int i = 0; i < k; i++) {
            for (int f = 0; f < 64; f++) {
                assertEquals((drawn[64 * (i / 64) + f] >>> (i % 64)) & 1, (information[i] >>> f) & 1, i + ", " + f);
            }
        }
    }

    @Test
    void transposesAnyMatrix() {
        SplittableRandom random = new SplittableRandom(3);
        long[] words = random.longs(64).toArray();
        long[] turned = words.clone();
        BitTranspose.transpose(turned);
        for (int r = 0; r < 64; r++) {
            for (int c = 0; c < 64; c++) {
                assertEquals((words[r] >>> c) & 1, (turned[c] >>> r) & 1, r + ", " + c);
            }
        }
    }

    private static UniformDraws draws() {
        return new UniformDraws(new FrameStreams(7, 8, Stream.PAYLOAD));
    }
}
