package dev.nearlimit.codes.batch;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import java.util.Random;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

class FrameBatchTest {
    @ParameterizedTest
    @ValueSource(ints = {1, 7, 63, 64, 65, 200})
    void framesComeOutBitByBitAndGoBackWithoutTouchingOthers(int n) {
        long[] batch = new Random(n).longs(n).toArray();
        long[] copy = new long[n];
        long[] packed = new long[(n + 63) / 64];
        for (int frame = 0; frame < FrameBatch.FRAMES; frame++) {
            FrameBatch.extractFrame(batch, frame, packed);
            for (int i = 0; i < n; i++) {
                assertEquals(
                        batch[i] >>> frame & 1,
                        packed[i / 64] >>> (i % 64) & 1,
                        "n " + n + " frame " + frame + " bit " + i);
            }
            FrameBatch.insertFrame(packed, frame, copy);
            for (int i = 0; i < n; i++) {
                assertEquals(batch[i] & FrameBatch.laneMask(frame + 1), copy[i], "n " + n + " after frame " + frame);
            }
        }
        assertArrayEquals(batch, copy);
    }

    @Test
    void masksCountLanes() {
        for (int frames = 0; frames <= FrameBatch.FRAMES; frames++) {
            assertEquals(frames, Long.bitCount(FrameBatch.laneMask(frames)));
        }
        assertThrows(IllegalArgumentException.class, () -> FrameBatch.laneMask(65));
        assertEquals(64 * 3 + 5, FrameBatch.softIndex(3, 5));
    }
}
