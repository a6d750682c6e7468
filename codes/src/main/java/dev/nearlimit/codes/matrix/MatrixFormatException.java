package dev.nearlimit.codes.matrix;

import dev.nearlimit.codes.InvalidCodeException;

/**
 * A matrix file that cannot be read, with the place at which it went wrong. The message is one line:
 * {@code file:line:column: found .., expected ..}.
 */
public final class MatrixFormatException extends InvalidCodeException {
    private static final long serialVersionUID = 1L;
    private static final int MAX_QUOTED = 24;

    private final String file;
    private final int line;
    private final int column;
    private final String found;
    private final String expected;

    /**
     * @param file the file as the user named it
     * @param line line, counted from 1; 0 where the whole file is meant
     * @param column character in the line, counted from 1; 0 where the whole line is meant
     */
    public MatrixFormatException(String file, int line, int column, String found, String expected) {
        super(file + (line > 0 ? ":" + line : "") + (line > 0 && column > 0 ? ":" + column : "") + ": found " + found
                + ", expected " + expected);
        this.file = file;
        this.line = line;
        this.column = column;
        this.found = found;
        this.expected = expected;
    }

    public String file() {
        return file;
    }

    /** Line, counted from 1; 0 where the whole file is meant. */
    public int line() {
        return line;
    }

    /** Character in the line, counted from 1; 0 where the whole line is meant. */
    public int column() {
        return column;
    }

    public String found() {
        return found;
    }

    public String expected() {
        return expected;
    }

    /** Text from a file in quotes, cut to a readable length, with anything unprintable escaped. */
    static String quoted(String text) {
        StringBuilder shown = new StringBuilder("'");
        for (int i = 0; i < Math.min(text.length(), MAX_QUOTED); i++) {
            char c = text.charAt(i);
            if (c >= ' ' && c <= '~') {
                shown.append(c);
            } else {
                shown.append(String.format("\\x%02X", (int) c));
            }
        }
        return shown.append(text.length() > MAX_QUOTED ? "..'" : "'").toString();
    }
}
