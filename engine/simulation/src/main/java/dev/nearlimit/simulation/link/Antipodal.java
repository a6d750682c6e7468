package dev.nearlimit.simulation.link;

/** The signal of a bit: +1 for 0, -1 for 1. */
final class Antipodal {
    private static final int ONE = 0x3f800000;

    private Antipodal() {}

    /** The signal of one lane of a word of bits. */
    static float signal(long bits, int lane) {
        return Float.intBitsToFloat(ONE | ((int) (bits >>> lane) << 31));
    }
}
