package dev.nearlimit.decoders.ldpc;

import dev.nearlimit.codes.Code;
import dev.nearlimit.codes.batch.FrameBatch;
import java.util.Optional;

/** Whether the messages of 64 frames of a code fit into one array. */
final class MessageMemory {
    private static final int MOST_EDGES = Integer.MAX_VALUE / FrameBatch.FRAMES;

    private MessageMemory() {}

    static Optional<String> objection(Code code) {
        int edges = Math.max(code.parityCheck().ones(), code.n());
        return edges <= MOST_EDGES
                ? Optional.empty()
                : Optional.of("its parity-check matrix has "
                        + code.parityCheck().ones() + " ones, belief propagation takes at most " + MOST_EDGES);
    }
}
