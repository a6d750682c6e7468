package dev.nearlimit.cli;

import java.nio.file.Path;
import java.util.Optional;

/**
 * What the surroundings give to a command: whether somebody watches standard error, the wish to stop, and the user's
 * journal.
 *
 * @param terminal whether standard error is a terminal, so that progress may be drawn in place
 * @param interruption asked by long commands
 * @param journal the file in which runs keep their blocks unless told otherwise; empty where they keep nothing
 */
public record Session(boolean terminal, Interruption interruption, Optional<Path> journal) {
    /** Surroundings without a journal. */
    public Session(boolean terminal, Interruption interruption) {
        this(terminal, interruption, Optional.empty());
    }
}
