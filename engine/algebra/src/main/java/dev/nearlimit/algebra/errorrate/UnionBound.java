package dev.nearlimit.algebra.errorrate;

import dev.nearlimit.algebra.weight.InformationWeightEnumerator;
import dev.nearlimit.algebra.weight.WeightEnumerator;
import dev.nearlimit.limits.Decibels;
import dev.nearlimit.limits.GaussianTail;
import java.math.BigInteger;
import java.util.Map;
import java.util.SortedMap;

/**
 * Union bounds on the error rates of soft maximum-likelihood decoding on AWGN with BPSK or QPSK. With A_w words of weight w
 * and R = k/n,
 *
 * <pre>
 *   FER <= sum over w of A_w Q(sqrt(2 R w Eb/N0))
 *   BER <= sum over w of (W_w / k) Q(sqrt(2 R w Eb/N0))
 * </pre>
 *
 * W_w being the total information weight of those words (common practice; Lin and Costello, Error Control Coding, 2nd ed.
 * 2004, section 10.1). They speak of maximum-likelihood decoding and of nothing else: a decoder that is not may do worse.
 * At low Eb/N0 the sums exceed 1 and say nothing.
 *
 * <p>The FER of a complete enumerator is a bound. A sum that leaves weights out is an estimate, and so is the BER where
 * W_w is approximated by k A_w w / n. Sums are formed of logarithms: relative error below 1e-11 at any Eb/N0.
 */
public final class UnionBound {
    private static final String METHOD = "union bound, soft maximum likelihood";

    private final double rate;
    private final int[] weights;
    /** ln A_w of each weight. */
    private final double[] logWords;
    /** ln (W_w / k) of each weight. */
    private final double[] logInformation;

    private final boolean complete;
    private final boolean exactInformation;

    private UnionBound(double rate, int terms, boolean complete, boolean exactInformation) {
        this.rate = rate;
        this.weights = new int[terms];
        this.logWords = new double[terms];
        this.logInformation = new double[terms];
        this.complete = complete;
        this.exactInformation = exactInformation;
    }

    private void setTerm(int i, int weight, BigInteger words, double informationFraction) {
        weights[i] = weight;
        logWords[i] = Logarithms.of(words);
        logInformation[i] = logWords[i] + Math.log(informationFraction);
    }

    /** The bounds from a complete enumerator; the BER is an estimate unless the information weights are exact. */
    public static UnionBound of(InformationWeightEnumerator enumerator) {
        return upTo(enumerator, enumerator.weights().n());
    }

    /** The bounds from a complete enumerator without information weights: the BER is an estimate. */
    public static UnionBound of(WeightEnumerator enumerator) {
        return of(InformationWeightEnumerator.proportional(enumerator));
    }

    /**
     * The sums over the words of weight up to {@code heaviest} only: estimates, unless no word is heavier.
     *
     * @throws IllegalArgumentException if {@code heaviest} leaves no word
     */
    public static UnionBound upTo(InformationWeightEnumerator enumerator, int heaviest) {
        WeightEnumerator all = enumerator.weights();
        if (heaviest < all.minimumDistance()) {
            throw new IllegalArgumentException(
                    "no word of weight 1 .. " + heaviest + ", the minimum distance is " + all.minimumDistance());
        }
        int[] occurring = all.weights();
        int terms = 0;
        while (terms + 1 < occurring.length && occurring[terms + 1] <= heaviest) {
            terms++;
        }
        UnionBound bound =
                new UnionBound((double) all.k() / all.n(), terms, terms == occurring.length - 1, enumerator.exact());
        for (int i = 0; i < terms; i++) {
            int weight = occurring[i + 1];
            bound.setTerm(i, weight, all.count(weight), enumerator.meanInformationFraction(weight));
        }
        return bound;
    }

    /**
     * The sums over a part of the spectrum, as a table or a search for words of low weight gives it: estimates.
     *
     * @param n length
     * @param k dimension
     * @param counts number of words by weight, weights 1 .. n, not empty
     */
    public static UnionBound ofPartialSpectrum(int n, int k, SortedMap<Integer, BigInteger> counts) {
        Checks.block(n, k);
        if (counts.isEmpty() || counts.firstKey() < 1 || counts.lastKey() > n) {
            throw new IllegalArgumentException(
                    "spectrum has weights " + counts.keySet() + ", must be some of 1 .. " + n);
        }
        UnionBound estimate = new UnionBound((double) k / n, counts.size(), false, false);
        int i = 0;
        for (Map.Entry<Integer, BigInteger> entry : counts.entrySet()) {
            int weight = entry.getKey();
            if (entry.getValue().signum() < 0) {
                throw new IllegalArgumentException(
                        "A_" + weight + " is " + entry.getValue() + ", must not be negative");
            }
            estimate.setTerm(i++, weight, entry.getValue(), (double) weight / n);
        }
        return estimate;
    }

    /**
     * Union bound on the FER, or its estimate from a part of the spectrum.
     *
     * @param ebn0Db Eb/N0 in dB, -200 .. 200
     * @throws InvalidErrorRateException if it is outside
     */
    public ErrorRate frameErrorRate(double ebn0Db) {
        return new ErrorRate(logFrameErrorRate(ebn0Db), complete ? Basis.BOUND : Basis.ESTIMATED, method());
    }

    /**
     * Union bound on the information bit error rate, or its estimate.
     *
     * @param ebn0Db Eb/N0 in dB, -200 .. 200
     * @throws InvalidErrorRateException if it is outside
     */
    public ErrorRate bitErrorRate(double ebn0Db) {
        String method = exactInformation ? method() : method() + ", information weight taken as k w/n";
        Basis basis = complete && exactInformation ? Basis.BOUND : Basis.ESTIMATED;
        return new ErrorRate(logBitErrorRate(ebn0Db), basis, method);
    }

    private String method() {
        return complete ? METHOD : METHOD + ", truncated after weight " + weights[weights.length - 1];
    }

    /**
     * The least Eb/N0 in dB at which the sum for the FER is at most a target, to 1e-9 dB. Maximum likelihood needs no more
     * than this if {@link #frameErrorRate} is a bound.
     *
     * @param fer target, in (0, 1)
     * @throws InvalidErrorRateException if it is outside, or met without any signal
     */
    public double leastEbn0Db(double fer) {
        return LeastEbn0.of(this::logFrameErrorRate, fer);
    }

    /** As {@link #leastEbn0Db(double)}, for the information bit error rate. */
    public double leastEbn0DbForBitErrorRate(double ber) {
        return LeastEbn0.of(this::logBitErrorRate, ber);
    }

    private double logFrameErrorRate(double ebn0Db) {
        return logSum(ebn0Db, logWords);
    }

    private double logBitErrorRate(double ebn0Db) {
        return logSum(ebn0Db, logInformation);
    }

    private double logSum(double ebn0Db, double[] logFactors) {
        double energyPerBitSent = rate * Decibels.toLinear(Checks.ebn0Db(ebn0Db));
        LogSum sum = new LogSum();
        for (int i = 0; i < weights.length; i++) {
            sum.add(logFactors[i] + GaussianTail.logQ(Math.sqrt(2 * weights[i] * energyPerBitSent)));
        }
        return sum.value();
    }
}
