package dev.nearlimit.cli.journal;

import dev.nearlimit.cli.Session;
import dev.nearlimit.cli.VersionText;
import dev.nearlimit.cli.failure.InputException;
import dev.nearlimit.journal.Journal;
import dev.nearlimit.journal.JournalException;
import dev.nearlimit.journal.SqliteJournal;
import java.io.IOException;
import java.io.PrintWriter;
import java.nio.file.Files;
import java.nio.file.Path;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.Spec;

/** The options {@code --journal} and {@code --no-journal}, mixed into every command that simulates. */
public final class JournalOptions {
    @Spec(Spec.Target.MIXEE)
    private CommandSpec command;

    @Option(
            names = "--journal",
            paramLabel = "FILE",
            description = "Keep finished blocks of frames in this file and take from it what is there, so that a run"
                    + " that was cut off goes on where it stood (default: a file in the user's data folder).")
    private Path file;

    @Option(names = "--no-journal", description = "Keep nothing, and compute everything anew.")
    private boolean none;

    /**
     * Opens the journal for a run. One that the user named must work; the default one is done without, after a warning,
     * where it cannot be opened.
     *
     * @param otherwise where blocks are kept while the run lasts if there is no journal, or from when on it fails
     * @throws JournalException if the named journal cannot be used
     */
    public RunJournal open(Session session, Journal otherwise) {
        if (none && file != null) {
            throw new InputException("--journal and --no-journal exclude each other");
        }
        PrintWriter err = command.commandLine().getErr();
        if (none || (file == null && session.journal().isEmpty())) {
            return RunJournal.without(otherwise);
        }
        if (file != null) {
            return RunJournal.of(SqliteJournal.open(file, tool()), otherwise, err);
        }
        Path usual = session.journal().get();
        try {
            Files.createDirectories(usual.toAbsolutePath().getParent());
            return RunJournal.of(SqliteJournal.open(usual, tool()), otherwise, err);
        } catch (JournalException e) {
            warn(err, usual, e.getMessage());
        } catch (IOException e) {
            warn(err, usual, "the journal's folder cannot be made");
        }
        return RunJournal.without(otherwise);
    }

    private static void warn(PrintWriter err, Path usual, String what) {
        err.println("nearlimit: " + usual + ": " + what + "; this run keeps nothing (--journal names another file)");
        err.flush();
    }

    private static String tool() {
        return "nearlimit " + VersionText.toolVersion();
    }
}
