package dev.nearlimit.algebra.errorrate;

import dev.nearlimit.algebra.weight.WeightEnumerator;
import java.math.BigInteger;
import java.util.Arrays;

/**
 * Undetected frame error rate of hard-decision bounded-distance decoding: the probability that the received word lies
 * within distance t of a codeword other than the sent one. With t = 0 it is that of error detection alone.
 *
 * <p>Around a codeword of weight j, at distance s from it, there are C(j, s-r) C(n-j, r) words of weight j - s + 2r for
 * each r (S. B. Wicker, Error Control Systems, 1995, section 10.3; MacWilliams and Sloane 1977, ch. 1, section 5 for
 * t = 0). Counted by weight in exact integers; spheres must not overlap, so 2t is less than the minimum distance. Relative
 * error below 1e-11. The rate need not fall as Eb/N0 rises, so no inverse is offered.
 */
public final class UndetectedErrorRate {
    private static final String METHOD = "probability of a word within distance t of a wrong codeword";

    private final double rate;
    private final ErrorPatterns undetected;

    private UndetectedErrorRate(double rate, ErrorPatterns undetected) {
        this.rate = rate;
        this.undetected = undetected;
    }

    /**
     * The undetected error rate of a code whose decoder corrects up to t errors in n positions.
     *
     * @param weights the code's complete weight enumerator
     * @param t 0 .. (d-1)/2, d being the minimum distance
     * @throws IllegalArgumentException if t is outside
     */
    public static UndetectedErrorRate of(WeightEnumerator weights, int t) {
        if (t < 0 || 2 * t >= weights.minimumDistance()) {
            throw new IllegalArgumentException("t is " + t + ", must be 0 .. " + (weights.minimumDistance() - 1) / 2
                    + " with minimum distance " + weights.minimumDistance());
        }
        int n = weights.n();
        BigInteger[] patterns = new BigInteger[n + 1];
        Arrays.fill(patterns, BigInteger.ZERO);
        for (int j : weights.weights()) {
            if (j > 0) {
                addSpheres(patterns, weights.count(j), j, t);
            }
        }
        return new UndetectedErrorRate((double) weights.k() / n, new ErrorPatterns(patterns));
    }

    private static void addSpheres(BigInteger[] patterns, BigInteger codewords, int j, int t) {
        int n = patterns.length - 1;
        BigInteger[] inside = binomials(j, t);
        BigInteger[] outside = binomials(n - j, t);
        for (int cleared = 0; cleared <= t; cleared++) {
            BigInteger ways = codewords.multiply(inside[cleared]);
            for (int set = 0; set <= t - cleared && set <= n - j; set++) {
                int weight = j - cleared + set;
                patterns[weight] = patterns[weight].add(ways.multiply(outside[set]));
            }
        }
    }

    /** C(n, 0) .. C(n, most). */
    private static BigInteger[] binomials(int n, int most) {
        BigInteger[] binomial = new BigInteger[most + 1];
        binomial[0] = BigInteger.ONE;
        for (int i = 0; i < most; i++) {
            binomial[i + 1] = binomial[i].multiply(BigInteger.valueOf(n - i)).divide(BigInteger.valueOf(i + 1L));
        }
        return binomial;
    }

    /**
     * Undetected frame error rate on a binary symmetric channel.
     *
     * @param p crossover probability, 0 .. 1/2
     * @throws InvalidErrorRateException if it is outside
     */
    public ErrorRate undetectedErrorRateAtCrossover(double p) {
        return exact(undetected.logProbability(Math.log(Checks.crossover(p))));
    }

    /**
     * Undetected frame error rate with hard decisions of BPSK or QPSK on AWGN, where p = Q(sqrt(2 (k/n) Eb/N0)).
     *
     * @param ebn0Db Eb/N0 in dB, -200 .. 200
     * @throws InvalidErrorRateException if it is outside
     */
    public ErrorRate undetectedErrorRate(double ebn0Db) {
        return exact(undetected.logProbability(HardDecision.logCrossover(rate, ebn0Db)));
    }

    private static ErrorRate exact(double naturalLog) {
        return new ErrorRate(naturalLog, Basis.EXACT, METHOD);
    }
}
