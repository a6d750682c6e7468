package dev.nearlimit.decoders.ml;

import dev.nearlimit.codes.Code;
import dev.nearlimit.decoders.Decoder;
import dev.nearlimit.decoders.DecoderSettings;
import dev.nearlimit.decoders.InvalidDecoderException;
import dev.nearlimit.decoders.OperationCount;
import dev.nearlimit.decoders.Quantiser;
import java.util.Optional;

/**
 * Soft-decision maximum-likelihood decoding by correlation with all 2^k codewords, in the order that
 * {@link MaximumLikelihoodDecoder} states. It never declares a failure.
 */
public record MaximumLikelihoodSettings() implements DecoderSettings {
    static final String NAME = "maximum-likelihood";

    /** Most information bits: 65536 codewords a frame. */
    public static final int MOST_INFORMATION_BITS = 16;

    /** Longest code: what a decoder keeps of the LLRs' sums then takes 16 MB. */
    private static final int MOST_POSITIONS = 1 << 14;

    static Optional<String> objection(Code code) {
        if (code.k() > MOST_INFORMATION_BITS) {
            return Optional.of(
                    "it has 2^" + code.k() + " codewords to look at; k may be at most " + MOST_INFORMATION_BITS);
        }
        if (code.n() > MOST_POSITIONS) {
            return Optional.of("it has " + code.n() + " positions, at most " + MOST_POSITIONS + " are possible");
        }
        return Optional.empty();
    }

    @Override
    public String family() {
        return NAME;
    }

    @Override
    public String designator() {
        return NAME;
    }

    @Override
    public int revision() {
        return 1;
    }

    @Override
    public boolean hardDecision() {
        return false;
    }

    @Override
    public Decoder newDecoder(Code code, Quantiser quantiser) {
        objection(code).ifPresent(reason -> {
            throw new InvalidDecoderException(NAME + " does not fit " + code.designator() + ": " + reason);
        });
        return new MaximumLikelihoodDecoder(code.generator());
    }

    /**
     * Each group of 4 positions takes 16 tabulated sums (11 additions that are not trivial), each codeword one addition
     * a group and one comparison. Decoding one frame at a time takes as many.
     */
    @Override
    public OperationCount operationsPerFrame(Code code, double iterations) {
        double groups = Math.ceil(code.n() / (double) MaximumLikelihoodDecoder.GROUP);
        double words = 1 << code.k();
        return new OperationCount(groups * 11 + groups * words, words, 0);
    }

    @Override
    public int maxIterations() {
        return 0;
    }
}
