package dev.nearlimit.algebra.errorrate;

import dev.nearlimit.codes.Code;
import dev.nearlimit.codes.gf2.BitMatrix;

/**
 * Hard-decision decoding of a short code by trying everything: for each of the 2^n error patterns added to the zero word,
 * the nearest codeword found by comparing with all of them.
 */
final class HardDecisionByEnumeration {
    private final int n;
    private final int[] codewords;

    HardDecisionByEnumeration(Code code) {
        this.n = code.n();
        this.codewords = new int[1 << code.k()];
        BitMatrix G = code.generator();
        for (int message = 0; message < codewords.length; message++) {
            for (int r = 0; r < code.k(); r++) {
                if ((message >>> r & 1) != 0) {
                    codewords[message] ^= (int) G.word(r, 0);
                }
            }
        }
    }

    /** What a decoder that corrects t errors makes of all patterns at crossover p: [wrong or failed, wrong]. */
    double[] boundedDistance(int t, double p) {
        double wrongOrFailed = 0;
        double wrong = 0;
        for (int pattern = 0; pattern < 1 << n; pattern++) {
            int decided = -1;
            for (int codeword : codewords) {
                if (Integer.bitCount(pattern ^ codeword) <= t) {
                    decided = codeword;
                }
            }
            double probability = probability(pattern, p);
            wrongOrFailed += decided == 0 ? 0 : probability;
            wrong += decided > 0 ? probability : 0;
        }
        return new double[] {wrongOrFailed, wrong};
    }

    /** Error rate of the decoder that takes the nearest codeword, and of several the one whose pattern is least. */
    double complete(double p) {
        double wrong = 0;
        for (int pattern = 0; pattern < 1 << n; pattern++) {
            if (leader(pattern) != pattern) {
                wrong += probability(pattern, p);
            }
        }
        return wrong;
    }

    /** Number of patterns of each weight that are their coset's leader. */
    long[] leadersByWeight() {
        long[] leaders = new long[n + 1];
        for (int pattern = 0; pattern < 1 << n; pattern++) {
            if (leader(pattern) == pattern) {
                leaders[Integer.bitCount(pattern)]++;
            }
        }
        return leaders;
    }

    private int leader(int pattern) {
        int best = pattern;
        for (int codeword : codewords) {
            int other = pattern ^ codeword;
            int difference = Integer.bitCount(other) - Integer.bitCount(best);
            if (difference < 0 || (difference == 0 && other < best)) {
                best = other;
            }
        }
        return best;
    }

    private double probability(int pattern, double p) {
        int errors = Integer.bitCount(pattern);
        return Math.pow(p, errors) * Math.pow(1 - p, n - errors);
    }
}
