package dev.nearlimit.cli.command;

import dev.nearlimit.algebra.errorrate.ErrorRate;
import dev.nearlimit.algebra.errorrate.UnionBound;
import dev.nearlimit.cli.input.Ebn0List;
import java.util.List;

/**
 * Union bounds at one Eb/N0: what soft maximum-likelihood decoding does not exceed. Other decoders may.
 *
 * @param fer frame error rate
 * @param ber information-bit error rate
 */
record MaximumLikelihoodBound(double ebn0Db, ErrorRate fer, ErrorRate ber) {
    private static final double MICRO = 1e6;

    static List<MaximumLikelihoodBound> at(Ebn0List ebn0, UnionBound bound) {
        return ebn0.microDb().stream()
                .map(microDb -> at(microDb / MICRO, bound))
                .toList();
    }

    private static MaximumLikelihoodBound at(double ebn0Db, UnionBound bound) {
        return new MaximumLikelihoodBound(ebn0Db, bound.frameErrorRate(ebn0Db), bound.bitErrorRate(ebn0Db));
    }
}
