package dev.nearlimit.shortlist;

import dev.nearlimit.limits.Modulation;
import dev.nearlimit.shortlist.evaluation.PayloadFit;
import dev.nearlimit.shortlist.requirement.Link;

/**
 * A contender carried by a modulation over the link: symbols, bandwidth and time.
 *
 * @param modulation what carries it
 * @param symbolsPerPayload symbols a payload, its codewords packed one after the other; an axis left over in the last
 *     symbol stays empty and takes bandwidth but no energy
 * @param symbolRateBaud symbols a second that carry the link's bit rate
 * @param occupiedBandwidthHz symbol rate times (1 + roll-off)
 * @param airS time from the payload's first symbol to its last [s]
 */
record Carriage(
        Modulation modulation, long symbolsPerPayload, double symbolRateBaud, double occupiedBandwidthHz, double airS) {

    static Carriage of(PayloadFit fit, Modulation modulation, Link link) {
        long symbols = modulation.symbolsFor(fit.bitsSent());
        double symbolRate = link.bitRateBps() * symbols / fit.payloadBits();
        return new Carriage(modulation, symbols, symbolRate, symbolRate * (1 + link.rollOff()), symbols / symbolRate);
    }
}
