package dev.nearlimit.limits;

/**
 * One limit: how much energy a bit needs at least, and what that means a symbol.
 *
 * @param name stable name: {@code shannon}, {@code modulation}, {@code hardDecision}, {@code uncoded},
 *     {@code normalApproximation}, {@code quantised}, {@code quantisedBestStep}
 * @param definition what is limited, and by what
 * @param method how the figure was obtained, beginning with {@code exact} or {@code estimated}
 * @param ebn0Db energy per information bit over N0, in dB
 * @param esn0Db energy per symbol over N0, in dB: Eb/N0 times information bits a symbol
 * @param snrDb signal power over noise power within the real dimensions that the symbol uses, noise variance N0/2 each,
 *     in dB: 2 Es/N0 for one dimension, Es/N0 for two
 * @param efficiencyBitsPerRealDimension information bits per real dimension
 * @param efficiencyBitsPerSymbol information bits per symbol
 */
public record Limit(
        String name,
        String definition,
        String method,
        double ebn0Db,
        double esn0Db,
        double snrDb,
        double efficiencyBitsPerRealDimension,
        double efficiencyBitsPerSymbol) {

    /** The limit at {@code ebn0Db} for {@code rate} information bits per real dimension of a modulation. */
    static Limit of(String name, String definition, String method, double ebn0Db, double rate, Modulation modulation) {
        double bitsPerSymbol = rate * modulation.realDimensions();
        return new Limit(
                name,
                definition,
                method,
                ebn0Db,
                ebn0Db + Decibels.fromLinear(bitsPerSymbol),
                ebn0Db + Decibels.fromLinear(2 * rate),
                rate,
                bitsPerSymbol);
    }
}
