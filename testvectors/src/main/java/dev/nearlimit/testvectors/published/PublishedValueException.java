package dev.nearlimit.testvectors.published;

/** A file of published values is malformed; the message is one line with file and line. */
public class PublishedValueException extends RuntimeException {
    private static final long serialVersionUID = 1L;

    public PublishedValueException(String message) {
        super(message);
    }

    public PublishedValueException(String message, Throwable cause) {
        super(message, cause);
    }
}
