package dev.nearlimit.cli.journal;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.nio.file.Path;
import java.util.Map;
import org.junit.jupiter.api.Test;

final class DefaultJournalTest {
    private static final Path HOME = Path.of("/home/user");

    @Test
    void followsTheCustomOfTheSystem() {
        assertEquals(
                Path.of("/home/user/.local/share/nearlimit/journal.sqlite"),
                DefaultJournal.location(Map.of(), "Linux", HOME));
        assertEquals(
                Path.of("/home/user/Library/Application Support/nearlimit/journal.sqlite"),
                DefaultJournal.location(Map.of(), "Mac OS X", HOME));
        // A path that is absolute where the test runs stands for one that is on Windows.
        assertEquals(
                Path.of("/local/nearlimit/journal.sqlite"),
                DefaultJournal.location(Map.of("LOCALAPPDATA", "/local"), "Windows 11", HOME));
    }

    @Test
    void obeysAnAbsoluteDataHome() {
        assertEquals(
                Path.of("/data/nearlimit/journal.sqlite"),
                DefaultJournal.location(Map.of("XDG_DATA_HOME", "/data"), "Linux", HOME));
        for (String ignored : new String[] {"", "data"}) {
            assertEquals(
                    Path.of("/home/user/.local/share/nearlimit/journal.sqlite"),
                    DefaultJournal.location(Map.of("XDG_DATA_HOME", ignored), "Linux", HOME));
        }
    }
}
