package dev.nearlimit.cli.simulate;

import dev.nearlimit.cli.Interruption;
import dev.nearlimit.cli.progress.Progress;
import dev.nearlimit.numerics.kernels.Kernels;
import dev.nearlimit.simulation.Point;
import dev.nearlimit.simulation.PointOutcome;
import dev.nearlimit.simulation.RunControl;
import dev.nearlimit.simulation.Scheme;
import dev.nearlimit.simulation.Simulator;
import java.util.Optional;

/** Measures points one after the other, until time is up or the user has had enough. Time runs from its making on. */
final class PointMeter {
    private static final double NANOSECONDS = 1e9;

    private final Simulator simulator;
    private final long seed;
    private final StoppingChoice stopping;
    private final Interruption interruption;
    private final Progress progress;
    private final long start = System.nanoTime();
    private final RunControl control;
    private PointStop endedBy;

    PointMeter(Simulator simulator, long seed, StoppingChoice stopping, Interruption interruption, Progress progress) {
        this.simulator = simulator;
        this.seed = seed;
        this.stopping = stopping;
        this.interruption = interruption;
        this.progress = progress;
        RunControl cancellable = RunControl.none().withCancellation(interruption::requested);
        this.control = stopping.timeLimit()
                .map(limit -> cancellable.withTimeLimit(limit.duration()))
                .orElse(cancellable);
    }

    /** Whether the run was ended early: nothing more is to be measured. */
    boolean ended() {
        return endedBy != null;
    }

    /** What ended the run early; empty if it was not. */
    Optional<PointStop> endedBy() {
        return Optional.ofNullable(endedBy);
    }

    /**
     * Measures a point.
     *
     * @param step which of all points this is
     * @param where what distinguishes it, in a few words
     * @return what was counted; empty if nothing was before the run was ended
     */
    Optional<MeasuredPoint> measure(Scheme scheme, Point point, Step step, String where) {
        PointProgress shown = new PointProgress(progress, stopping.rule(), step, where);
        PointOutcome outcome =
                simulator.measure(scheme, point, seed, stopping.rule(), control.withProgress(shown::counted));
        PointStop stop = stop(outcome);
        endedBy = outcome.counts().complete() ? null : stop;
        return outcome.counts().frames() == 0
                ? Optional.empty()
                : Optional.of(MeasuredPoint.of(
                        point, outcome, stop, stopping.rule(), scheme.code().k()));
    }

    private PointStop stop(PointOutcome outcome) {
        if (!outcome.counts().complete()) {
            return interruption.requested() ? PointStop.INTERRUPT : PointStop.TIME_LIMIT;
        }
        return outcome.counts().frameErrors() >= stopping.rule().frameErrors()
                ? PointStop.FRAME_ERRORS
                : PointStop.FRAMES;
    }

    /**
     * What the run has cost so far.
     *
     * @param n code bits a frame
     * @param kept whether blocks are kept in a journal that outlives the run
     */
    Performance performance(int n, boolean kept) {
        return new Performance(
                Kernels.name(),
                simulator.threads(),
                n,
                (System.nanoTime() - start) / NANOSECONDS,
                simulator.blocks(),
                kept);
    }

    /**
     * A place in a run of several points.
     *
     * @param number from 1
     * @param of how many there are
     */
    record Step(int number, int of) {}
}
