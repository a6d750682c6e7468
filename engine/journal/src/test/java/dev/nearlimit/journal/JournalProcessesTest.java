package dev.nearlimit.journal;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.BufferedReader;
import java.io.IOException;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** Real processes on one file: killed at any moment, or at work side by side. */
final class JournalProcessesTest {
    @TempDir
    Path folder;

    @Test
    void whatAKilledProcessHadKeptIsThere() throws IOException, InterruptedException {
        long kept = 0;
        for (int round = 0; round < 3; round++) {
            Process process = JournalProcess.start(folder, 0, Long.MAX_VALUE);
            try (BufferedReader said = process.inputReader()) {
                long until = kept + 150; // a multiple of ten, as what the process says
                for (String line = said.readLine(); line != null; line = said.readLine()) {
                    kept = Math.max(kept, Long.parseLong(line) + 1);
                    if (kept == until) {
                        // By its handle: the process object would close what it has said as well.
                        process.toHandle().destroyForcibly();
                    }
                }
            }
            assertTrue(process.waitFor() != 0, "was not killed");
            try (SqliteJournal journal = SqliteJournal.open(folder.resolve("journal.sqlite"), "tool 1")) {
                // What the dead process had claimed stands in nobody's way.
                Claim claim = new Claim(JournalContract.OTHER, 0, 1000);
                assertEquals(Optional.of(claim), journal.claim(JournalContract.OTHER, 0, 1000, 1000));
                for (long piece = 0; piece < kept; piece++) {
                    assertArrayEquals(
                            JournalContract.content(piece),
                            journal.find(JournalContract.JOB, piece).orElseThrow(),
                            "piece " + piece + " in round " + round);
                }
            }
        }
    }

    /** All three make the journal at the same moment and keep overlapping pieces. */
    @Test
    void severalProcessesShareAFile() throws IOException, InterruptedException {
        List<Process> processes = new ArrayList<>();
        for (int i = 0; i < 3; i++) {
            processes.add(JournalProcess.start(folder, 100L * i, 100L * i + 300));
        }
        for (Process process : processes) {
            process.getInputStream().transferTo(java.io.OutputStream.nullOutputStream());
            assertEquals(0, process.waitFor());
        }
        try (SqliteJournal journal = SqliteJournal.open(folder.resolve("journal.sqlite"), "tool 1")) {
            for (long piece = 0; piece < 500; piece++) {
                assertArrayEquals(
                        JournalContract.content(piece),
                        journal.find(JournalContract.JOB, piece).orElseThrow());
            }
        }
    }
}
