package dev.nearlimit.algebra.weight;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import dev.nearlimit.algebra.SmallCodes;
import dev.nearlimit.codes.Code;
import dev.nearlimit.codes.gf2.BitMatrix;
import java.math.BigInteger;
import java.util.ArrayList;
import java.util.List;
import java.util.Random;
import java.util.concurrent.CancellationException;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

class WeightEnumerationTest {

    /** Short codes of every rate, the kernel's borders (64 and 128 bits, fewer basis words than the table) among them. */
    @ParameterizedTest
    @ValueSource(longs = {1, 2, 3, 4, 5, 6, 7, 8, 9, 10, 11, 12, 13, 14, 15, 16, 17, 18, 19, 20})
    void agreesWithTheNaiveEnumeration(long seed) {
        Random random = new Random(seed);
        int n = 1 + random.nextInt(seed % 2 == 0 ? 16 : 140);
        int k = 1 + random.nextInt(Math.min(n, 11));
        Code code = SmallCodes.random(seed, n, k);
        InformationWeightEnumerator expected = NaiveEnumeration.of(code);
        String which = code + ", seed " + seed;
        assertEquals(expected.weights(), WeightEnumeration.exact(code), which);
        InformationWeightEnumerator found =
                WeightEnumeration.withInformationWeights(code, 2, EnumerationListener.SILENT);
        assertEquals(expected.weights(), found.weights(), which);
        for (int w = 0; w <= n; w++) {
            assertEquals(expected.total(w), found.total(w), which + ", weight " + w);
        }
    }

    /** k > n - k, so that the dual is enumerated and information weights come from the punctured duals. */
    @ParameterizedTest
    @ValueSource(longs = {1, 2, 3, 4, 5, 6, 7, 8, 9, 10})
    void dualSideAgreesWithTheNaiveEnumeration(long seed) {
        Random random = new Random(seed);
        int n = 10 + random.nextInt(5);
        int k = n / 2 + 1 + random.nextInt(n - n / 2);
        Code code = SmallCodes.random(seed, n, Math.min(k, n));
        InformationWeightEnumerator expected = NaiveEnumeration.of(code);
        InformationWeightEnumerator found = WeightEnumeration.withInformationWeights(code);
        assertEquals(expected.weights(), found.weights(), "seed " + seed);
        for (int w = 0; w <= n; w++) {
            assertEquals(expected.total(w), found.total(w), "seed " + seed + ", weight " + w);
        }
    }

    /** 2^19 words are two parts of the work: the border between parts, against the other side's enumeration. */
    @Test
    void partsAddUp() {
        Code code = SmallCodes.random(77, 38, 19);
        WeightEnumerator whole = WeightEnumeration.exact(code, 2, EnumerationListener.SILENT);
        assertEquals(whole, WeightEnumeration.exact(code, 1, EnumerationListener.SILENT));
        Code dual = Code.ofGenerator("dual", "test", code.parityCheck().toDense());
        assertEquals(whole, MacWilliams.dual(WeightEnumeration.exact(dual)));
    }

    /** MacWilliams and Sloane 1977, ch. 1 and ch. 2. */
    @Test
    void hammingCode() {
        assertEquals(WeightEnumerator.of(1, 0, 0, 7, 7, 0, 0, 1), WeightEnumeration.exact(SmallCodes.hamming(3)));
        assertEquals(
                WeightEnumerator.of(1, 0, 0, 0, 14, 0, 0, 0, 1),
                WeightEnumeration.exact(SmallCodes.extended(SmallCodes.hamming(3))));
    }

    /** MacWilliams and Sloane 1977, ch. 2, fig. 2.14 (extended) and ch. 2, section 6. */
    @Test
    void golayCodes() {
        long[] golay = new long[24];
        golay[0] = golay[23] = 1;
        golay[7] = golay[16] = 253;
        golay[8] = golay[15] = 506;
        golay[11] = golay[12] = 1288;
        assertEquals(WeightEnumerator.of(golay), WeightEnumeration.exact(SmallCodes.golay()));
        long[] extended = new long[25];
        extended[0] = extended[24] = 1;
        extended[8] = extended[16] = 759;
        extended[12] = 2576;
        assertEquals(WeightEnumerator.of(extended), WeightEnumeration.exact(SmallCodes.extended(SmallCodes.golay())));
    }

    /** One word of weight 2^m and 2^(m+1) - 2 of weight 2^(m-1) (MacWilliams and Sloane 1977, ch. 13, section 3). */
    @ParameterizedTest
    @ValueSource(ints = {2, 3, 5, 7, 9})
    void firstOrderReedMuller(int m) {
        WeightEnumerator found = WeightEnumeration.exact(SmallCodes.reedMuller1(m));
        int n = 1 << m;
        assertEquals(List.of(0, n / 2, n), boxed(found.weights()));
        assertEquals(BigInteger.valueOf(2L * n - 2), found.count(n / 2));
        assertEquals(n / 2, found.minimumDistance());
    }

    /**
     * BCH (31,21), narrow sense, zeros alpha and alpha^3 of GF(32) with x^5 + x^2 + 1: A_5 = 186, A_6 = 806, A_7 = 2635
     * (minimum distance 5: Lin and Costello, Error Control Coding, 2nd ed. 2004, app. C; counts by independent exhaustive
     * enumeration).
     */
    @Test
    void bch31() {
        // minimal polynomials of alpha (0x25) and of alpha^3 (0x3d), multiplied
        WeightEnumerator found = WeightEnumeration.exact(SmallCodes.cyclic(31, carrylessProduct(0x25, 0x3d)));
        assertEquals(21, found.k());
        assertEquals(5, found.minimumDistance());
        assertEquals(BigInteger.valueOf(186), found.count(5));
        assertEquals(BigInteger.valueOf(806), found.count(6));
        assertEquals(BigInteger.valueOf(2635), found.count(7));
    }

    /** Even-weight words only: A_w = C(n, w) for even w; every position looks like any other, so W_w = k A_w w / n. */
    @Test
    void singleParityCheckFarBeyondWhatOneSideCouldEnumerate() {
        int n = 300;
        InformationWeightEnumerator found = WeightEnumeration.withInformationWeights(SmallCodes.parityCheck(n));
        BigInteger binomial = BigInteger.ONE;
        for (int w = 0; w <= n; w++) {
            BigInteger expected = w % 2 == 0 ? binomial : BigInteger.ZERO;
            assertEquals(expected, found.weights().count(w), "weight " + w);
            assertEquals(
                    expected.multiply(BigInteger.valueOf((n - 1L) * w)).divide(BigInteger.valueOf(n)),
                    found.total(w).orElseThrow(),
                    "weight " + w);
            assertEquals(expected.signum() * (double) w / n, found.meanInformationFraction(w), 1e-14, "weight " + w);
            binomial = binomial.multiply(BigInteger.valueOf(n - w)).divide(BigInteger.valueOf(w + 1L));
        }
    }

    @Test
    void wholeSpaceHasBinomialCounts() {
        Code space = Code.ofGenerator("space", "test", BitMatrix.identity(6));
        assertEquals(WeightEnumerator.of(1, 6, 15, 20, 15, 6, 1), WeightEnumeration.exact(space));
    }

    @Test
    void refusesWhatWouldNotEnd() {
        Code code = SmallCodes.random(5, 90, 45);
        String message = assertThrows(InfeasibleEnumerationException.class, () -> WeightEnumeration.exact(code))
                .getMessage();
        assertEquals(
                "random:90,45,seed=5 has 2^45 codewords; the dual has 2^45; enumeration is feasible up to 2^26 words of"
                        + " either",
                message);
        Code longCode = SmallCodes.parityCheck(WeightEnumeration.MAX_TRANSFORM_LENGTH + 1);
        String longMessage = assertThrows(
                        InfeasibleEnumerationException.class, () -> WeightEnumeration.withInformationWeights(longCode))
                .getMessage();
        assertTrue(
                longMessage.endsWith("has 2^8192 codewords; the dual has 2^1, but the length is 8193, and the transform"
                        + " from the dual is feasible up to length 8192"),
                longMessage);
    }

    @Test
    void listenerSeesProgressAndMayEndTheWork() {
        Code code = SmallCodes.random(9, 60, 20);
        List<Long> done = new ArrayList<>();
        WeightEnumeration.exact(code, 1, (words, all) -> {
            assertEquals(1L << 20, all);
            done.add(words);
            return true;
        });
        assertEquals(1L << 20, done.get(done.size() - 1));
        assertThrows(CancellationException.class, () -> WeightEnumeration.exact(code, 2, (words, all) -> false));
        assertThrows(
                IllegalArgumentException.class, () -> WeightEnumeration.exact(code, 0, EnumerationListener.SILENT));
    }

    private static List<Integer> boxed(int[] values) {
        List<Integer> list = new ArrayList<>();
        for (int value : values) {
            list.add(value);
        }
        return list;
    }

    private static long carrylessProduct(long a, long b) {
        long product = 0;
        for (int i = 0; i < 32; i++) {
            if ((b >>> i & 1) != 0) {
                product ^= a << i;
            }
        }
        return product;
    }
}
