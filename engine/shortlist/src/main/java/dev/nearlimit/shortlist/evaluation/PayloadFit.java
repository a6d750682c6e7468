package dev.nearlimit.shortlist.evaluation;

import dev.nearlimit.codes.Code;
import dev.nearlimit.codes.catalogue.Shortening;
import dev.nearlimit.shortlist.requirement.InvalidRequirementException;
import dev.nearlimit.shortlist.requirement.Payload;

/**
 * How a code carries a payload. A code with more information bits than the payload is shortened to fit exactly; one with
 * fewer is used in several whole codewords, whose unused bits are filler that is sent and charged. A payload fails when
 * any of its codewords fails.
 *
 * @param code the code as sent
 * @param codewords codewords a payload
 * @param payloadBits information bits of the payload
 * @param payloadFer target error rate of the payload
 */
public record PayloadFit(Code code, int codewords, int payloadBits, double payloadFer) {

    private static final long MOST_BITS_SENT = 100_000_000;

    /**
     * Fits a code to a payload.
     *
     * @throws InvalidRequirementException if a payload would take more bits than can reasonably be sent
     */
    public static PayloadFit of(Code mother, Payload payload) {
        int bits = payload.bits();
        if (mother.k() > bits) {
            return new PayloadFit(new Shortening(mother.k() - bits).applyTo(mother), 1, bits, payload.fer());
        }
        int codewords = (bits + mother.k() - 1) / mother.k();
        long sent = (long) codewords * mother.n();
        if (sent > MOST_BITS_SENT) {
            throw new InvalidRequirementException(
                    "payload.bits",
                    "a payload of " + bits + " bits takes " + sent + " bits sent with " + mother.designator()
                            + ", at most " + MOST_BITS_SENT);
        }
        return new PayloadFit(mother, codewords, bits, payload.fer());
    }

    /** Bits sent for a payload, which are also its channel uses per real dimension. */
    public int bitsSent() {
        return Math.multiplyExact(codewords, code.n());
    }

    /** Payload bits over bits sent. */
    public double rate() {
        return (double) payloadBits / bitsSent();
    }

    /** FER that a codeword may have: 1 - (1 - F)^(1/codewords), without cancellation for small F. */
    public double codewordFerTarget() {
        return -Math.expm1(Math.log1p(-payloadFer) / codewords);
    }

    /** What filler costs [dB]: Eb/N0 of the payload minus Eb/N0 of the code. */
    public double fillerDb() {
        return 10 * Math.log10((double) codewords * code.k() / payloadBits);
    }
}
