package dev.nearlimit.decoders.hard;

import dev.nearlimit.codes.Code;
import dev.nearlimit.codes.coset.CosetLeaders;
import dev.nearlimit.codes.structure.BchStructure;
import dev.nearlimit.decoders.Decoder;
import dev.nearlimit.decoders.DecoderSettings;
import dev.nearlimit.decoders.InvalidDecoderException;
import dev.nearlimit.decoders.OperationCount;
import dev.nearlimit.decoders.Quantiser;
import java.util.Optional;

/**
 * Hard-decision decoding within a guaranteed radius: when a codeword differs from the received word in at most t
 * positions it is found, and otherwise a failure is declared and the received word is handed on as it is. So a frame is
 * right exactly when at most t of its n bits were received wrong.
 *
 * <p>BCH codes take t from their structure and are decoded by Berlekamp-Massey; a code extended by a parity bit corrects
 * the same t in n. Other codes of known or guaranteed minimum distance d correct t = (d-1)/2, rounded down, by a table of coset
 * leaders; an even d leaves words at distance d/2 detected, since no codeword is within t of them.
 */
public record BoundedDistanceSettings() implements DecoderSettings {
    static final String NAME = "bounded-distance";

    static Optional<String> objection(Code code) {
        if (code.structure(BchStructure.class).isPresent()) {
            return Optional.empty();
        }
        if (code.guaranteedDistance() == 1 && code.knownDistance().isEmpty()) {
            return Optional.of("its minimum distance is not known without a search, and it is no BCH code");
        }
        return CosetLeaders.objection(code);
    }

    /**
     * The number t of errors that are always corrected.
     *
     * @throws InvalidDecoderException if the decoder does not fit the code
     */
    public static int errorsCorrected(Code code) {
        requireFit(code);
        return code.structure(BchStructure.class)
                .map(BchStructure::t)
                .orElseGet(() -> (code.guaranteedDistance() - 1) / 2);
    }

    private static void requireFit(Code code) {
        objection(code).ifPresent(reason -> {
            throw new InvalidDecoderException(NAME + " does not fit " + code.designator() + ": " + reason);
        });
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
        return true;
    }

    @Override
    public Decoder newDecoder(Code code, Quantiser quantiser) {
        int t = errorsCorrected(code);
        Optional<BchStructure> bch = code.structure(BchStructure.class);
        return bch.isPresent()
                ? new BchDecoder(bch.get(), code.parityCheck())
                : new CosetTableDecoder(CosetLeaders.of(code), t);
    }

    /**
     * By table as for {@link SyndromeSettings}. By Berlekamp-Massey: t syndromes (those of odd index; the others are
     * squares) of n additions and n look-ups by Horner's rule and t look-ups for the squares; t steps of at most 2t
     * additions and 2t look-ups; a Chien search of n times t additions and t look-ups, with n comparisons; at most t
     * additions to correct. This is the most that a frame takes; one received without errors needs the syndromes only.
     */
    @Override
    public OperationCount operationsPerFrame(Code code, double iterations) {
        Optional<BchStructure> bch = code.structure(BchStructure.class);
        if (bch.isEmpty()) {
            return new SyndromeSettings().operationsPerFrame(code, iterations);
        }
        double t = bch.get().t();
        double n = code.n();
        return new OperationCount(2 * n * t + 2 * t * t + t, n, 2 * n * t + 2 * t * t + t);
    }

    @Override
    public int maxIterations() {
        return 0;
    }
}
