package dev.nearlimit.decoders.catalogue;

import dev.nearlimit.codes.Code;
import dev.nearlimit.decoders.DecoderFamily;
import dev.nearlimit.decoders.InvalidDecoderException;
import dev.nearlimit.decoders.hard.BoundedDistanceFamily;
import dev.nearlimit.decoders.hard.SyndromeFamily;
import dev.nearlimit.decoders.ldpc.MinSumFamily;
import dev.nearlimit.decoders.ldpc.SumProductFamily;
import dev.nearlimit.decoders.ml.MaximumLikelihoodFamily;
import java.util.List;
import java.util.stream.Collectors;

/** The decoders that there are. Immutable. */
public final class DecoderCatalogue {
    private static final DecoderCatalogue STANDARD = new DecoderCatalogue(List.of(
            new SyndromeFamily(),
            new BoundedDistanceFamily(),
            new MaximumLikelihoodFamily(),
            new SumProductFamily(),
            new MinSumFamily()));

    private final List<DecoderFamily> families;

    private DecoderCatalogue(List<DecoderFamily> families) {
        this.families = families;
    }

    /** Every decoder of this project. */
    public static DecoderCatalogue standard() {
        return STANDARD;
    }

    /** All families, hard-decision decoders first. */
    public List<DecoderFamily> families() {
        return families;
    }

    /** The families that can decode a code. */
    public List<DecoderFamily> fitting(Code code) {
        return families.stream().filter(family -> family.fits(code)).toList();
    }

    /**
     * The family of a name.
     *
     * @throws InvalidDecoderException if there is none; names those that there are
     */
    public DecoderFamily family(String name) {
        return families.stream()
                .filter(family -> family.name().equals(name))
                .findFirst()
                .orElseThrow(() -> new InvalidDecoderException("unknown decoder '" + name + "'; known are "
                        + families.stream().map(DecoderFamily::name).collect(Collectors.joining(", "))));
    }
}
