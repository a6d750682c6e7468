package dev.nearlimit.cli.journal;

import dev.nearlimit.journal.FallbackJournal;
import dev.nearlimit.journal.Journal;
import dev.nearlimit.journal.JournalException;
import java.io.PrintWriter;

/**
 * The journal of one run. If it fails while the run is under way, the user is told at once, the run goes on without it,
 * and its table is as whole as ever; the exit code then says that something failed.
 */
public final class RunJournal implements AutoCloseable {
    private final Journal journal;
    private final FallbackJournal file;

    private RunJournal(Journal journal, FallbackJournal file) {
        this.journal = journal;
        this.file = file;
    }

    static RunJournal without(Journal otherwise) {
        return new RunJournal(otherwise, null);
    }

    static RunJournal of(Journal kept, Journal otherwise, PrintWriter err) {
        FallbackJournal file = new FallbackJournal(kept, otherwise, e -> report(e, err));
        return new RunJournal(file, file);
    }

    private static void report(JournalException e, PrintWriter err) {
        err.println("nearlimit: " + e.file() + ": " + e.getMessage()
                + "; the run goes on, but what it computes from here on is not kept");
        err.flush();
    }

    /** Where the run keeps its blocks. */
    public Journal journal() {
        return journal;
    }

    /** Whether blocks outlive the run. */
    public boolean isFile() {
        return file != null;
    }

    /** Whether the journal failed while the run was under way. */
    public boolean failed() {
        return file != null && file.failed();
    }

    @Override
    public void close() {
        journal.close();
    }
}
