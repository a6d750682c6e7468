package dev.nearlimit.decoders.ldpc;

import dev.nearlimit.decoders.InvalidDecoderException;

/**
 * Word lengths of a fixed-point decoder. Words are symmetric: b bits hold -(2^(b-1)-1) .. 2^(b-1)-1, and a value beyond
 * is set to the nearer end.
 *
 * @param message bits of the messages between checks and bits, 2 .. 8
 * @param posterior bits of a bit's running sum, {@code message} .. 15
 */
public record WordLengths(int message, int posterior) {
    static final int LARGEST_MESSAGE = 8;
    static final int LARGEST_POSTERIOR = 15;

    public WordLengths {
        if (message < 2 || message > LARGEST_MESSAGE) {
            throw new InvalidDecoderException("message-word is " + message + " bits, must be 2.." + LARGEST_MESSAGE);
        }
        if (posterior < message || posterior > LARGEST_POSTERIOR) {
            throw new InvalidDecoderException("posterior-word is " + posterior + " bits, must be " + message + ".."
                    + LARGEST_POSTERIOR + ": at least message-word");
        }
    }

    int largestMessage() {
        return (1 << (message - 1)) - 1;
    }

    int largestPosterior() {
        return (1 << (posterior - 1)) - 1;
    }
}
