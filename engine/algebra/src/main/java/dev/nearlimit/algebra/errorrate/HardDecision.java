package dev.nearlimit.algebra.errorrate;

import dev.nearlimit.limits.Decibels;
import dev.nearlimit.limits.GaussianTail;

/** Hard decisions of BPSK or QPSK on AWGN: the binary symmetric channel with p = Q(sqrt(2 R Eb/N0)). */
final class HardDecision {
    private HardDecision() {}

    /** ln p. */
    static double logCrossover(double rate, double ebn0Db) {
        return GaussianTail.logQ(Math.sqrt(2 * rate * Decibels.toLinear(Checks.ebn0Db(ebn0Db))));
    }
}
