package dev.nearlimit.cli.output;

import dev.nearlimit.cli.failure.InputException;
import java.io.IOException;
import java.nio.file.AccessDeniedException;
import java.nio.file.FileSystemException;
import java.nio.file.Files;
import java.nio.file.NoSuchFileException;
import java.nio.file.NotDirectoryException;
import java.nio.file.Path;
import java.nio.file.StandardCopyOption;

/** Writes files that are whole or absent: to a temporary file beside the target, which is then renamed. */
public final class OutputFile {
    private OutputFile() {}

    /**
     * Writes a text in UTF-8, replacing what was there.
     *
     * @throws InputException if the target cannot be written; an older file stays as it was
     */
    public static void write(Path target, String text) {
        if (Files.isDirectory(target)) {
            throw new InputException("cannot write: is a folder, a file was expected", target.toString(), 0, 0);
        }
        Path temporary = target.resolveSibling(
                target.getFileName() + "." + ProcessHandle.current().pid() + ".tmp");
        try {
            Files.writeString(temporary, text);
            Files.move(temporary, target, StandardCopyOption.REPLACE_EXISTING);
        } catch (IOException e) {
            try {
                Files.deleteIfExists(temporary);
            } catch (IOException leftOver) {
                e.addSuppressed(leftOver);
            }
            throw new InputException("cannot write: " + reason(e), target.toString(), 0, 0);
        }
    }

    /**
     * Makes a folder and those above it, where they are not there yet.
     *
     * @throws InputException if it cannot be made
     */
    public static void makeFolder(Path folder) {
        try {
            Files.createDirectories(folder);
        } catch (IOException e) {
            throw new InputException("cannot make the folder: " + reason(e), folder.toString(), 0, 0);
        }
    }

    /**
     * Fails now rather than after the work, if a file can clearly not be written to a folder.
     *
     * @throws InputException if the folder is not writable, or a folder stands where the file would
     */
    public static void requireWritable(Path folder, String name) {
        Path target = folder.resolve(name);
        if (Files.isDirectory(target)) {
            throw new InputException("cannot write: is a folder, a file was expected", target.toString(), 0, 0);
        }
        if (!Files.isWritable(folder.toAbsolutePath())) {
            throw new InputException("cannot write to the folder: permission denied", folder.toString(), 0, 0);
        }
    }

    private static String reason(IOException e) {
        if (e instanceof NoSuchFileException || e instanceof NotDirectoryException) {
            return "the folder does not exist";
        }
        if (e instanceof AccessDeniedException) {
            return "permission denied";
        }
        if (e instanceof FileSystemException system && system.getReason() != null) {
            return system.getReason();
        }
        return String.valueOf(e.getMessage());
    }
}
