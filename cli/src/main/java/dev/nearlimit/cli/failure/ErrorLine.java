package dev.nearlimit.cli.failure;

import com.fasterxml.jackson.databind.node.JsonNodeFactory;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.io.PrintWriter;
import java.util.Arrays;
import java.util.Locale;

/**
 * Prints a failure as the user asked for it. The wish is read from the raw arguments, because it must be honoured
 * where they could not be parsed, too.
 */
public final class ErrorLine {
    private final boolean json;
    private final boolean debug;

    private ErrorLine(boolean json, boolean debug) {
        this.json = json;
        this.debug = debug;
    }

    /** The style that these arguments ask for: {@code --format json}, {@code --debug}. */
    public static ErrorLine of(String... args) {
        boolean json = false;
        for (int i = 0; i < args.length; i++) {
            String arg = args[i].toLowerCase(Locale.ROOT);
            json |= arg.equals("--format=json")
                    || (arg.equals("--format") && i + 1 < args.length && args[i + 1].equalsIgnoreCase("json"));
        }
        return new ErrorLine(json, Arrays.asList(args).contains("--debug"));
    }

    /**
     * Prints one line, and the stack trace where it was asked for.
     *
     * @param cause may be null
     */
    public void print(Failure failure, Throwable cause, PrintWriter err) {
        if (debug && cause != null) {
            cause.printStackTrace(err);
        }
        err.println(json ? asJson(failure) : "nearlimit: " + onOneLine(failure.located()));
        err.flush();
    }

    private static String asJson(Failure failure) {
        ObjectNode root = JsonNodeFactory.instance.objectNode();
        ObjectNode error = root.putObject("error");
        error.put("message", failure.message());
        error.put("file", failure.file());
        error.put("line", failure.line() > 0 ? failure.line() : null);
        error.put("column", failure.column() > 0 ? failure.column() : null);
        return root.toString();
    }

    /** Control characters spelled out: quoted input must neither break the line nor command the terminal. */
    private static String onOneLine(String text) {
        StringBuilder line = new StringBuilder(text.length());
        for (char c : text.toCharArray()) {
            if (Character.isISOControl(c)) {
                line.append(String.format(Locale.ROOT, "\\u%04x", (int) c));
            } else {
                line.append(c);
            }
        }
        return line.toString();
    }
}
