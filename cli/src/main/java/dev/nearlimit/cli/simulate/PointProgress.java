package dev.nearlimit.cli.simulate;

import dev.nearlimit.cli.output.Numbers;
import dev.nearlimit.cli.progress.Progress;
import dev.nearlimit.simulation.PointCounts;
import dev.nearlimit.simulation.StoppingRule;
import dev.nearlimit.simulation.statistics.ErrorRateIntervals;
import dev.nearlimit.simulation.statistics.Interval;
import java.util.function.LongSupplier;

/** Says of the point under way: errors so far, the interval on FER, frames a second, and how long it will still take. */
final class PointProgress {
    private static final double NANOSECONDS = 1e9;
    /** The interval takes a moment to compute, so it is not done for every block. */
    private static final double PAUSE_S = 0.1;
    /** Before this there is no rate to speak of. */
    private static final double SETTLED_S = 0.5;

    private final Progress progress;
    private final StoppingRule rule;
    private final PointMeter.Step step;
    private final String where;
    private final LongSupplier clock;
    private long firstTime;
    private long firstFrames = -1;
    private double firstDone;
    private double shownS = Double.NEGATIVE_INFINITY;

    PointProgress(Progress progress, StoppingRule rule, PointMeter.Step step, String where) {
        this(progress, rule, step, where, System::nanoTime);
    }

    /** @param clock nanoseconds from any origin */
    PointProgress(Progress progress, StoppingRule rule, PointMeter.Step step, String where, LongSupplier clock) {
        this.progress = progress;
        this.rule = rule;
        this.step = step;
        this.where = where;
        this.clock = clock;
    }

    /** Counts so far. What a journal had comes first and all at once, so rates are taken from the first call on. */
    void counted(long frames, long frameErrors) {
        double done =
                Math.min(1, Math.max((double) frames / rule.maxFrames(), (double) frameErrors / rule.frameErrors()));
        if (firstFrames < 0) {
            firstTime = clock.getAsLong();
            firstFrames = frames;
            firstDone = done;
        }
        double elapsedS = (clock.getAsLong() - firstTime) / NANOSECONDS;
        if (elapsedS - shownS < PAUSE_S) {
            return;
        }
        shownS = elapsedS;
        progress.at((step.number() - 1 + done) / step.of(), detail(frames, frameErrors, done, elapsedS));
    }

    private String detail(long frames, long frameErrors, double done, double elapsedS) {
        Interval fer =
                new ErrorRateIntervals().frameErrorRate(new PointCounts(frames, frameErrors, 0, 0, 0, 0, false), rule);
        boolean settled = elapsedS >= SETTLED_S && frames > firstFrames;
        StringBuilder text = new StringBuilder(where);
        if (step.of() > 1) {
            text.append(", ").append(step.number()).append(" of ").append(step.of());
        }
        if (settled) {
            double leftS = (1 - done) * elapsedS / (done - firstDone);
            text.append(", ").append(Numbers.duration(leftS)).append(" left");
        }
        text.append(": ").append(frameErrors).append(frameErrors == 1 ? " error, " : " errors, ");
        text.append(
                frameErrors == 0
                        ? "FER below " + Numbers.errorRate(fer.high())
                        : "FER " + Numbers.errorRate(fer.low()) + ".." + Numbers.errorRate(fer.high()));
        if (settled) {
            double framesPerS = (frames - firstFrames) / elapsedS;
            // What does not fit the terminal is cut off at the end, so the least important comes last.
            text.append(", ").append(Numbers.engineering(framesPerS)).append(" frames/s");
        }
        return text.toString();
    }
}
