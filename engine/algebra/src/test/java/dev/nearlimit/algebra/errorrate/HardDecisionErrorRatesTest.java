package dev.nearlimit.algebra.errorrate;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import dev.nearlimit.algebra.SmallCodes;
import dev.nearlimit.algebra.weight.WeightEnumeration;
import dev.nearlimit.algebra.weight.WeightEnumerator;
import dev.nearlimit.codes.Code;
import java.math.BigDecimal;
import java.math.MathContext;
import java.util.Random;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

class HardDecisionErrorRatesTest {
    private static final double[] CROSSOVERS = {0.5, 0.3, 0.1, 0.01, 1e-4};

    @Test
    void boundedDistanceAgreesWithEveryErrorPattern() {
        Code hamming = SmallCodes.hamming(3);
        Code bch = SmallCodes.bch15();
        for (double p : CROSSOVERS) {
            agreesWithEveryErrorPattern(hamming, 1, p);
            agreesWithEveryErrorPattern(bch, 2, p);
        }
        agreesWithEveryErrorPattern(bch, 1, 0.05);
        agreesWithEveryErrorPattern(bch, 0, 0.05);
        agreesWithEveryErrorPattern(SmallCodes.extended(hamming), 1, 0.05);
        agreesWithEveryErrorPattern(SmallCodes.repetition(7), 3, 0.2);
    }

    private static void agreesWithEveryErrorPattern(Code code, int t, double p) {
        double[] expected = new HardDecisionByEnumeration(code).boundedDistance(t, p);
        String which = code + ", t = " + t + ", p = " + p;
        ErrorRate fer = new BoundedDistanceErrorRate(code.n(), code.k(), t).frameErrorRateAtCrossover(p);
        assertEquals(expected[0], fer.value(), 1e-12 * expected[0], which);
        assertEquals(Basis.EXACT, fer.basis());
        ErrorRate uer = UndetectedErrorRate.of(WeightEnumeration.exact(code), t).undetectedErrorRateAtCrossover(p);
        assertEquals(expected[1], uer.value(), 1e-12 * expected[1], which);
        assertEquals(Basis.EXACT, uer.basis());
    }

    @ParameterizedTest
    @ValueSource(longs = {1, 2, 3, 4, 5, 6, 7, 8})
    void completeDecodingAgreesWithEveryErrorPattern(long seed) {
        Random random = new Random(seed);
        int n = 3 + random.nextInt(9);
        Code code = SmallCodes.random(seed, n, 1 + random.nextInt(Math.min(n, 6)));
        HardDecisionByEnumeration everything = new HardDecisionByEnumeration(code);
        CosetLeaderErrorRate rate = CosetLeaderErrorRate.of(n, code.k(), everything.leadersByWeight());
        for (double p : CROSSOVERS) {
            double expected = everything.complete(p);
            ErrorRate found = rate.frameErrorRateAtCrossover(p);
            assertEquals(expected, found.value(), 1e-12 * expected, code + ", p = " + p + ", seed " + seed);
            assertEquals(Basis.EXACT, found.basis());
        }
    }

    /** In a perfect code every coset leader has weight at most t, so both decoders are the same. */
    @ParameterizedTest
    @CsvSource({"-20", "0", "3", "6", "10", "14"})
    void perfectCodeHasOneHardDecisionErrorRate(double ebn0Db) {
        CosetLeaderErrorRate complete = CosetLeaderErrorRate.of(23, 12, 1, 23, 253, 1771);
        BoundedDistanceErrorRate bounded = new BoundedDistanceErrorRate(23, 12, 3);
        assertEquals(
                bounded.frameErrorRate(ebn0Db).naturalLog(),
                complete.frameErrorRate(ebn0Db).naturalLog(),
                1e-11);
        // no failures to declare: every frame error is undetected
        assertEquals(
                bounded.frameErrorRate(ebn0Db).naturalLog(),
                UndetectedErrorRate.of(WeightEnumeration.exact(SmallCodes.golay()), 3)
                        .undetectedErrorRate(ebn0Db)
                        .naturalLog(),
                1e-11);
        assertEquals(bounded.leastEbn0Db(1e-9), complete.leastEbn0Db(1e-9), 1e-9);
    }

    /** Binomial sums evaluated independently from the definition (Wicker 1995, ch. 10), to the digits shown. */
    @ParameterizedTest
    @CsvSource({
        "31,21,2,0.01,3.6460e-3",
        "31,21,2,1e-4,4.4856e-9",
        "63,45,3,1e-3,5.6822e-7",
        "127,106,3,0.01,3.9327e-2",
        "127,64,10,0.01,7.6751e-8",
        "127,64,10,1e-4,2.2008e-29",
        "255,239,2,0.01,4.6965e-1",
        "1023,993,3,0.01,9.9150e-1",
        "3860,3824,3,1e-3,5.3880e-1",
        "2040,1930,10,1e-3,9.7868e-6",
        "23,12,3,0.01,7.6053e-5",
        "23,12,3,1e-3,8.7214e-9"
    })
    void independentValuesAtCrossover(int n, int k, int t, double p, double expected) {
        double found = new BoundedDistanceErrorRate(n, k, t)
                .frameErrorRateAtCrossover(p)
                .value();
        assertEquals(expected, found, 2e-5 * expected);
    }

    /** The same sums solved independently for Eb/N0 with p = Q(sqrt(2 R Eb/N0)), to the digits shown. */
    @ParameterizedTest
    @CsvSource({
        "31,21,2,1e-3,6.616",
        "31,21,2,1e-6,8.878",
        "63,51,2,1e-6,8.630",
        "127,64,10,1e-3,5.575",
        "255,131,18,1e-6,6.163",
        "3860,3824,3,1e-3,8.377",
        "23,12,3,1e-3,6.087"
    })
    void independentEbn0(int n, int k, int t, double fer, double expectedDb) {
        BoundedDistanceErrorRate rate = new BoundedDistanceErrorRate(n, k, t);
        double found = rate.leastEbn0Db(fer);
        assertEquals(expectedDb, found, 6e-4);
        // 1e-9 dB moves ln FER by some 1e-8 at most here
        assertEquals(Math.log(fer), rate.frameErrorRate(found).naturalLog(), 1e-8);
    }

    /** Against the sum in 60 digits, on both sides of the mean and where a double would have underflowed. */
    @ParameterizedTest
    @ValueSource(longs = {1, 2, 3, 4, 5, 6, 7, 8, 9, 10, 11, 12})
    void binomialTailInManyDigits(long seed) {
        Random random = new Random(seed);
        int n = 1 + random.nextInt(300);
        int t = random.nextInt(n);
        double p = 0.5 * Math.pow(10, -8 * random.nextDouble() * (seed % 3));
        MathContext digits = new MathContext(60);
        BigDecimal good = BigDecimal.ONE.subtract(new BigDecimal(p), digits);
        BigDecimal sum = BigDecimal.ZERO;
        BigDecimal binomial = BigDecimal.ONE;
        for (int i = 0; i <= n; i++) {
            if (i > t) {
                sum = sum.add(
                        binomial.multiply(new BigDecimal(p).pow(i, digits)).multiply(good.pow(n - i, digits)), digits);
            }
            binomial = binomial.multiply(BigDecimal.valueOf(n - i)).divideToIntegralValue(BigDecimal.valueOf(i + 1L));
        }
        int exponent = sum.precision() - sum.scale();
        double expected = Math.log(sum.scaleByPowerOfTen(-exponent).doubleValue()) + exponent * Math.log(10);
        double found = BinomialTail.logMoreThan(t, n, Math.log(p));
        assertEquals(
                expected,
                found,
                1e-13 * (10 + Math.abs(expected)),
                "n=" + n + " t=" + t + " p=" + p + ", seed " + seed);
    }

    /** Error detection alone at p = 1/2: every pattern is as likely, 2^k - 1 of 2^n are codewords. */
    @Test
    void undetectedErrorsOfNoise() {
        WeightEnumerator golay = WeightEnumeration.exact(SmallCodes.golay());
        double found = UndetectedErrorRate.of(golay, 0)
                .undetectedErrorRateAtCrossover(0.5)
                .value();
        assertEquals(4095.0 / (1 << 23), found, 1e-15);
    }

    @Test
    void farTailIsFinite() {
        ErrorRate rate = new BoundedDistanceErrorRate(255, 131, 18).frameErrorRate(30);
        assertTrue(Double.isFinite(rate.naturalLog()) && rate.log10() < -1000, rate.toString());
        assertEquals(0.0, rate.value());
        assertEquals(
                0.0,
                new BoundedDistanceErrorRate(7, 4, 1)
                        .frameErrorRateAtCrossover(0)
                        .value());
        assertEquals(
                0.0,
                CosetLeaderErrorRate.of(7, 4, 1, 7).frameErrorRateAtCrossover(0).value());
    }

    @Test
    void nonsenseIsRefusedInOneLine() {
        BoundedDistanceErrorRate rate = new BoundedDistanceErrorRate(7, 4, 1);
        assertEquals(
                "crossover probability is 0.7, must lie between 0 and 1/2",
                assertThrows(InvalidErrorRateException.class, () -> rate.frameErrorRateAtCrossover(0.7))
                        .getMessage());
        assertEquals(
                "Eb/N0 is NaN dB, must lie between -200 and 200 dB",
                assertThrows(InvalidErrorRateException.class, () -> rate.frameErrorRate(Double.NaN))
                        .getMessage());
        assertEquals(
                "target error rate is 1.0, must lie between 0 and 1, both excluded",
                assertThrows(InvalidErrorRateException.class, () -> rate.leastEbn0Db(1))
                        .getMessage());
        // 1 - 8/2^7 = 0.9375 is what pure noise gives
        String met = assertThrows(InvalidErrorRateException.class, () -> rate.leastEbn0Db(0.95))
                .getMessage();
        assertTrue(met.startsWith("target error rate 0.95 is met at any Eb/N0: without a signal"), met);
        assertThrows(IllegalArgumentException.class, () -> new BoundedDistanceErrorRate(7, 4, 7));
        assertThrows(IllegalArgumentException.class, () -> new BoundedDistanceErrorRate(7, 8, 1));
        assertThrows(IllegalArgumentException.class, () -> CosetLeaderErrorRate.of(7, 4, 1, 6));
        assertThrows(IllegalArgumentException.class, () -> CosetLeaderErrorRate.of(7, 4, 1, 8, -1));
        assertThrows(IllegalArgumentException.class, () -> CosetLeaderErrorRate.of(7, 4));
        WeightEnumerator hamming = WeightEnumerator.of(1, 0, 0, 7, 7, 0, 0, 1);
        assertThrows(IllegalArgumentException.class, () -> UndetectedErrorRate.of(hamming, 2));
    }
}
