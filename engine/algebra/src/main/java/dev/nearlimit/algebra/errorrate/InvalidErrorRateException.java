package dev.nearlimit.algebra.errorrate;

/** An error rate was asked for with values that make no sense; the message is one line meant for the user. */
public class InvalidErrorRateException extends RuntimeException {
    private static final long serialVersionUID = 1L;

    public InvalidErrorRateException(String message) {
        super(message);
    }
}
