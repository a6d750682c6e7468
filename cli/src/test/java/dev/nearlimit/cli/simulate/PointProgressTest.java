package dev.nearlimit.cli.simulate;

import static org.junit.jupiter.api.Assertions.assertEquals;

import dev.nearlimit.cli.progress.Progress;
import dev.nearlimit.simulation.StoppingRule;
import java.util.ArrayList;
import java.util.List;
import java.util.concurrent.atomic.AtomicLong;
import org.junit.jupiter.api.Test;

final class PointProgressTest {
    private final List<String> lines = new ArrayList<>();
    private final AtomicLong clock = new AtomicLong(77);
    private final PointProgress progress = new PointProgress(
            new Progress() {
                @Override
                public void at(double fraction, String detail) {
                    lines.add(Math.round(1000 * fraction) + " " + detail);
                }

                @Override
                public void close() {
                    // Nothing was opened.
                }
            },
            new StoppingRule(1_000_000, 100),
            new PointMeter.Step(2, 4),
            "2.5 dB",
            clock::get);

    /**
     * 20 errors came from the journal in no time, 20 more in 10 s at 1000 frames a second: the 60 that are left take 30 s.
     * The interval is Clopper and Pearson's of 40 in 20000, 1.4e-3 .. 2.7e-3.
     */
    @Test
    void rateAndTimeLeftAreThoseOfWhatIsComputedNow() {
        progress.counted(10_000, 20);
        clock.addAndGet(10_000_000_000L);
        progress.counted(20_000, 40);
        assertEquals(
                List.of(
                        "300 2.5 dB, 2 of 4: 20 errors, FER 1.2e-3..3.1e-3",
                        "350 2.5 dB, 2 of 4, 30 s left: 40 errors, FER 1.4e-3..2.7e-3, 1.00 k frames/s"),
                lines);
    }

    @Test
    void withoutErrorsThereIsABound() {
        progress.counted(3689, 0);
        assertEquals(List.of("251 2.5 dB, 2 of 4: 0 errors, FER below 1.0e-3"), lines);
    }

    @Test
    void blocksInQuickSuccessionAreNotAllShown() {
        for (int i = 1; i <= 1000; i++) {
            progress.counted(64L * i, 0);
            clock.addAndGet(1_000_000);
        }
        assertEquals(10, lines.size());
    }
}
