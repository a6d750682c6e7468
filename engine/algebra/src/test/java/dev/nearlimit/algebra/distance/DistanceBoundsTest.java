package dev.nearlimit.algebra.distance;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import dev.nearlimit.algebra.SmallCodes;
import dev.nearlimit.algebra.weight.WeightEnumeration;
import dev.nearlimit.codes.Code;
import java.math.BigInteger;
import java.util.Random;
import org.apache.commons.math3.util.CombinatoricsUtils;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

class DistanceBoundsTest {

    /** Perfect codes meet the Hamming bound, simplex and first-order Reed-Muller codes the Griesmer bound. */
    @ParameterizedTest
    @CsvSource({
        "7,4,3,Griesmer",
        "15,11,3,Hamming",
        "23,12,7,Hamming",
        "24,12,8,Griesmer",
        "63,6,32,Griesmer",
        "64,7,32,Griesmer",
        "5,1,5,Griesmer",
        "9,8,2,Griesmer",
        "6,6,1,Griesmer",
        "128,120,4,Hamming"
    })
    void boundsThatCodesMeet(int n, int k, int distance, String name) {
        DistanceBounds bounds = DistanceBounds.of(n, k);
        assertEquals(distance, bounds.best());
        assertEquals(name, bounds.nameOfBest());
    }

    /** Optimal distances of short codes (Brouwer, Handbook of Coding Theory, 1998) are not cut off. */
    @ParameterizedTest
    @CsvSource({"9,2,6", "11,4,5", "12,6,4", "14,4,7", "23,17,4", "25,14,6", "26,4,13", "27,3,15", "28,7,12", "29,3,16"
    })
    void optimalCodesLieWithin(int n, int k, int optimum) {
        assertTrue(DistanceBounds.of(n, k).best() >= optimum);
    }

    /** The bounds by their definitions, tried distance by distance. */
    @Test
    void agreeWithTheirDefinitions() {
        for (int n = 1; n <= 40; n++) {
            for (int k = 1; k <= n; k++) {
                int hamming = 0;
                int griesmer = 0;
                for (int d = 1; d <= n; d++) {
                    int length = d % 2 == 0 ? n - 1 : n;
                    BigInteger sphere = BigInteger.ZERO;
                    for (int i = 0; i <= (d - 1) / 2; i++) {
                        sphere = sphere.add(BigInteger.valueOf(CombinatoricsUtils.binomialCoefficient(length, i)));
                    }
                    if (length >= k && sphere.bitLength() <= length - k + (sphere.bitCount() == 1 ? 1 : 0)) {
                        hamming = d;
                    }
                    long sum = 0;
                    for (int i = 0; i < k; i++) {
                        sum += (long) Math.ceil(d / Math.pow(2, i));
                    }
                    if (sum <= n) {
                        griesmer = d;
                    }
                }
                DistanceBounds bounds = DistanceBounds.of(n, k);
                assertEquals(hamming, bounds.hamming(), "Hamming (" + n + "," + k + ")");
                assertEquals(griesmer, bounds.griesmer(), "Griesmer (" + n + "," + k + ")");
                assertEquals(n - k + 1, bounds.singleton());
            }
        }
    }

    @ParameterizedTest
    @ValueSource(longs = {1, 2, 3, 4, 5, 6, 7, 8, 9, 10})
    void noRandomCodeBeatsThem(long seed) {
        Random random = new Random(seed);
        int n = 1 + random.nextInt(24);
        Code code = SmallCodes.random(seed, n, 1 + random.nextInt(n));
        int distance = WeightEnumeration.exact(code).minimumDistance();
        assertTrue(distance <= DistanceBounds.of(n, code.k()).best(), code + ", seed " + seed);
    }

    @Test
    void longCodesAreQuick() {
        DistanceBounds bounds = DistanceBounds.of(16200, 7200);
        assertTrue(bounds.best() > 3000 && bounds.best() < 9000, bounds.toString());
    }

    @Test
    void impossibleParametersAreRefused() {
        assertThrows(IllegalArgumentException.class, () -> DistanceBounds.of(4, 5));
        assertThrows(IllegalArgumentException.class, () -> DistanceBounds.of(4, 0));
    }
}
