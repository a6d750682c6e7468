package dev.nearlimit.cli.failure;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import dev.nearlimit.cli.ExitCode;
import java.io.PrintWriter;
import java.io.StringWriter;
import org.junit.jupiter.api.Test;

final class ErrorLineTest {
    private static String printed(Failure failure, String... args) {
        StringWriter text = new StringWriter();
        ErrorLine.of(args).print(failure, null, new PrintWriter(text));
        return text.toString();
    }

    @Test
    void placeStandsBeforeTheMessage() {
        Failure failure = new Failure("found 2, expected 1", "h.csv", 3, 7, ExitCode.BAD_INPUT);
        assertEquals("nearlimit: h.csv:3:7: found 2, expected 1\n", printed(failure));
    }

    @Test
    void jsonHasThePlaceInFields() {
        Failure failure = new Failure("found 2, expected 1", "h.csv", 3, 7, ExitCode.BAD_INPUT);
        assertEquals(
                "{\"error\":{\"message\":\"found 2, expected 1\",\"file\":\"h.csv\",\"line\":3,\"column\":7}}\n",
                printed(failure, "inspect", "--format", "json"));
    }

    @Test
    void defectOfTheToolIsNoMistakeOfTheUser() {
        Failure failure = Failure.of(new IllegalStateException("broken"));
        assertEquals(ExitCode.TOOL_FAILED, failure.exitCode());
        assertTrue(failure.message().contains("internal error"), failure.message());
    }
}
