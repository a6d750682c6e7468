package dev.nearlimit.simulation;

/** A simulation that a user asked for cannot be run as stated; the message is one line meant for the user. */
public class InvalidSimulationException extends RuntimeException {
    private static final long serialVersionUID = 1L;

    public InvalidSimulationException(String message) {
        super(message);
    }
}
