package dev.nearlimit.codes;

/** A code that a user asked for does not exist or cannot be built; the message is one line meant for the user. */
public class InvalidCodeException extends RuntimeException {
    private static final long serialVersionUID = 1L;

    public InvalidCodeException(String message) {
        super(message);
    }

    public InvalidCodeException(String message, Throwable cause) {
        super(message, cause);
    }
}
