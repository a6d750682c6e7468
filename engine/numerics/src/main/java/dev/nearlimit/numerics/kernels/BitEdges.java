package dev.nearlimit.numerics.kernels;

/**
 * Which messages a bit's sum is made of.
 *
 * @param first the messages to bit b are number {@code first[b]} .. {@code first[b + 1] - 1} of the next array
 * @param messages where the 64 lanes of a message begin, in the order in which a bit adds them
 */
public record BitEdges(int[] first, int[] messages) {
    /** Bits, with or without messages. */
    public int bits() {
        return first.length - 1;
    }
}
