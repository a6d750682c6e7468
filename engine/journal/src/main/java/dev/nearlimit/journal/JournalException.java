package dev.nearlimit.journal;

/** A journal that cannot be opened, read or written; the message is one line and does not repeat the file. */
public final class JournalException extends RuntimeException {
    private static final long serialVersionUID = 1L;

    private final String file;

    JournalException(String file, String message, Throwable cause) {
        super(message, cause);
        this.file = file;
    }

    JournalException(String file, String message) {
        this(file, message, null);
    }

    /** The journal's file, as it was named when the journal was opened. */
    public String file() {
        return file;
    }
}
