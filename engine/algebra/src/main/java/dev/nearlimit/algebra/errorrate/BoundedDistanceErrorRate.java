package dev.nearlimit.algebra.errorrate;

/**
 * Frame error rate of hard-decision bounded-distance decoding: the probability that more than t of the n bits are wrong.
 *
 * <p>It holds for a decoder that delivers the sent word exactly when at most t errors occurred anywhere in the n
 * positions, and otherwise delivers another word or declares a failure. With a systematic encoder another codeword has
 * other information bits, so both are frame errors; a decoder that passes the received bits on after a declared failure
 * still made a frame error, since a declared failure counts as one. For a code extended by an overall parity bit whose
 * decoder uses that bit to detect errors only, n counts the parity bit and t is (d-2)/2; a decoder that also gets the
 * word right when t errors and a wrong parity bit come together does slightly better than this.
 *
 * <p>Exact (common practice; S. B. Wicker, Error Control Systems, 1995, ch. 10), relative error below 1e-12 also in the
 * far tail.
 *
 * @param n length
 * @param k dimension, 1 .. n; fixes the energy a bit, not the formula
 * @param t errors corrected, 0 .. n-1
 */
public record BoundedDistanceErrorRate(int n, int k, int t) {
    private static final String METHOD = "probability of more than t errors in n bits";

    public BoundedDistanceErrorRate {
        Checks.block(n, k);
        if (t < 0 || t >= n) {
            throw new IllegalArgumentException("t is " + t + ", must be 0 .. n-1 = " + (n - 1));
        }
    }

    /**
     * FER on a binary symmetric channel.
     *
     * @param p crossover probability, 0 .. 1/2
     * @throws InvalidErrorRateException if it is outside
     */
    public ErrorRate frameErrorRateAtCrossover(double p) {
        return exact(BinomialTail.logMoreThan(t, n, Math.log(Checks.crossover(p))));
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
        return BinomialTail.logMoreThan(t, n, HardDecision.logCrossover((double) k / n, ebn0Db));
    }

    private static ErrorRate exact(double naturalLog) {
        return new ErrorRate(naturalLog, Basis.EXACT, METHOD);
    }
}
