package dev.nearlimit.cli.progress;

import java.io.PrintWriter;

/** Shows how far one piece of long work has come. Called from one thread at a time. */
public interface Progress extends AutoCloseable {
    /**
     * The work has come this far.
     *
     * @param fraction of the whole, 0 to 1
     * @param detail a few words on what is being done now
     */
    void at(double fraction, String detail);

    /** Takes away what was drawn. */
    @Override
    void close();

    /**
     * Progress of work that begins now.
     *
     * @param terminal whether standard error is a terminal
     * @param err where lines go otherwise
     * @param task what is being done, in a word
     */
    static Progress start(boolean terminal, PrintWriter err, String task) {
        return terminal ? new DrawnProgress(task) : new SparseProgress(err, task, System::nanoTime);
    }
}
