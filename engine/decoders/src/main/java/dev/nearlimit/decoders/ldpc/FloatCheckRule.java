package dev.nearlimit.decoders.ldpc;

/** A check rule in single precision, over many lanes at once. Working memory is its own; results depend on input alone. */
interface FloatCheckRule {
    /**
     * Computes the messages of {@code lanes} rows of the same degree.
     *
     * @param incoming what the checks read: lane f of edge i at {@code [i][f]}
     * @param message receives the outgoing messages: lane f of edge i at {@code [first + i][f]}
     */
    void apply(float[][] incoming, int degree, int lanes, float[][] message, int first);
}
