package dev.nearlimit.decoders;

import dev.nearlimit.codes.Code;

/**
 * A decoder's algorithm with all its settings, before it is bound to a code. Implementations are immutable records.
 */
public interface DecoderSettings {
    /** The decoder's name in designators, such as {@code min-sum}. */
    String family();

    /**
     * Name and settings as a designator with every default spelled out, so that it fixes the result to the bit:
     * {@code sum-product:iterations=50,schedule=layered,early-stop=true}. Quantiser settings ({@code word},
     * {@code step}) are not in it: they belong to {@link Quantiser}.
     */
    String designator();

    /** Raised whenever the decoder's results may change for the same input. */
    int revision();

    /** Whether the decoder looks at nothing but the signs of the LLRs. */
    boolean hardDecision();

    /** Whether the decoder looks at nothing but the quantiser's levels. */
    default boolean readsLevels() {
        return false;
    }

    /**
     * A decoder for one code.
     *
     * @param quantiser what stands before the decoder; a fixed-point decoder takes its channel word length from it
     * @throws InvalidDecoderException if the decoder does not fit the code or the quantiser; the message says why
     */
    Decoder newDecoder(Code code, Quantiser quantiser);

    /**
     * Operations that decoding one frame takes, by the counting rule in {@link OperationCount}.
     *
     * @param iterations iterations taken (an average may be fractional); ignored by decoders that do not iterate
     */
    OperationCount operationsPerFrame(Code code, double iterations);

    /** The most iterations that a frame can take; 0 for decoders that do not iterate. */
    int maxIterations();
}
