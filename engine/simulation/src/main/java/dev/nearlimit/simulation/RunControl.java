package dev.nearlimit.simulation;

import java.time.Duration;
import java.util.OptionalLong;
import java.util.function.BooleanSupplier;

/**
 * How a run is watched and ended early. Whether a run ends early is no part of its result's meaning: what was counted up
 * to then is right, and marked incomplete.
 *
 * @param cancelled asked between batches, by several threads; true ends the run
 * @param progress told of every stretch that was counted
 * @param deadline {@link System#nanoTime()} at which the run ends; empty for none
 */
public record RunControl(BooleanSupplier cancelled, Progress progress, OptionalLong deadline) {

    /** Receives progress; called by one thread at a time and expected to return at once. */
    @FunctionalInterface
    public interface Progress {
        /**
         * Counts so far, of all frames up to some frame without a gap.
         *
         * @param frames frames counted
         * @param frameErrors frame errors among them
         */
        void counted(long frames, long frameErrors);
    }

    /** Runs to the stopping rule, unwatched. */
    public static RunControl none() {
        return new RunControl(() -> false, (frames, frameErrors) -> {}, OptionalLong.empty());
    }

    public RunControl withCancellation(BooleanSupplier asked) {
        return new RunControl(asked, progress, deadline);
    }

    public RunControl withProgress(Progress told) {
        return new RunControl(cancelled, told, deadline);
    }

    /** Ends the run so long after now. */
    public RunControl withTimeLimit(Duration limit) {
        return new RunControl(cancelled, progress, OptionalLong.of(System.nanoTime() + limit.toNanos()));
    }

    /** Whether the run is to end now; an interrupt of the thread that asks counts as a request. */
    public boolean stopRequested() {
        return Thread.currentThread().isInterrupted()
                || cancelled.getAsBoolean()
                || (deadline.isPresent() && System.nanoTime() - deadline.getAsLong() >= 0);
    }
}
