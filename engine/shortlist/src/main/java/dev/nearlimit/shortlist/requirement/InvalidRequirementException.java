package dev.nearlimit.shortlist.requirement;

/** A requirement that contradicts itself or cannot be read; the message is one line meant for the user. */
public class InvalidRequirementException extends RuntimeException {
    private static final long serialVersionUID = 1L;

    private final String field;

    /**
     * @param field the requirement's field that is wrong, such as {@code payload.fer}
     * @param message what was found and what was expected
     */
    public InvalidRequirementException(String field, String message) {
        super(message);
        this.field = field;
    }

    /** The field that is wrong, so that a reader can say on which line it stands. */
    public String field() {
        return field;
    }
}
