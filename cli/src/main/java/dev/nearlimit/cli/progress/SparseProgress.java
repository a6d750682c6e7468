package dev.nearlimit.cli.progress;

import java.io.PrintWriter;
import java.util.function.LongSupplier;

/** A plain line now and then, for logs: the first after ten seconds, each next one after half as long again. */
final class SparseProgress implements Progress {
    private static final double FIRST_S = 10;
    private static final double GROWTH = 1.5;
    private static final double NANOSECONDS = 1e9;

    private final PrintWriter err;
    private final String task;
    private final LongSupplier clock;
    private final long start;
    private double nextS = FIRST_S;

    /** @param clock nanoseconds from any origin */
    SparseProgress(PrintWriter err, String task, LongSupplier clock) {
        this.err = err;
        this.task = task;
        this.clock = clock;
        this.start = clock.getAsLong();
    }

    @Override
    public void at(double fraction, String detail) {
        double elapsedS = (clock.getAsLong() - start) / NANOSECONDS;
        if (elapsedS < nextS) {
            return;
        }
        nextS = elapsedS * GROWTH;
        err.println("nearlimit: " + task + " " + Estimate.text(elapsedS, fraction) + " (" + detail + ")");
        err.flush();
    }

    @Override
    public void close() {
        // Lines stay in the log.
    }
}
