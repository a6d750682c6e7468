package dev.nearlimit.shortlist.requirement;

/**
 * What is sent at a time, and how often it may be lost.
 *
 * @param bits information bits of a payload, 1 .. 1000000
 * @param fer target payload error rate: any bit of the payload wrong, or a failure that the decoder declares;
 *     above 0 and below 0.5, since a coin tossed for every bit would do as well
 */
public record Payload(int bits, double fer) {
    public Payload {
        if (bits < 1 || bits > 1_000_000) {
            throw new InvalidRequirementException("payload.bits", "bits is " + bits + ", must be 1 .. 1000000");
        }
        if (!(fer > 0 && fer < 0.5)) {
            throw new InvalidRequirementException(
                    "payload.fer", "target FER is " + fer + ", must be above 0 and below 0.5");
        }
    }
}
