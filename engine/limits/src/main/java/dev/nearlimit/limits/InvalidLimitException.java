package dev.nearlimit.limits;

/** A limit that a user asked for does not exist for these values; the message is one line meant for the user. */
public class InvalidLimitException extends RuntimeException {
    private static final long serialVersionUID = 1L;

    public InvalidLimitException(String message) {
        super(message);
    }
}
