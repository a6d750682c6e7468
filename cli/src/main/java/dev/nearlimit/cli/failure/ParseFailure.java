package dev.nearlimit.cli.failure;

import dev.nearlimit.cli.ExitCode;
import java.util.List;
import java.util.stream.Collectors;
import picocli.CommandLine.MaxValuesExceededException;
import picocli.CommandLine.MissingParameterException;
import picocli.CommandLine.Model.ArgSpec;
import picocli.CommandLine.Model.OptionSpec;
import picocli.CommandLine.OverwrittenOptionException;
import picocli.CommandLine.ParameterException;
import picocli.CommandLine.UnmatchedArgumentException;

/** Arguments that could not be parsed, in our words: one line, and the nearest known name where there is one. */
public final class ParseFailure {
    private ParseFailure() {}

    /** The failure behind the parser's exception. */
    public static Failure of(ParameterException e) {
        if (e.getCause() instanceof InputException cause) {
            return Failure.of(cause);
        }
        return new Failure(message(e), null, 0, 0, ExitCode.BAD_INPUT);
    }

    private static String message(ParameterException e) {
        String command = e.getCommandLine().getCommandSpec().qualifiedName();
        if (e instanceof UnmatchedArgumentException unmatched) {
            return unknown(unmatched, command);
        }
        if (e instanceof MissingParameterException missing) {
            return command + " needs "
                    + missing.getMissing().stream().map(ParseFailure::name).collect(Collectors.joining(" and "));
        }
        if (e instanceof OverwrittenOptionException overwritten) {
            return name(overwritten.getOverwritten()) + " is given twice";
        }
        if (e instanceof MaxValuesExceededException) {
            return "too many values: " + firstLower(e.getMessage());
        }
        return firstLower(e.getMessage());
    }

    private static String unknown(UnmatchedArgumentException e, String command) {
        String argument = e.getUnmatched().get(0);
        String kind = e.isUnknownOption()
                ? "option"
                : e.getCommandLine().getSubcommands().isEmpty() ? "argument" : "command";
        List<String> near = e.getSuggestions();
        String hint = near.isEmpty() ? "" : "; did you mean " + near.get(0) + "?";
        return "unknown " + kind + " '" + argument + "'" + hint + " (see " + command + " --help)";
    }

    private static String name(ArgSpec arg) {
        return arg.isOption() ? ((OptionSpec) arg).longestName() : arg.paramLabel();
    }

    private static String firstLower(String text) {
        return text.isEmpty() ? text : Character.toLowerCase(text.charAt(0)) + text.substring(1);
    }
}
