package dev.nearlimit.cli;

import dev.nearlimit.cli.failure.ErrorLine;
import dev.nearlimit.cli.failure.Failure;
import dev.nearlimit.cli.journal.DefaultJournal;
import dev.nearlimit.cli.output.StandardStream;
import dev.nearlimit.journal.SqliteLibrary;
import java.io.PrintWriter;
import java.nio.file.Path;
import java.util.Optional;

/** Starts the tool. */
public final class Main {
    private Main() {}

    public static void main(String[] args) {
        Interruption interruption = new Interruption();
        interruption.watchSignals();
        int code;
        try (StandardStream out = StandardStream.output();
                StandardStream err = StandardStream.error()) {
            code = run(args, out, err, interruption);
        }
        interruption.commandFinished();
        // Returning is not enough: the exit code has to be given, and worker threads must not hold the process.
        System.exit(code);
    }

    private static int run(String[] args, StandardStream out, StandardStream err, Interruption interruption) {
        Path journal = DefaultJournal.location();
        SqliteLibrary.keepIn(journal.resolveSibling("native"));
        Session session = new Session(Boolean.getBoolean("nearlimit.terminal"), interruption, Optional.of(journal));
        PrintWriter errors = err.writer();
        int code;
        try {
            code = NearlimitCommand.commandLine(session, out.writer(), errors).execute(args);
            out.writer().flush();
        } catch (OutOfMemoryError e) {
            // The heap is whole again here: what filled it hung on the command that has just been left.
            Failure failure =
                    Failure.of("out of memory at " + (Runtime.getRuntime().maxMemory() >> 20)
                            + " MiB; NEARLIMIT_HEAP=<size>, such as 8g, raises the ceiling");
            ErrorLine.of(args).print(failure, e, errors);
            code = ExitCode.TOOL_FAILED;
        }
        if (out.failure().isPresent()) {
            Failure failure =
                    Failure.of("cannot write standard output: " + out.failure().get());
            ErrorLine.of(args).print(failure, null, errors);
            return ExitCode.TOOL_FAILED;
        }
        return code;
    }
}
