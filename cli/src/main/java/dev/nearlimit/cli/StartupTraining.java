package dev.nearlimit.cli;

import java.io.PrintWriter;
import java.io.Writer;
import java.util.List;

/**
 * Runs the short commands once and shows nothing, so that the launcher can have the JVM note which classes they load and
 * share them between later starts.
 */
final class StartupTraining {
    private StartupTraining() {}

    public static void main(String[] args) {
        List<String> commands = List.copyOf(commandLine().getSubcommands().keySet());
        run("--help");
        run("--version");
        run("no-such-command");
        for (String command : commands) {
            run(command, "--help");
        }
        run("limit", "--rate", "1/2");
        run("limit", "--rate", "1/2", "--format", "json");
        run("codes", "--length", "7", "--format", "csv");
    }

    private static void run(String... args) {
        int code = commandLine().execute(args);
        if (code != ExitCode.OK && code != ExitCode.BAD_INPUT) {
            throw new IllegalStateException(String.join(" ", args) + " ended with " + code);
        }
    }

    private static picocli.CommandLine commandLine() {
        Session session = new Session(false, new Interruption());
        PrintWriter nowhere = new PrintWriter(Writer.nullWriter());
        return NearlimitCommand.commandLine(session, nowhere, nowhere);
    }
}
