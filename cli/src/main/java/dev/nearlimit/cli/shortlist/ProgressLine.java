package dev.nearlimit.cli.shortlist;

import dev.nearlimit.cli.output.Numbers;
import dev.nearlimit.cli.progress.Progress;

/** Joins what the shortlist says of its stages with what the simulator says of the point under way. */
final class ProgressLine {
    private final Progress progress;
    private String stage = "";
    private double fraction;

    ProgressLine(Progress progress) {
        this.progress = progress;
    }

    /** The shortlist begins a stage. */
    synchronized void stage(String what, double share) {
        stage = what;
        fraction = share;
        progress.at(fraction, stage);
    }

    /** The simulator has counted frames of the point under way. */
    synchronized void counted(long frames, long frameErrors) {
        progress.at(
                fraction, stage + ": " + Numbers.engineering(frames).trim() + " frames, " + frameErrors + " errors");
    }
}
