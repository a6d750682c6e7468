package dev.nearlimit.cli.input;

import dev.nearlimit.cli.failure.InputException;
import picocli.CommandLine.Option;

/** The option {@code --threads}, mixed into every command that computes for long. Results do not depend on it. */
public final class ThreadsOption {
    private static final int MOST = 1024;

    @Option(
            names = "--threads",
            paramLabel = "N",
            description = "Threads to compute with (default: all processors); results do not depend on it.")
    private Integer threads;

    /** @throws InputException if the number given is out of range */
    public int count() {
        if (threads == null) {
            return Runtime.getRuntime().availableProcessors();
        }
        if (threads < 1 || threads > MOST) {
            throw new InputException("--threads is " + threads + ", must be 1 to " + MOST);
        }
        return threads;
    }
}
