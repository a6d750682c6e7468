package dev.nearlimit.cli.progress;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.junit.jupiter.api.Test;

final class DrawnProgressTest {
    @Test
    void shortDetailLeavesRoomForTheBar() {
        assertEquals(
                "simulating [=====               ] 25 %, about 1 min 0 s left (2.5 dB)",
                DrawnProgress.line("simulating", 0.25, 20, "2.5 dB").stripTrailing());
    }

    @Test
    void longDetailTakesItsPlace() {
        assertEquals(
                "simulating 25 %, about 1 min 0 s left (2.5 dB, 1 of 3, 10 s left: 7 errors)",
                DrawnProgress.line("simulating", 0.25, 20, "2.5 dB, 1 of 3, 10 s left: 7 errors")
                        .stripTrailing());
        assertEquals(
                "25 %, 2.5 dB, 1 of 3, 2 min 5 s left: 37 errors, FER 2.2e-5..4.2e-5, 34.1 k fra",
                DrawnProgress.line(
                                "simulating",
                                0.25,
                                20,
                                "2.5 dB, 1 of 3, 2 min 5 s left: 37 errors, FER 2.2e-5..4.2e-5, 34.1 k frames/s")
                        .stripTrailing());
    }

    @Test
    void lineIsAlwaysAsWideAsTheTerminalLets() {
        for (int length = 0; length < 200; length++) {
            assertTrue(
                    DrawnProgress.line("simulating", 0.5, 9, "x".repeat(length)).length() == 79);
        }
    }
}
