package dev.nearlimit.cli.progress;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.PrintWriter;
import java.io.StringWriter;
import java.util.concurrent.atomic.AtomicLong;
import org.junit.jupiter.api.Test;

final class SparseProgressTest {
    private final StringWriter text = new StringWriter();
    private final AtomicLong clock = new AtomicLong(-5_000_000_000L);
    private final SparseProgress progress = new SparseProgress(new PrintWriter(text), "simulating", clock::get);

    @Test
    void shortWorkIsSilent() {
        after(9.9, 0.9);
        assertEquals("", text.toString());
    }

    @Test
    void lineTellsWhatIsLeft() {
        after(20, 0.25);
        assertEquals("nearlimit: simulating 25 %, about 1 min 0 s left (2.5 dB)\n", text.toString());
    }

    @Test
    void anHourTakesAFewDozenLines() {
        for (int s = 0; s <= 3600; s++) {
            after(s, s / 3600.0);
        }
        long lines = text.toString().lines().count();
        assertTrue(lines >= 10 && lines <= 40, lines + " lines");
    }

    private void after(double seconds, double fraction) {
        clock.set(-5_000_000_000L + Math.round(seconds * 1e9));
        progress.at(fraction, "2.5 dB");
    }
}
