package dev.nearlimit.limits;

import java.util.Arrays;
import java.util.Locale;
import java.util.stream.Collectors;

/**
 * Modulations by their numbers of bits and real dimensions a symbol. Both carry one bit a real dimension, so that their
 * error rates and limits against Eb/N0 are the same; they differ in occupied bandwidth.
 */
public enum Modulation {
    /** One bit on one axis; the other axis of its symbol stays empty, but takes bandwidth all the same. */
    BPSK("bpsk", 1, 1),
    /** Two bits, Gray labelled, one an axis. */
    QPSK("qpsk", 2, 2);

    private final String designator;
    private final int bitsPerSymbol;
    private final int realDimensions;

    Modulation(String designator, int bitsPerSymbol, int realDimensions) {
        this.designator = designator;
        this.bitsPerSymbol = bitsPerSymbol;
        this.realDimensions = realDimensions;
    }

    /**
     * Finds a modulation by its designator.
     *
     * @throws InvalidLimitException if there is none
     */
    public static Modulation of(String designator) {
        String wanted = designator.trim().toLowerCase(Locale.ROOT);
        for (Modulation modulation : values()) {
            if (modulation.designator.equals(wanted)) {
                return modulation;
            }
        }
        throw new InvalidLimitException("unknown modulation '" + designator + "'; known are "
                + Arrays.stream(values()).map(Modulation::designator).collect(Collectors.joining(", ")));
    }

    public String designator() {
        return designator;
    }

    /** log2 M. */
    public int bitsPerSymbol() {
        return bitsPerSymbol;
    }

    /** Real dimensions that a symbol uses. */
    public int realDimensions() {
        return realDimensions;
    }

    /** Symbols needed for a number of bits; a last symbol that is not filled is sent with its unused axis empty. */
    public int symbolsFor(int bits) {
        return (bits + bitsPerSymbol - 1) / bitsPerSymbol;
    }
}
