package dev.nearlimit.algebra.errorrate;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import dev.nearlimit.algebra.SmallCodes;
import dev.nearlimit.algebra.weight.InformationWeightEnumerator;
import dev.nearlimit.algebra.weight.WeightEnumeration;
import dev.nearlimit.codes.Code;
import dev.nearlimit.codes.gf2.BitMatrix;
import dev.nearlimit.limits.GaussianTail;
import java.math.BigInteger;
import java.util.Random;
import java.util.TreeMap;
import java.util.function.DoubleUnaryOperator;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

class UnionBoundTest {

    /** One word besides the zero word: the sum has one term and is the error rate of uncoded transmission. */
    @ParameterizedTest
    @ValueSource(doubles = {-10, 0, 4, 9.6, 20, 40})
    void repetitionIsExact(double ebn0Db) {
        UnionBound bound = UnionBound.of(WeightEnumeration.withInformationWeights(SmallCodes.repetition(5)));
        double expected = GaussianTail.logQ(Math.sqrt(2 * Math.pow(10, ebn0Db / 10)));
        assertEquals(expected, bound.frameErrorRate(ebn0Db).naturalLog(), 1e-12 * (1 + Math.abs(expected)));
        assertEquals(expected, bound.bitErrorRate(ebn0Db).naturalLog(), 1e-12 * (1 + Math.abs(expected)));
        assertEquals(Basis.BOUND, bound.bitErrorRate(ebn0Db).basis());
    }

    /**
     * First-order Reed-Muller codes are biorthogonal signals, 2^m axes: maximum likelihood is right with probability
     * integral over y > 0 of (1 - 2 Q(y))^(2^m - 1) phi(y - sqrt(2 k Eb/N0)) (common practice; Proakis, Digital
     * Communications).
     */
    @ParameterizedTest
    @CsvSource({"2,0", "2,4", "3,2", "3,6", "5,1", "5,4", "5,8"})
    void liesAboveBiorthogonalSignals(int m, double ebn0Db) {
        Code code = SmallCodes.reedMuller1(m);
        double centre = Math.sqrt(2 * code.k() * Math.pow(10, ebn0Db / 10));
        double exact = 1
                - integral(
                        y -> Math.pow(1 - 2 * GaussianTail.q(y), (1 << m) - 1) * density(y - centre), 0, centre + 12);
        tightFromAbove(code, ebn0Db, exact);
    }

    /**
     * Simplex codes are simplex signals, with the distances of 2^k orthogonal ones: maximum likelihood is right with
     * probability integral of (1 - Q(y))^(2^k - 1) phi(y - c), where c^2 = 4 d R Eb/N0 makes two orthogonal signals as far
     * apart as two codewords at distance d (common practice; Proakis, Digital Communications).
     */
    @ParameterizedTest
    @CsvSource({"2,0", "2,5", "3,3", "3,7", "4,2", "4,6"})
    void liesAboveSimplexSignals(int k, double ebn0Db) {
        Code hamming = SmallCodes.hamming(k);
        Code code = Code.ofGenerator("simplex", "test", hamming.parityCheck().toDense());
        int distance = 1 << (k - 1);
        double centre = Math.sqrt(4 * distance * code.rate().value() * Math.pow(10, ebn0Db / 10));
        double exact = 1
                - integral(y -> Math.pow(1 - GaussianTail.q(y), (1 << k) - 1) * density(y - centre), -12, centre + 12);
        tightFromAbove(code, ebn0Db, exact);
    }

    private static void tightFromAbove(Code code, double ebn0Db, double exact) {
        double bound = UnionBound.of(WeightEnumeration.exact(code))
                .frameErrorRate(ebn0Db)
                .value();
        assertTrue(bound > exact, code + " at " + ebn0Db + " dB: " + bound + " against " + exact);
        if (exact < 1e-3) {
            assertTrue(bound < 1.1 * exact, code + " at " + ebn0Db + " dB: " + bound + " against " + exact);
        }
    }

    /** sum A_w Q(sqrt(2 w R Eb/N0)) evaluated independently, to the digits shown. */
    @Test
    void extendedGolay() {
        UnionBound bound = UnionBound.of(WeightEnumeration.exact(SmallCodes.extended(SmallCodes.golay())));
        assertEquals(2.5809e-2, bound.frameErrorRate(3).value(), 1e-6);
        assertEquals(1.8733e-4, bound.frameErrorRate(5).value(), 1e-8);
    }

    /** The sums over codewords one by one, with their messages. */
    @ParameterizedTest
    @ValueSource(longs = {1, 2, 3, 4, 5, 6, 7, 8})
    void agreesWithSumOverCodewords(long seed) {
        Random random = new Random(seed);
        int n = 2 + random.nextInt(12);
        Code code = SmallCodes.random(seed, n, 1 + random.nextInt(n));
        double ebn0Db = 10 * random.nextDouble() - 2;
        BitMatrix G = code.generator();
        double fer = 0;
        double ber = 0;
        for (int message = 1; message < 1 << code.k(); message++) {
            long word = 0;
            for (int r = 0; r < code.k(); r++) {
                word ^= (message >>> r & 1) != 0 ? G.word(r, 0) : 0;
            }
            double pairwise = GaussianTail.q(
                    Math.sqrt(2 * code.rate().value() * Long.bitCount(word) * Math.pow(10, ebn0Db / 10)));
            fer += pairwise;
            ber += pairwise * Integer.bitCount(message) / code.k();
        }
        UnionBound bound = UnionBound.of(WeightEnumeration.withInformationWeights(code));
        assertEquals(fer, bound.frameErrorRate(ebn0Db).value(), 1e-12 * fer, "seed " + seed);
        assertEquals(ber, bound.bitErrorRate(ebn0Db).value(), 1e-12 * ber, "seed " + seed);
        assertEquals(Basis.BOUND, bound.frameErrorRate(ebn0Db).basis());
        assertEquals(Basis.BOUND, bound.bitErrorRate(ebn0Db).basis());
    }

    @Test
    void saysWhenItIsOnlyAnEstimate() {
        InformationWeightEnumerator golay = WeightEnumeration.withInformationWeights(SmallCodes.golay());
        UnionBound whole = UnionBound.of(golay);
        UnionBound proportional = UnionBound.of(golay.weights());
        UnionBound truncated = UnionBound.upTo(golay, 8);
        assertEquals(Basis.BOUND, proportional.frameErrorRate(4).basis());
        assertEquals(Basis.ESTIMATED, proportional.bitErrorRate(4).basis());
        // cyclic code: the proportional information weights are the exact ones
        assertEquals(whole.bitErrorRate(4).value(), proportional.bitErrorRate(4).value(), 1e-15);
        assertEquals(Basis.ESTIMATED, truncated.frameErrorRate(4).basis());
        assertEquals(
                "union bound, soft maximum likelihood, truncated after weight 8",
                truncated.bitErrorRate(4).method());
        assertTrue(truncated.frameErrorRate(4).value() < whole.frameErrorRate(4).value());
        assertEquals(Basis.BOUND, UnionBound.upTo(golay, 23).frameErrorRate(4).basis());

        TreeMap<Integer, BigInteger> spectrum = new TreeMap<>();
        spectrum.put(7, BigInteger.valueOf(253));
        spectrum.put(8, BigInteger.valueOf(506));
        UnionBound partial = UnionBound.ofPartialSpectrum(23, 12, spectrum);
        assertEquals(
                truncated.frameErrorRate(4).naturalLog(),
                partial.frameErrorRate(4).naturalLog(),
                1e-14);
        assertEquals(Basis.ESTIMATED, partial.bitErrorRate(4).basis());
    }

    @Test
    void solvesForEbn0FarIntoTheTail() {
        UnionBound bound = UnionBound.of(WeightEnumeration.withInformationWeights(SmallCodes.golay()));
        for (double fer : new double[] {0.5, 1e-3, 1e-15, 1e-100}) {
            double ebn0Db = bound.leastEbn0Db(fer);
            assertEquals(Math.log(fer), bound.frameErrorRate(ebn0Db).naturalLog(), 1e-7, "FER " + fer);
            double forBits = bound.leastEbn0DbForBitErrorRate(fer);
            assertEquals(Math.log(fer), bound.bitErrorRate(forBits).naturalLog(), 1e-7, "BER " + fer);
            assertTrue(forBits < ebn0Db);
        }
        assertTrue(Double.isFinite(bound.frameErrorRate(60).naturalLog()));
    }

    /** 2^299 even-weight words: neither the counts nor the sum fits a double's comfortable range. */
    @Test
    void hugeCountsDoNotOverflow() {
        UnionBound bound = UnionBound.of(WeightEnumeration.withInformationWeights(SmallCodes.parityCheck(1200)));
        double atNothing = bound.frameErrorRate(-100).naturalLog();
        assertEquals(1199 * Math.log(2) - Math.log(2), atNothing, 0.01);
        assertTrue(Double.isFinite(bound.frameErrorRate(12).naturalLog()));
    }

    @Test
    void nonsenseIsRefused() {
        UnionBound bound = UnionBound.of(WeightEnumeration.exact(SmallCodes.golay()));
        assertThrows(InvalidErrorRateException.class, () -> bound.frameErrorRate(Double.POSITIVE_INFINITY));
        assertThrows(InvalidErrorRateException.class, () -> bound.leastEbn0Db(0));
        InformationWeightEnumerator golay = WeightEnumeration.withInformationWeights(SmallCodes.golay());
        assertThrows(IllegalArgumentException.class, () -> UnionBound.upTo(golay, 6));
        assertThrows(IllegalArgumentException.class, () -> UnionBound.ofPartialSpectrum(7, 4, new TreeMap<>()));
    }

    private static double density(double x) {
        return Math.exp(-0.5 * x * x) / Math.sqrt(2 * Math.PI);
    }

    /** Simpson's rule with 20000 steps: the integrands are smooth, the error is below 1e-12. */
    private static double integral(DoubleUnaryOperator f, double from, double to) {
        int steps = 20000;
        double h = (to - from) / steps;
        double sum = f.applyAsDouble(from) + f.applyAsDouble(to);
        for (int i = 1; i < steps; i++) {
            sum += (i % 2 == 0 ? 2 : 4) * f.applyAsDouble(from + i * h);
        }
        return sum * h / 3;
    }
}
