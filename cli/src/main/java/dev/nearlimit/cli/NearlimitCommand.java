package dev.nearlimit.cli;

import dev.nearlimit.cli.command.CodesCommand;
import dev.nearlimit.cli.command.InspectCommand;
import dev.nearlimit.cli.command.LimitCommand;
import dev.nearlimit.cli.command.RareErrorsCommand;
import dev.nearlimit.cli.failure.ErrorLine;
import dev.nearlimit.cli.failure.Failure;
import dev.nearlimit.cli.failure.ParseFailure;
import dev.nearlimit.cli.journal.RunsCommand;
import dev.nearlimit.cli.shortlist.ShortlistCommand;
import dev.nearlimit.cli.simulate.SimulateCommand;
import java.io.PrintWriter;
import java.util.List;
import picocli.CommandLine;
import picocli.CommandLine.Command;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Model.OptionSpec;
import picocli.CommandLine.ParameterException;
import picocli.CommandLine.ParseResult;
import picocli.CommandLine.ScopeType;
import picocli.CommandLine.Spec;

/** The command {@code nearlimit}: what all commands share, and the list of them. */
@Command(
        name = "nearlimit",
        scope = ScopeType.INHERIT,
        mixinStandardHelpOptions = true,
        versionProvider = VersionText.class,
        sortOptions = false,
        usageHelpAutoWidth = false,
        usageHelpWidth = 80,
        synopsisHeading = "",
        descriptionHeading = "%n",
        parameterListHeading = "%n",
        optionListHeading = "%n",
        commandListHeading = "%nCommands:%n",
        exitCodeListHeading = "%nExit codes:%n",
        exitCodeList = {
            "0:answered",
            "1:a check that was asked for failed",
            "2:bad input; one line on standard error says what and where",
            "3:the tool failed, or standard output could not be written",
            "130:interrupted (143 after SIGTERM); what was finished is printed"
        })
public final class NearlimitCommand implements Runnable {
    @Spec
    private CommandSpec spec;

    private NearlimitCommand() {}

    /** All commands; a new one is added here and nowhere else. */
    private static List<Object> commands(Session session) {
        return List.of(
                new ShortlistCommand(session),
                new CodesCommand(),
                new InspectCommand(session),
                new SimulateCommand(session),
                new RareErrorsCommand(session),
                new RunsCommand(session),
                new LimitCommand());
    }

    /**
     * The whole command line, ready to execute.
     *
     * @param out where results go
     * @param err where errors and progress go
     */
    public static CommandLine commandLine(Session session, PrintWriter out, PrintWriter err) {
        CommandLine root = new CommandLine(new NearlimitCommand());
        CommandSpec spec = root.getCommandSpec();
        spec.usageMessage()
                .description("Which error-correcting code comes closest to what physics allows on a given link, "
                        + "what its decoder costs, and whether the decoder delivers it.")
                .footer("%nExample:%n  nearlimit limit --rate 1/2 --modulation qpsk%n"
                        + "nearlimit COMMAND --help shows what a command takes, with an example.");
        // Read from the raw arguments (ErrorLine), so that it holds where they cannot be parsed, too.
        spec.addOption(OptionSpec.builder("--debug")
                .type(boolean.class)
                .scopeType(ScopeType.INHERIT)
                .description("On failure print the stack trace as well.")
                .build());
        for (Object command : commands(session)) {
            root.addSubcommand(command);
        }
        root.setCaseInsensitiveEnumValuesAllowed(true);
        root.setOverwrittenOptionsAllowed(false);
        root.setAbbreviatedOptionsAllowed(false);
        root.setColorScheme(CommandLine.Help.defaultColorScheme(CommandLine.Help.Ansi.OFF));
        root.setOut(out);
        root.setErr(err);
        root.setParameterExceptionHandler(NearlimitCommand::badArguments);
        root.setExecutionExceptionHandler(NearlimitCommand::failed);
        return root;
    }

    @Override
    public void run() {
        throw new ParameterException(
                spec.commandLine(),
                "no command given; known are "
                        + String.join(", ", spec.subcommands().keySet()) + " (see nearlimit --help)");
    }

    private static int badArguments(ParameterException e, String[] args) {
        ErrorLine.of(args).print(ParseFailure.of(e), e, e.getCommandLine().getErr());
        return ExitCode.BAD_INPUT;
    }

    private static int failed(Exception e, CommandLine command, ParseResult parsed) {
        String[] args = parsed.originalArgs().toArray(String[]::new);
        Failure failure = Failure.of(e);
        ErrorLine.of(args).print(failure, e, command.getErr());
        return failure.exitCode();
    }
}
