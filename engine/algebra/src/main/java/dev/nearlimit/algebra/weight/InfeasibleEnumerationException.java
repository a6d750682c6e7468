package dev.nearlimit.algebra.weight;

/**
 * An enumeration would not end in reasonable time or memory and was not started. The message is one line meant for the
 * user: the sizes that were asked for and those that are feasible.
 */
public class InfeasibleEnumerationException extends RuntimeException {
    private static final long serialVersionUID = 1L;

    public InfeasibleEnumerationException(String message) {
        super(message);
    }
}
