package dev.nearlimit.cli.output;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import dev.nearlimit.cli.failure.InputException;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

final class OutputFileTest {
    @TempDir
    Path folder;

    @Test
    void replacesAnOlderFileAndLeavesNothingElse() throws IOException {
        Path target = Files.writeString(folder.resolve("a.csv"), "older and longer");
        OutputFile.write(target, "new");
        assertEquals("new", Files.readString(target));
        try (var files = Files.list(folder)) {
            assertEquals(1, files.count());
        }
    }

    @Test
    void missingFolderIsNamed() {
        InputException e = assertThrows(
                InputException.class,
                () -> OutputFile.write(folder.resolve("none").resolve("a.csv"), "text"));
        assertEquals("cannot write: the folder does not exist", e.getMessage());
        assertEquals(folder.resolve("none/a.csv").toString(), e.file());
    }

    @Test
    void folderIsNoFile() {
        InputException e = assertThrows(InputException.class, () -> OutputFile.write(folder, "text"));
        assertEquals("cannot write: is a folder, a file was expected", e.getMessage());
    }
}
