package dev.nearlimit.algebra.errorrate;

import java.math.BigInteger;

/**
 * A set of error patterns of n bits, known by how many there are of each weight, and its probability on a binary
 * symmetric channel: sum of N_e p^e (1-p)^(n-e). All terms are positive, so nothing cancels.
 */
final class ErrorPatterns {
    private final double[] logCount;

    /** @param counts N_0 .. N_n, none negative */
    ErrorPatterns(BigInteger[] counts) {
        this.logCount = new double[counts.length];
        for (int e = 0; e < counts.length; e++) {
            logCount[e] = Logarithms.of(counts[e]);
        }
    }

    /** @param logP ln of the crossover probability, which is at most 1/2 */
    double logProbability(double logP) {
        if (logP == Double.NEGATIVE_INFINITY) {
            return logCount[0];
        }
        int n = logCount.length - 1;
        double logQ = Logarithms.ofComplement(logP);
        LogSum sum = new LogSum();
        for (int e = 0; e <= n; e++) {
            sum.add(logCount[e] + e * logP + (n - e) * logQ);
        }
        // rounding may lift the probability of nearly all patterns above 1 by an ulp or so
        return Math.min(0, sum.value());
    }
}
