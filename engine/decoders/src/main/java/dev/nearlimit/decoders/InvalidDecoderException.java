package dev.nearlimit.decoders;

/** A decoder that a user asked for does not exist, has impossible settings or does not fit the code; one clear line. */
public class InvalidDecoderException extends RuntimeException {
    private static final long serialVersionUID = 1L;

    public InvalidDecoderException(String message) {
        super(message);
    }
}
