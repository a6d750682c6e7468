package dev.nearlimit.cli.failure;

import dev.nearlimit.algebra.errorrate.InvalidErrorRateException;
import dev.nearlimit.algebra.weight.InfeasibleEnumerationException;
import dev.nearlimit.cli.ExitCode;
import dev.nearlimit.codes.InvalidCodeException;
import dev.nearlimit.codes.matrix.MatrixFormatException;
import dev.nearlimit.decoders.InvalidDecoderException;
import dev.nearlimit.journal.JournalException;
import dev.nearlimit.limits.InvalidLimitException;
import dev.nearlimit.shortlist.requirement.InvalidRequirementException;
import dev.nearlimit.simulation.InvalidSimulationException;
import java.util.List;
import java.util.concurrent.CancellationException;

/**
 * A failure in the terms in which it is reported.
 *
 * @param message one line; the place is not in it
 * @param file path as the user gave it; null where there is none
 * @param line from 1; 0 where unknown
 * @param column from 1; 0 where unknown
 * @param exitCode what the process ends with
 */
public record Failure(String message, String file, int line, int column, int exitCode) {
    /** User mistakes that the rooms report; whatever else is thrown is a defect of the tool. */
    private static final List<Class<? extends RuntimeException>> USER_MISTAKES = List.of(
            InfeasibleEnumerationException.class,
            InvalidCodeException.class,
            InvalidDecoderException.class,
            InvalidErrorRateException.class,
            InvalidLimitException.class,
            InvalidRequirementException.class,
            InvalidSimulationException.class);

    /** A failure of the tool or its surroundings. */
    public static Failure of(String message) {
        return new Failure(message, null, 0, 0, ExitCode.TOOL_FAILED);
    }

    /** What an exception means for the user. */
    public static Failure of(Exception e) {
        if (e instanceof InputException input) {
            return new Failure(input.getMessage(), input.file(), input.line(), input.column(), ExitCode.BAD_INPUT);
        }
        if (e instanceof MatrixFormatException matrix) {
            String message = "found " + matrix.found() + ", expected " + matrix.expected();
            return new Failure(message, matrix.file(), matrix.line(), matrix.column(), ExitCode.BAD_INPUT);
        }
        if (e instanceof JournalException journal) {
            return new Failure(journal.getMessage(), journal.file(), 0, 0, ExitCode.BAD_INPUT);
        }
        if (e instanceof CancellationException) {
            return new Failure("interrupted", null, 0, 0, ExitCode.INTERRUPTED);
        }
        if (USER_MISTAKES.stream().anyMatch(kind -> kind.isInstance(e))) {
            return new Failure(e.getMessage(), null, 0, 0, ExitCode.BAD_INPUT);
        }
        String what = e.getMessage() == null ? e.getClass().getSimpleName() : e.getMessage();
        return of("internal error, please report it: " + what + " (--debug shows where)");
    }

    /** The message behind its place, as {@code file:line:column: message} with what is known of it. */
    public String located() {
        StringBuilder text = new StringBuilder();
        if (file != null) {
            text.append(file).append(':');
            if (line > 0) {
                text.append(line).append(':');
                if (column > 0) {
                    text.append(column).append(':');
                }
            }
            text.append(' ');
        }
        return text.append(message).toString();
    }
}
