package dev.nearlimit.cli;

import com.fasterxml.jackson.core.JsonProcessingException;
import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import java.io.PrintWriter;
import java.io.StringWriter;

/** One run of the command line in this JVM: what it ended with and what it printed. */
public record Execution(int exitCode, String out, String err) {
    /** Runs with nobody watching and nothing interrupting. */
    public static Execution of(String... args) {
        return of(new Interruption(), args);
    }

    /** Runs with an interruption that a test may request. */
    public static Execution of(Interruption interruption, String... args) {
        return of(new Session(false, interruption), args);
    }

    /** Runs in given surroundings; the others have no journal, so that no test touches the user's. */
    public static Execution of(Session session, String... args) {
        StringWriter out = new StringWriter();
        StringWriter err = new StringWriter();
        int code = NearlimitCommand.commandLine(session, new PrintWriter(out), new PrintWriter(err))
                .execute(args);
        return new Execution(code, out.toString(), err.toString());
    }

    /** What was printed, as JSON. */
    public JsonNode json() {
        try {
            return new ObjectMapper().readTree(out);
        } catch (JsonProcessingException e) {
            throw new AssertionError("no JSON: " + out + err, e);
        }
    }
}
