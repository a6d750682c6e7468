package dev.nearlimit.simulation;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** A run of any length takes the memory of a short one. */
final class FlatMemoryTest {
    /** Enough for the JVM, SQLite's driver and two workers; a tenth of what the run's blocks would take if kept. */
    private static final int HEAP_MIB = 10;

    @TempDir
    Path folder;

    @Test
    void aMillionFramesFitASmallHeapWithAJournal() throws IOException, InterruptedException {
        String journal = folder.resolve("journal.sqlite").toString();
        Process process = LongRunProcess.start(HEAP_MIB, folder, journal, LongRunProcess.FRAMES);
        String said = new String(process.getInputStream().readAllBytes(), StandardCharsets.UTF_8);
        assertEquals(0, process.waitFor(), said);
        assertTrue(said.contains("frames=" + LongRunProcess.FRAMES), said);
        // Counting what the journal has holds no block either.
        Process again = LongRunProcess.start(HEAP_MIB, folder, journal, LongRunProcess.FRAMES);
        assertEquals(said, new String(again.getInputStream().readAllBytes(), StandardCharsets.UTF_8));
        assertEquals(0, again.waitFor());
    }

    /** What makes the other test one that can fail: the same run with its blocks kept in memory does not fit. */
    @Test
    void theSameRunDoesNotFitWithItsBlocksInMemory() throws IOException, InterruptedException {
        Process process = LongRunProcess.start(HEAP_MIB, folder, "memory", LongRunProcess.FRAMES);
        String said = new String(process.getInputStream().readAllBytes(), StandardCharsets.UTF_8);
        assertTrue(process.waitFor() != 0 && said.contains("OutOfMemoryError"), said);
    }
}
