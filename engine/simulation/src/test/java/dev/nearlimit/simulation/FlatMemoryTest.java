package dev.nearlimit.simulation;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import dev.nearlimit.journal.NoJournal;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** A run of any length takes the memory of a short one. */
final class FlatMemoryTest {
    /**
     * Enough for the JVM, SQLite's driver and two workers; 15625 blocks of which 56 frames fail would take some 14 MB if a
     * run held on to them.
     */
    private static final int HEAP_MIB = 8;

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
        // That JVM has no vector module: plain kernels on two threads against this JVM's on one.
        assertEquals(LongRunProcess.run(1, new NoJournal(), LongRunProcess.FRAMES) + System.lineSeparator(), said);
    }
}
