package dev.nearlimit.simulation;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.Arrays;
import java.util.SplittableRandom;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

class FailedFramesTest {
    @ParameterizedTest
    @ValueSource(longs = {1, 100, 200, 1_000_000, 1L << 40})
    void framesComeBack(long spread) {
        SplittableRandom random = new SplittableRandom(spread);
        long[] failed = random.longs(300, 0, spread * 1000).distinct().sorted().toArray();
        FailedFrames frames = FailedFrames.of(spread * 1000, failed);
        assertEquals(spread * 1000, frames.knownFrames());
        assertArrayEquals(failed, frames.before(Long.MAX_VALUE));
        long[] bounds = {0, failed[0], failed[0] + 1, failed[failed.length / 2], failed[failed.length - 1]};
        for (long bound : bounds) {
            assertArrayEquals(
                    Arrays.stream(failed).filter(f -> f < bound).toArray(), frames.before(bound), "before " + bound);
        }
    }

    @Test
    void onlyTheFirstAreKeptAndTheRestIsUnknown() {
        FailedFrames.Recorder recorder = new FailedFrames.Recorder();
        for (long f = 0; f < FailedFrames.MOST + 10; f++) {
            recorder.add(2 * f);
        }
        FailedFrames frames = recorder.toFailedFrames(1_000_000);
        assertEquals(FailedFrames.MOST, frames.before(Long.MAX_VALUE).length);
        assertEquals(2L * FailedFrames.MOST, frames.knownFrames());
    }

    @Test
    void nothingFailed() {
        assertArrayEquals(new long[0], FailedFrames.of(5).before(5));
        assertEquals(5, FailedFrames.of(5).knownFrames());
    }
}
