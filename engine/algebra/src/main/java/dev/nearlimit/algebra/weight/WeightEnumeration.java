package dev.nearlimit.algebra.weight;

import dev.nearlimit.codes.Code;
import dev.nearlimit.codes.gf2.BitMatrix;
import java.math.BigInteger;

/**
 * Exact weight enumerators by brute force: every word of the code or of its dual, whichever has fewer, is weighed, and
 * the MacWilliams identity leads back from the dual to the code.
 *
 * <p>Feasible when the code or its dual has at most 2^{@value #MAX_DIMENSION} words (and the length is at most
 * {@value #MAX_TRANSFORM_LENGTH} where the dual is used, because its transform keeps numbers of n bits). Results are
 * exact and do not depend on the number of threads.
 *
 * <p>Information weights are exact on either side. On the code's side the message weight of every word is counted. On
 * the dual's side let S_j be the total weight, at the code's information positions, of the dual words of weight j. The
 * words of the code that are 0 at information position i form, with i left out, a code whose dual is the dual of the
 * code with i left out. Added over all k positions, those punctured duals have k B_j - S_j + S_(j+1) words of weight j;
 * the MacWilliams transform of length n - 1, being linear, turns that sum into the number of pairs (codeword of weight
 * w, information position where it is 0), and what is missing to k A_w is the information weight.
 */
public final class WeightEnumeration {
    /** Base-two logarithm of the most words that are enumerated. */
    public static final int MAX_DIMENSION = 26;

    /** Longest code whose dual is transformed: n^2 bits are 8 MB there. */
    public static final int MAX_TRANSFORM_LENGTH = 8192;

    private WeightEnumeration() {}

    /**
     * The weight enumerator, on all processors.
     *
     * @throws InfeasibleEnumerationException if neither the code nor its dual is small enough
     */
    public static WeightEnumerator exact(Code code) {
        return exact(code, Runtime.getRuntime().availableProcessors(), EnumerationListener.SILENT);
    }

    /**
     * The weight enumerator.
     *
     * @param threads threads to use, at least 1
     * @param listener told of progress; may end the enumeration
     * @throws InfeasibleEnumerationException if neither the code nor its dual is small enough
     * @throws java.util.concurrent.CancellationException if the listener or an interrupt ends the enumeration
     */
    public static WeightEnumerator exact(Code code, int threads, EnumerationListener listener) {
        requireFeasible(code);
        if (useCode(code)) {
            return enumerator(ParallelEnumeration.run(code.n(), wordsOf(code.generator()), threads, listener));
        }
        return MacWilliams.dual(
                enumerator(ParallelEnumeration.run(code.n(), dualWords(code), threads, listener)), code.n() - code.k());
    }

    /**
     * The weight enumerator with exact information weights for the code's information positions, on all processors.
     *
     * @throws InfeasibleEnumerationException if neither the code nor its dual is small enough
     */
    public static InformationWeightEnumerator withInformationWeights(Code code) {
        return withInformationWeights(code, Runtime.getRuntime().availableProcessors(), EnumerationListener.SILENT);
    }

    /**
     * The weight enumerator with exact information weights for the code's information positions.
     *
     * @param threads threads to use, at least 1
     * @param listener told of progress; may end the enumeration
     * @throws InfeasibleEnumerationException if neither the code nor its dual is small enough
     * @throws java.util.concurrent.CancellationException if the listener or an interrupt ends the enumeration
     */
    public static InformationWeightEnumerator withInformationWeights(
            Code code, int threads, EnumerationListener listener) {
        requireFeasible(code);
        if (useCode(code)) {
            WordTotals totals = ParallelEnumeration.run(code.n(), wordsOf(code.generator()), threads, listener);
            return InformationWeightEnumerator.exact(enumerator(totals), bigIntegers(totals.messageWeights()));
        }
        WordTotals dual = ParallelEnumeration.run(code.n(), dualWords(code), threads, listener);
        return fromDual(code.n(), code.k(), dual);
    }

    /** Whether {@link #exact(Code)} would run rather than refuse. */
    public static boolean isFeasible(Code code) {
        return code.k() <= MAX_DIMENSION || dualIsFeasible(code);
    }

    private static boolean dualIsFeasible(Code code) {
        return code.n() - code.k() <= MAX_DIMENSION && code.n() <= MAX_TRANSFORM_LENGTH;
    }

    private static boolean useCode(Code code) {
        return code.k() <= MAX_DIMENSION && (code.k() <= code.n() - code.k() || !dualIsFeasible(code));
    }

    private static void requireFeasible(Code code) {
        if (isFeasible(code)) {
            return;
        }
        int dualDimension = code.n() - code.k();
        String sizes = code.designator() + " has 2^" + code.k() + " codewords; the dual has 2^" + dualDimension;
        if (dualDimension <= MAX_DIMENSION) {
            throw new InfeasibleEnumerationException(sizes + ", but the length is " + code.n()
                    + ", and the transform from the dual is feasible up to length " + MAX_TRANSFORM_LENGTH);
        }
        throw new InfeasibleEnumerationException(
                sizes + "; enumeration is feasible up to 2^" + MAX_DIMENSION + " words of either");
    }

    private static InformationWeightEnumerator fromDual(int n, int k, WordTotals dual) {
        int r = n - k;
        WeightEnumerator weights = MacWilliams.dual(enumerator(dual), r);
        BigInteger[] punctured = new BigInteger[n];
        for (int j = 0; j < n; j++) {
            punctured[j] = BigInteger.valueOf(k)
                    .multiply(BigInteger.valueOf(dual.counts()[j]))
                    .subtract(BigInteger.valueOf(weightAtInformation(dual, j)))
                    .add(BigInteger.valueOf(weightAtInformation(dual, j + 1)));
        }
        BigInteger[] zerosAtInformation = MacWilliams.transform(punctured, r);
        BigInteger[] informationWeights = new BigInteger[n + 1];
        for (int w = 0; w <= n; w++) {
            BigInteger places = weights.count(w).multiply(BigInteger.valueOf(k));
            informationWeights[w] = w < n ? places.subtract(zerosAtInformation[w]) : places;
        }
        return InformationWeightEnumerator.exact(weights, informationWeights);
    }

    /** S_j: what of the weight of the dual words of weight j lies outside their own message, at the parity positions. */
    private static long weightAtInformation(WordTotals dual, int weight) {
        return weight * dual.counts()[weight] - dual.messageWeights()[weight];
    }

    private static long[][] wordsOf(BitMatrix matrix) {
        long[][] words = new long[matrix.rows()][];
        for (int r = 0; r < words.length; r++) {
            words[r] = matrix.row(r);
        }
        return words;
    }

    /**
     * A basis of the dual that is systematic at the parity positions: the word of parity position p has a 1 there and at
     * the information positions whose bits p is the sum of.
     */
    private static long[][] dualWords(Code code) {
        int[] positions = code.informationPositions();
        boolean[] isInformation = new boolean[code.n()];
        for (int position : positions) {
            isInformation[position] = true;
        }
        BitMatrix columns = code.generator().transpose();
        BitMatrix dual = new BitMatrix(code.n() - code.k(), code.n());
        int row = 0;
        for (int p = 0; p < code.n(); p++) {
            if (isInformation[p]) {
                continue;
            }
            dual.set(row, p, true);
            for (int i = 0; i < positions.length; i++) {
                if (columns.get(p, i)) {
                    dual.set(row, positions[i], true);
                }
            }
            row++;
        }
        return wordsOf(dual);
    }

    private static WeightEnumerator enumerator(WordTotals totals) {
        return WeightEnumerator.of(totals.counts());
    }

    private static BigInteger[] bigIntegers(long[] values) {
        BigInteger[] big = new BigInteger[values.length];
        for (int i = 0; i < values.length; i++) {
            big[i] = BigInteger.valueOf(values[i]);
        }
        return big;
    }
}
