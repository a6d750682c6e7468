package dev.nearlimit.codes.structure;

/**
 * A lower bound on the minimum distance that needs no search: what a bounded-distance decoder may rely on where the
 * distance itself is not known, as in a shortened code, which keeps at least its mother's.
 *
 * @param value any two codewords differ in at least this many positions; at least 1
 */
public record GuaranteedDistance(int value) implements Structure {
    public GuaranteedDistance {
        if (value < 1) {
            throw new IllegalArgumentException("guaranteed distance is " + value + ", must be at least 1");
        }
    }
}
