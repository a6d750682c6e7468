package dev.nearlimit.numerics.kernels;

/**
 * The bits' half of a flooding iteration, 64 frames side by side: every posterior becomes the channel's value plus the
 * messages to that bit, added in the order of {@link BitEdges}.
 */
public interface BitSumKernels {
    /**
     * In 8-bit lanes; sums are exact, then limited.
     *
     * @param limit largest posterior, 1 .. 127
     * @param channel of all bits; no sum may leave 16 bits
     * @param posterior of all bits; all are replaced
     */
    void sum(BitEdges edges, int limit, byte[] channel, byte[] message, byte[] posterior);

    /** The same in 16-bit lanes, with a limit up to 2^14 - 1. */
    void sum(BitEdges edges, int limit, short[] channel, short[] message, short[] posterior);

    /** The same in single precision, without a limit. */
    void sum(BitEdges edges, float[] channel, float[] message, float[] posterior);
}
