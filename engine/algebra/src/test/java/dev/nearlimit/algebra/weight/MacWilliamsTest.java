package dev.nearlimit.algebra.weight;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import dev.nearlimit.algebra.SmallCodes;
import dev.nearlimit.codes.Code;
import java.math.BigInteger;
import java.util.Random;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

class MacWilliamsTest {

    @ParameterizedTest
    @ValueSource(longs = {1, 2, 3, 4, 5, 6, 7, 8, 9, 10, 11, 12})
    void dualOfRandomCodesAndBackAgain(long seed) {
        Random random = new Random(seed);
        int n = 2 + random.nextInt(14);
        int k = 1 + random.nextInt(n - 1);
        Code code = SmallCodes.random(seed, n, k);
        Code dual = Code.ofGenerator("dual", "test", code.parityCheck().toDense());
        WeightEnumerator weights = NaiveEnumeration.of(code).weights();
        WeightEnumerator dualWeights = NaiveEnumeration.of(dual).weights();
        assertEquals(dualWeights, MacWilliams.dual(weights, k), "seed " + seed);
        assertEquals(weights, MacWilliams.dual(MacWilliams.dual(weights)), "seed " + seed);
    }

    /** The dual of the simplex code, all of whose 2^m - 1 words have weight 2^(m-1), is the Hamming code. */
    @Test
    void longTransformTwiceIsTheIdentity() {
        int m = 8;
        long[] counts = new long[1 << m];
        counts[0] = 1;
        counts[1 << (m - 1)] = (1L << m) - 1;
        WeightEnumerator simplex = WeightEnumerator.of(counts);
        WeightEnumerator hamming = MacWilliams.dual(simplex, m);
        assertEquals(3, hamming.minimumDistance());
        // A_3 = n (n - 1) / 6: MacWilliams and Sloane 1977, ch. 1
        assertEquals(BigInteger.valueOf(255L * 254 / 6), hamming.count(3));
        assertEquals(simplex, MacWilliams.dual(hamming));
    }

    @Test
    void countsOfNoLinearCodeAreRefused() {
        // 2^2 words, but two words of weight 1 in a code of length 2 bring (1,1) with them
        WeightEnumerator impossible = WeightEnumerator.of(1, 3, 0);
        assertThrows(IllegalArgumentException.class, () -> MacWilliams.dual(impossible));
        WeightEnumerator wrongDimension = WeightEnumerator.of(1, 0, 0, 7, 7, 0, 0, 1);
        assertEquals(
                "the counts add up to 2^4, the code has dimension 3",
                assertThrows(IllegalArgumentException.class, () -> MacWilliams.dual(wrongDimension, 3))
                        .getMessage());
    }
}
