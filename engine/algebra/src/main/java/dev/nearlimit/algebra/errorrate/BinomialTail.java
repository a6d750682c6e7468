package dev.nearlimit.algebra.errorrate;

/**
 * The probability that more than t of n independent bits are wrong, as a logarithm. The smaller of the two tails is
 * summed outwards from its largest term, so that no term cancels another: relative error about n 1e-16.
 */
final class BinomialTail {
    /** Further terms are below this share of the sum, and fall faster than the share of those already added. */
    private static final double NEGLIGIBLE = 1e-18;

    private BinomialTail() {}

    /**
     * ln P(more than t of n).
     *
     * @param t 0 .. n-1
     * @param logP ln of the probability that one bit is wrong, which is at most 1/2
     */
    static double logMoreThan(int t, int n, double logP) {
        if (logP == Double.NEGATIVE_INFINITY) {
            return Double.NEGATIVE_INFINITY;
        }
        double logQ = Logarithms.ofComplement(logP);
        double odds = Math.exp(logP - logQ);
        if (t + 1 > n * Math.exp(logP)) {
            return upper(t + 1, n, logP, logQ, odds);
        }
        double logAtMost = lower(t, n, logP, logQ, odds);
        return Math.log(-Math.expm1(logAtMost));
    }

    /** ln of the terms from {@code first}, which lies above the mean, to n. */
    private static double upper(int first, int n, double logP, double logQ, double odds) {
        double sum = 1;
        double term = 1;
        for (int i = first; i < n && term > NEGLIGIBLE * sum; i++) {
            term *= odds * (n - i) / (i + 1);
            sum += term;
        }
        return logTerm(first, n, logP, logQ) + Math.log(sum);
    }

    /** ln of the terms from {@code last}, which lies below the mean, down to 0. */
    private static double lower(int last, int n, double logP, double logQ, double odds) {
        double sum = 1;
        double term = 1;
        for (int i = last; i > 0 && term > NEGLIGIBLE * sum; i--) {
            term *= i / (odds * (n - i + 1));
            sum += term;
        }
        return logTerm(last, n, logP, logQ) + Math.log(sum);
    }

    private static double logTerm(int i, int n, double logP, double logQ) {
        double logBinomial = 0;
        for (int j = 0; j < Math.min(i, n - i); j++) {
            logBinomial += Math.log((double) (n - j) / (j + 1));
        }
        return logBinomial + i * logP + (n - i) * logQ;
    }
}
