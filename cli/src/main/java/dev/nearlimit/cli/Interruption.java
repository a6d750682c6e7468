package dev.nearlimit.cli;

import java.util.concurrent.CountDownLatch;
import java.util.concurrent.TimeUnit;

/**
 * The wish of the user, or of the system, that the running command come to its end. Commands ask {@link #requested()}
 * at convenient points, finish what they have and print it marked incomplete.
 */
public final class Interruption {
    private static final long GRACE_SECONDS = 20;

    private final CountDownLatch finished = new CountDownLatch(1);
    private volatile boolean requested;

    public boolean requested() {
        return requested;
    }

    public void request() {
        requested = true;
    }

    /**
     * Turns Ctrl-C and SIGTERM into a request and holds the process until the command has printed what it had. The JVM
     * itself then ends with 128 plus the signal's number, whatever the command returned.
     */
    void watchSignals() {
        Runtime.getRuntime().addShutdownHook(new Thread(this::stopAndWait, "interrupt"));
    }

    /** Tells a waiting signal that everything has been printed. */
    void commandFinished() {
        finished.countDown();
    }

    private void stopAndWait() {
        request();
        try {
            // An interrupted command answers within a block of frames; what takes longer hangs and is cut off.
            finished.await(GRACE_SECONDS, TimeUnit.SECONDS);
        } catch (InterruptedException e) {
            Thread.currentThread().interrupt();
        }
    }
}
