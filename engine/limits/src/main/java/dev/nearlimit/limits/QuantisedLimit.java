package dev.nearlimit.limits;

import java.util.Locale;

/**
 * The limit of a link whose decoder sees LLRs through a uniform quantiser, and what that costs.
 *
 * @param quantiser the quantiser
 * @param limit the least Eb/N0 behind it, named {@value #NAME} or {@value #BEST_NAME}
 * @param lossDb that limit less the one of unquantised LLRs, in dB
 */
public record QuantisedLimit(UniformLlrQuantiser quantiser, Limit limit, double lossDb) {
    /** The limit of a step that was asked for, or of a quantiser that has none. */
    public static final String NAME = "quantised";
    /** The limit of the best step. */
    public static final String BEST_NAME = "quantisedBestStep";

    /**
     * The limit of a quantiser.
     *
     * @param rate information bits per real dimension, in (0, 1)
     */
    public static QuantisedLimit of(double rate, Modulation modulation, UniformLlrQuantiser quantiser) {
        return named(NAME, rate, modulation, quantiser);
    }

    /**
     * The limit at the step that costs least.
     *
     * @param rate information bits per real dimension, in (0, 1)
     * @param wordBits 2 .. 8 for mid-tread, 2 .. 7 for mid-rise
     */
    public static QuantisedLimit ofBestStep(double rate, Modulation modulation, int wordBits, QuantiserRise rise) {
        return named(BEST_NAME, rate, modulation, BestQuantiserStep.at(rate, wordBits, rise));
    }

    private static QuantisedLimit named(
            String name, double rate, Modulation modulation, UniformLlrQuantiser quantiser) {
        QuantisedBinaryAwgn channel = new QuantisedBinaryAwgn(quantiser);
        String step = quantiser.hasStep() ? String.format(Locale.ROOT, " of step %.4f", quantiser.step()) : "";
        Limit limit = Limit.of(
                name,
                "least Eb/N0 of any code at this rate with " + modulation.designator() + " behind a "
                        + quantiser.wordBits() + "-bit " + quantiser.rise().designator() + " quantiser of LLRs" + step
                        + (name.equals(BEST_NAME) ? ", the best" : "") + ", AWGN, unlimited length",
                "exact: capacity from the probabilities of the quantiser's cells, Gaussian tails",
                channel.leastEbn0Db(rate),
                rate,
                modulation);
        return new QuantisedLimit(quantiser, limit, channel.lossDb(rate));
    }
}
