package dev.nearlimit.algebra.errorrate;

import java.math.BigInteger;

/**
 * Frame error rate of complete syndrome decoding: the decoder subtracts the leader of the received word's coset, and is
 * right exactly when the error pattern is that leader. With alpha_w cosets whose leader has weight w, the FER is one
 * minus the sum of alpha_w p^w (1-p)^(n-w) (Slepian, Bell System Technical Journal 35 (1956); MacWilliams and Sloane 1977,
 * ch. 1, theorem 5). It is computed from the complementary counts C(n, w) - alpha_w, so that nothing cancels: relative
 * error below 1e-11 also in the far tail.
 *
 * <p>How ties between several words of least weight in a coset are broken does not matter to the FER.
 */
public final class CosetLeaderErrorRate {
    private static final String METHOD = "one minus the probability that the error pattern is a coset leader";

    private final double rate;
    private final ErrorPatterns wrong;

    private CosetLeaderErrorRate(double rate, ErrorPatterns wrong) {
        this.rate = rate;
        this.wrong = wrong;
    }

    /**
     * The FER of an (n, k) code.
     *
     * @param leadersByWeight alpha_0, alpha_1, ..: number of cosets whose leader has that weight; may end at the largest
     *     weight that occurs
     * @throws IllegalArgumentException if alpha_0 is not 1, a count is outside 0 .. C(n, w), or the total is not 2^(n-k)
     */
    public static CosetLeaderErrorRate of(int n, int k, long... leadersByWeight) {
        Checks.block(n, k);
        if (leadersByWeight.length == 0 || leadersByWeight.length > n + 1 || leadersByWeight[0] != 1) {
            throw new IllegalArgumentException("there are " + leadersByWeight.length
                    + " counts of coset leaders, must be 1 .. n+1 = " + (n + 1) + " of which the first is 1");
        }
        BigInteger[] wrong = new BigInteger[n + 1];
        BigInteger cosets = BigInteger.ZERO;
        BigInteger patterns = BigInteger.ONE;
        for (int w = 0; w <= n; w++) {
            BigInteger leaders = BigInteger.valueOf(w < leadersByWeight.length ? leadersByWeight[w] : 0);
            wrong[w] = patterns.subtract(leaders);
            if (leaders.signum() < 0 || wrong[w].signum() < 0) {
                throw new IllegalArgumentException(
                        "there are " + leaders + " coset leaders of weight " + w + ", must be 0 .. " + patterns);
            }
            cosets = cosets.add(leaders);
            patterns = patterns.multiply(BigInteger.valueOf(n - w)).divide(BigInteger.valueOf(w + 1L));
        }
        if (!cosets.equals(BigInteger.ONE.shiftLeft(n - k))) {
            throw new IllegalArgumentException(
                    "there are " + cosets + " coset leaders, a (" + n + "," + k + ") code has 2^" + (n - k));
        }
        return new CosetLeaderErrorRate((double) k / n, new ErrorPatterns(wrong));
    }

    /**
     * FER on a binary symmetric channel.
     *
     * @param p crossover probability, 0 .. 1/2
     * @throws InvalidErrorRateException if it is outside
     */
    public ErrorRate frameErrorRateAtCrossover(double p) {
        return exact(wrong.logProbability(Math.log(Checks.crossover(p))));
    }

    /**
     * FER with hard decisions of BPSK or QPSK on AWGN, where p = Q(sqrt(2 (k/n) Eb/N0)).
     *
     * @param ebn0Db Eb/N0 in dB, -200 .. 200
     * @throws InvalidErrorRateException if it is outside
     */
    public ErrorRate frameErrorRate(double ebn0Db) {
        return exact(logFrameErrorRate(ebn0Db));
    }

    /**
     * The least Eb/N0 in dB at which the FER is at most a target, to 1e-9 dB.
     *
     * @param fer target, in (0, 1)
     * @throws InvalidErrorRateException if it is outside, or met without any signal
     */
    public double leastEbn0Db(double fer) {
        return LeastEbn0.of(this::logFrameErrorRate, fer);
    }

    private double logFrameErrorRate(double ebn0Db) {
        return wrong.logProbability(HardDecision.logCrossover(rate, ebn0Db));
    }

    private static ErrorRate exact(double naturalLog) {
        return new ErrorRate(naturalLog, Basis.EXACT, METHOD);
    }
}
