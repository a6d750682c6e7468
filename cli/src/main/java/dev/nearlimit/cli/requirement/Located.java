package dev.nearlimit.cli.requirement;

import dev.nearlimit.cli.failure.InputException;
import dev.nearlimit.codes.InvalidCodeException;
import dev.nearlimit.codes.matrix.MatrixFormatException;
import dev.nearlimit.decoders.InvalidDecoderException;
import dev.nearlimit.limits.InvalidLimitException;
import java.util.function.Supplier;

/** Gives a user mistake that a room reports the place in the file where it was made. */
final class Located {
    private Located() {}

    static <T> T at(String file, int line, int column, Supplier<T> action) {
        try {
            return action.get();
        } catch (MatrixFormatException e) {
            // It names its own file and line, which say more than the place where that file is named.
            throw e;
        } catch (InvalidCodeException | InvalidDecoderException | InvalidLimitException e) {
            throw new InputException(e.getMessage(), file, line, column);
        }
    }
}
