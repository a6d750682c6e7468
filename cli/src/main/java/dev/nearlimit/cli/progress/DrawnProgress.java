package dev.nearlimit.cli.progress;

import java.io.FileDescriptor;
import java.io.FileOutputStream;
import java.io.PrintStream;
import java.nio.charset.StandardCharsets;
import me.tongfei.progressbar.ConsoleProgressBarConsumer;
import me.tongfei.progressbar.ProgressBar;
import me.tongfei.progressbar.ProgressBarBuilder;
import me.tongfei.progressbar.ProgressState;

/** A bar with an estimate of the time left, drawn in place on standard error and taken away at the end. */
final class DrawnProgress implements Progress {
    private static final int STEPS = 1000;
    private static final int WIDTH = 79;
    private static final int BAR = 20;
    private static final double NANOSECONDS = 1e9;
    private static final int REDRAW_MS = 250;
    /** Work that ends sooner shows nothing. */
    private static final long PATIENCE_NS = 1_000_000_000L;

    private final String task;
    private final long start = System.nanoTime();
    private ProgressBar bar;

    DrawnProgress(String task) {
        this.task = task;
    }

    @Override
    public void at(double fraction, String detail) {
        if (bar == null) {
            if (System.nanoTime() - start < PATIENCE_NS) {
                return;
            }
            bar = newBar();
        }
        bar.stepTo(Math.round(STEPS * fraction));
        bar.setExtraMessage(detail);
    }

    private ProgressBar newBar() {
        PrintStream terminal = new PrintStream(new FileOutputStream(FileDescriptor.err), true, StandardCharsets.UTF_8);
        return new ProgressBarBuilder()
                .setTaskName(task)
                .setInitialMax(STEPS)
                .setUpdateIntervalMillis(REDRAW_MS)
                .setRenderer((state, width) -> line(state))
                .setConsumer(new ConsoleProgressBarConsumer(terminal, WIDTH))
                .clearDisplayOnFinish()
                .build();
    }

    private String line(ProgressState state) {
        double elapsedS = (System.nanoTime() - start) / NANOSECONDS;
        return line(task, state.getNormalizedProgress(), elapsedS, state.getExtraMessage());
    }

    /** One line of exactly the terminal's width; the longer the detail, the less stands before it. */
    static String line(String task, double fraction, double elapsedS, String detail) {
        int full = (int) (BAR * fraction);
        String bar = "[" + "=".repeat(full) + " ".repeat(BAR - full) + "]";
        String estimate = Estimate.text(elapsedS, fraction);
        String line = task + " " + bar + " " + estimate + " (" + detail + ")";
        if (line.length() > WIDTH) {
            line = task + " " + estimate + " (" + detail + ")";
        }
        if (line.length() > WIDTH) {
            line = Estimate.share(fraction) + ", " + detail;
        }
        // Blanks to the end wipe what a longer line has left.
        return (line + " ".repeat(WIDTH)).substring(0, WIDTH);
    }

    @Override
    public void close() {
        if (bar != null) {
            bar.close();
        }
    }
}
