package dev.nearlimit.limits;

import java.util.Locale;
import org.apache.commons.math3.optim.MaxEval;
import org.apache.commons.math3.optim.nonlinear.scalar.GoalType;
import org.apache.commons.math3.optim.univariate.BrentOptimizer;
import org.apache.commons.math3.optim.univariate.SearchInterval;
import org.apache.commons.math3.optim.univariate.UnivariateObjectiveFunction;

/**
 * The normal approximation to what the best code of a finite length reaches on BI-AWGN:
 *
 * <pre>k = n C - sqrt(n V) Qinv(FER) + 1/2 log2 n</pre>
 *
 * <p>with capacity C and dispersion V a channel use (Polyanskiy, Poor and Verdu, IEEE Trans. IT 56(5), 2010: the
 * expansion of equation (1), with the third-order term 1/2 log2 n that their Theorem 52 proves for the binary symmetric
 * channel; theorem number from memory). n counts channel uses, here real dimensions.
 *
 * <p>An estimate, not a bound: at short lengths and low error rates it lies below proven converses (n = 24, k = 12, FER
 * 1e-6: by 0.19 dB below Shannon's 1959 sphere-packing bound). Where k is at most 1/2 log2 n it says nothing at all,
 * since the third-order term then exceeds the payload: see {@link #covers}.
 */
public final class NormalApproximation {
    private static final double LOWEST_ESN0_DB = -80;
    private static final double HIGHEST_ESN0_DB = 28;
    private static final int RATE_STEPS = 256;

    private NormalApproximation() {}

    /** Whether the approximation says anything: more information bits than its third-order term, 1/2 log2 n. */
    public static boolean covers(int n, int k) {
        Checks.block(n, k);
        return k > thirdOrder(n);
    }

    /**
     * Estimated frame error rate of the best (n, k) code.
     *
     * @param n channel uses, at least 1
     * @param k information bits, 1..n and above 1/2 log2 n
     * @throws InvalidLimitException if the values are out of range or {@link #covers} is false
     */
    public static double frameErrorRate(int n, int k, double ebn0Db) {
        requireCovered(n, k);
        double esn0 = Decibels.toLinear(Checks.finite(ebn0Db, "Eb/N0 in dB")) * k / n;
        // Beyond, dispersion underflows; the estimate there is 0, or 1/2 for n = k = 1.
        esn0 = Math.min(esn0, Decibels.toLinear(HIGHEST_ESN0_DB));
        return GaussianTail.q(normalised(n, k, esn0));
    }

    /**
     * Estimated least Eb/N0 in dB at which some (n, k) code reaches a frame error rate.
     *
     * @param fer in (0, 1)
     * @throws InvalidLimitException if the values are out of range, {@link #covers} is false, or no Eb/N0 reaches the
     *     target (n = k = 1)
     */
    public static double leastEbn0Db(int n, int k, double fer) {
        requireCovered(n, k);
        Checks.insideUnitInterval(fer, "FER");
        double wanted = GaussianTail.inverse(fer);
        if (normalised(n, k, Decibels.toLinear(HIGHEST_ESN0_DB)) <= wanted) {
            throw new InvalidLimitException("the normal approximation reaches FER " + fer + " at no Eb/N0 for n = " + n
                    + ", k = " + k + ": too short");
        }
        double esn0Db = RootSearch.between(
                db -> normalised(n, k, Decibels.toLinear(db)) - wanted, LOWEST_ESN0_DB, HIGHEST_ESN0_DB);
        return esn0Db - Decibels.fromLinear((double) k / n);
    }

    /**
     * Estimated largest rate k/n, in [0, 1], at which some code of n channel uses reaches a frame error rate; k is taken
     * as a real number. 0 where no rate does.
     */
    public static double largestRate(int n, double fer, double ebn0Db) {
        Checks.block(n, 1);
        Checks.insideUnitInterval(fer, "FER");
        double ebn0 = Decibels.toLinear(Checks.finite(ebn0Db, "Eb/N0 in dB"));
        double wanted = GaussianTail.inverse(fer);
        double leastRate = thirdOrder(n) / n;
        double step = (1 - leastRate) / RATE_STEPS;
        double best = Double.NEGATIVE_INFINITY;
        int bestStep = RATE_STEPS;
        for (int i = RATE_STEPS; i >= 1; i--) {
            double spare = spareBits(n, leastRate + i * step, ebn0, wanted);
            if (spare >= 0) {
                return i == RATE_STEPS
                        ? 1
                        : largestIn(n, ebn0, wanted, leastRate + i * step, leastRate + (i + 1) * step);
            }
            if (spare > best) {
                best = spare;
                bestStep = i;
            }
        }
        // The rates that are possible, if any, fit between two steps.
        double low = leastRate + (bestStep - 1) * step;
        double high = leastRate + Math.min(RATE_STEPS, bestStep + 1) * step;
        double top = new BrentOptimizer(1e-10, 1e-14)
                .optimize(
                        new UnivariateObjectiveFunction(rate -> spareBits(n, rate, ebn0, wanted)),
                        GoalType.MAXIMIZE,
                        new SearchInterval(Math.max(low, Math.ulp(1.0)), high),
                        MaxEval.unlimited())
                .getPoint();
        return spareBits(n, top, ebn0, wanted) < 0 ? 0 : largestIn(n, ebn0, wanted, top, high);
    }

    private static double largestIn(int n, double ebn0, double wanted, double possible, double impossible) {
        return RootSearch.between(rate -> spareBits(n, rate, ebn0, wanted), possible, impossible);
    }

    /** Bits that the approximation grants beyond n rate, a channel use. */
    private static double spareBits(int n, double rate, double ebn0, double wanted) {
        double esn0 = Math.min(rate * ebn0, Decibels.toLinear(HIGHEST_ESN0_DB));
        return BinaryInputAwgn.capacity(esn0)
                - Math.sqrt(BinaryInputAwgn.dispersion(esn0) / n) * wanted
                + thirdOrder(n) / n
                - rate;
    }

    /** The argument of Q: bits to spare over their standard deviation. */
    private static double normalised(int n, int k, double esn0) {
        // n C - k as n - k less the loss, which stays exact where the capacity is all but 1.
        double spare = n - k - n * BinaryInputAwgn.loss(esn0) + thirdOrder(n);
        return spare / Math.sqrt(n * BinaryInputAwgn.dispersion(esn0));
    }

    private static double thirdOrder(int n) {
        return 0.5 * Math.log(n) / Math.log(2);
    }

    private static void requireCovered(int n, int k) {
        if (!covers(n, k)) {
            throw new InvalidLimitException("the normal approximation says nothing for n = " + n + ", k = " + k
                    + ": k must exceed 1/2 log2 n = " + String.format(Locale.ROOT, "%.2f", thirdOrder(n)));
        }
    }
}
