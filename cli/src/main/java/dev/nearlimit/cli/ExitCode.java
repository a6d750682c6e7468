package dev.nearlimit.cli;

/** What the process ends with; every {@code --help} lists these. */
public final class ExitCode {
    /** The question was answered. */
    public static final int OK = 0;
    /** A check that was asked for failed. */
    public static final int CHECK_FAILED = 1;
    /** The input was wrong: one line on standard error says what was found and what was expected. */
    public static final int BAD_INPUT = 2;
    /** The tool itself failed, or its output could not be written. */
    public static final int TOOL_FAILED = 3;
    /** Interrupted from the keyboard (128 + SIGINT); after SIGTERM the process ends with 143 instead. */
    public static final int INTERRUPTED = 130;

    private ExitCode() {}
}
