package dev.nearlimit.cli.failure;

import dev.nearlimit.cli.ExitCode;
import java.util.Arrays;
import java.util.List;
import java.util.Locale;
import java.util.stream.Collectors;
import picocli.CommandLine.MaxValuesExceededException;
import picocli.CommandLine.MissingParameterException;
import picocli.CommandLine.Model.ArgSpec;
import picocli.CommandLine.Model.OptionSpec;
import picocli.CommandLine.OverwrittenOptionException;
import picocli.CommandLine.ParameterException;
import picocli.CommandLine.TypeConversionException;
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
            if (missing.getMissing().stream().anyMatch(arg -> isGivenWithoutValue(arg, missing))) {
                return name(missing.getMissing().get(0)) + " needs a value";
            }
            return command + " needs "
                    + missing.getMissing().stream().map(ParseFailure::name).collect(Collectors.joining(" and "));
        }
        if (e instanceof OverwrittenOptionException overwritten) {
            return name(overwritten.getOverwritten()) + " is given twice";
        }
        if (e.getCause() instanceof TypeConversionException && e.getArgSpec() != null) {
            return name(e.getArgSpec()) + " is '" + e.getValue() + "', expected "
                    + expected(e.getArgSpec().type());
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

    /** The parser reports an option that is absent and one that is left without its value in the same way. */
    private static boolean isGivenWithoutValue(ArgSpec arg, MissingParameterException e) {
        return arg instanceof OptionSpec option
                && e.getCommandLine().getParseResult().originalArgs().contains(option.longestName());
    }

    private static String expected(Class<?> type) {
        if (type.isEnum()) {
            return "one of "
                    + Arrays.stream(type.getEnumConstants())
                            .map(constant -> ((Enum<?>) constant).name().toLowerCase(Locale.ROOT))
                            .collect(Collectors.joining(", "));
        }
        if (type == int.class || type == Integer.class) {
            return "a whole number up to " + Integer.MAX_VALUE;
        }
        if (type == long.class || type == Long.class) {
            return "a whole number up to " + Long.MAX_VALUE;
        }
        if (type == double.class || type == Double.class) {
            return "a number";
        }
        return "a " + type.getSimpleName().toLowerCase(Locale.ROOT);
    }

    private static String name(ArgSpec arg) {
        return arg.isOption() ? ((OptionSpec) arg).longestName() : arg.paramLabel();
    }

    private static String firstLower(String text) {
        return text.isEmpty() ? text : Character.toLowerCase(text.charAt(0)) + text.substring(1);
    }
}
