package dev.nearlimit.decoders.hard;

import dev.nearlimit.codes.Code;
import dev.nearlimit.codes.coset.CosetLeaders;
import dev.nearlimit.decoders.Decoder;
import dev.nearlimit.decoders.DecoderSettings;
import dev.nearlimit.decoders.InvalidDecoderException;
import dev.nearlimit.decoders.OperationCount;
import dev.nearlimit.decoders.Quantiser;

/**
 * Complete hard-decision decoding to a nearest codeword by a table of coset leaders, which makes it maximum likelihood on
 * a BSC. Of several nearest codewords it takes the one that {@link CosetLeaders} states. It never declares a failure.
 */
public record SyndromeSettings() implements DecoderSettings {
    static final String NAME = "syndrome";

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
        CosetLeaders.objection(code).ifPresent(reason -> {
            throw new InvalidDecoderException(NAME + " does not fit " + code.designator() + ": " + reason);
        });
        return new SyndromeDecoder(CosetLeaders.of(code));
    }

    /**
     * The syndrome takes one addition a 1 of the parity-check matrix less one a row, the leader one look-up, and adding
     * it to the received word n additions.
     */
    @Override
    public OperationCount operationsPerFrame(Code code, double iterations) {
        return new OperationCount(
                (double) code.parityCheck().ones() - code.parityCheck().rows() + code.n(), 0, 1);
    }

    @Override
    public int maxIterations() {
        return 0;
    }
}
