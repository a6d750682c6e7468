package dev.nearlimit.simulation;

import dev.nearlimit.codes.Code;
import dev.nearlimit.codes.gf2.BitMatrix;
import dev.nearlimit.decoders.Decoder;
import dev.nearlimit.decoders.DecoderSettings;
import dev.nearlimit.decoders.OperationCount;
import dev.nearlimit.decoders.Quantiser;
import dev.nearlimit.limits.Modulation;

/**
 * Decides each bit by the sign of its LLR: the receiver of uncoded transmission. So that counts of everything can be
 * tested it declares failure where the last bit is 1, and claims as many iterations as the first bits say, if asked to.
 */
record Uncoded(boolean talkative) implements DecoderSettings {

    static Scheme scheme(int bits, String channel, boolean talkative) {
        Code code = Code.ofGenerator("uncoded", "no code at all", BitMatrix.identity(bits));
        return new Scheme(code, new Uncoded(talkative), Modulation.BPSK, new Unquantised(), Channel.of(channel));
    }

    @Override
    public String family() {
        return "uncoded";
    }

    @Override
    public String designator() {
        return "uncoded:talkative=" + talkative;
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
        return (received, decoded) -> {
            received.hardDecisions(decoded.bits());
            decoded.setDeclaredFailures(talkative ? decoded.bits()[code.n() - 1] : 0);
            for (int f = 0; f < 64; f++) {
                int first = (int) (decoded.bits()[0] >>> f) & 1;
                int second = (int) (decoded.bits()[1] >>> f) & 1;
                decoded.iterations()[f] = talkative ? 3 + first + 2 * second : 0;
            }
        };
    }

    @Override
    public OperationCount operationsPerFrame(Code code, double iterations) {
        return new OperationCount(0, code.n(), 0);
    }

    @Override
    public int maxIterations() {
        return talkative ? 6 : 0;
    }

    /** Leaves values as they are. */
    record Unquantised() implements Quantiser {
        @Override
        public String designator() {
            return "none";
        }

        @Override
        public int wordBits() {
            return 0;
        }

        @Override
        public void apply(float[] values, int at, int count, byte[] levels, int levelsAt) {
            // Values pass as they are, and levels are not used.
        }
    }
}
