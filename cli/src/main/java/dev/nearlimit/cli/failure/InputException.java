package dev.nearlimit.cli.failure;

/** Something a user typed or put into a file cannot be used; the message is one line saying what was expected. */
public class InputException extends RuntimeException {
    private static final long serialVersionUID = 1L;

    private final String file;
    private final int line;
    private final int column;

    public InputException(String message) {
        this(message, null, 0, 0);
    }

    /**
     * Wrong input at a place in a file.
     *
     * @param file path as the user gave it; null where there is none
     * @param line from 1; 0 where unknown
     * @param column from 1; 0 where unknown
     */
    public InputException(String message, String file, int line, int column) {
        super(message);
        this.file = file;
        this.line = line;
        this.column = column;
    }

    public String file() {
        return file;
    }

    public int line() {
        return line;
    }

    public int column() {
        return column;
    }
}
