package dev.nearlimit.codes;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import dev.nearlimit.codes.gf2.BitMatrix;
import dev.nearlimit.codes.gf2.Elimination;
import java.util.Random;

/** What holds for every code, and plain enumeration of small ones. */
public final class CodeChecks {
    private CodeChecks() {}

    /** Checks shape, systematic form, that the checks are all of the code's and no more, and the encoder. */
    public static void assertSound(Code code, int n, int k) {
        String name = code.designator();
        assertEquals(n, code.n(), name);
        assertEquals(k, code.k(), name);
        BitMatrix generator = code.generator();
        assertTrue(generator.paddingIsClear(), name);
        BitMatrix check = code.parityCheck().toDense();
        assertTrue(check.multiply(generator.transpose()).isZero(), name + ": H G^T is not zero");
        assertEquals(n - k, Elimination.rank(check), name + ": rank of H");
        int[] positions = code.informationPositions();
        assertEquals(k, positions.length, name);
        assertEquals(
                BitMatrix.identity(k), generator.selectColumns(positions), name + ": G at the information positions");
        assertEncoderMultiplies(code, generator);
    }

    private static void assertEncoderMultiplies(Code code, BitMatrix generator) {
        long seed = code.n() * 1000L + code.k();
        Random random = new Random(seed);
        long[] information = random.longs(code.k()).toArray();
        long[] codeword = new long[code.n()];
        code.encoder().encode(information, codeword);
        for (int position = 0; position < code.n(); position++) {
            long sum = 0;
            for (int i = 0; i < code.k(); i++) {
                sum ^= generator.get(i, position) ? information[i] : 0;
            }
            assertEquals(sum, codeword[position], code.designator() + " position " + position + " seed " + seed);
        }
        assertEquals(0, code.parityCheck().unsatisfiedLanes(codeword), code.designator() + " seed " + seed);
    }

    /** Number of codewords of each weight 0 .. n, by forming all 2^k of them in Gray order. */
    public static long[] weights(Code code) {
        BitMatrix generator = code.generator();
        long[] word = new long[generator.wordsPerRow()];
        long[] counts = new long[code.n() + 1];
        counts[0] = 1;
        for (long step = 1; step < 1L << code.k(); step++) {
            generator.xorRowInto(Long.numberOfTrailingZeros(step), word);
            int weight = 0;
            for (long part : word) {
                weight += Long.bitCount(part);
            }
            counts[weight]++;
        }
        return counts;
    }

    /** The least weight of a word that is not zero, by enumeration. */
    public static int minimumDistance(Code code) {
        long[] counts = weights(code);
        int weight = 1;
        while (counts[weight] == 0) {
            weight++;
        }
        return weight;
    }

    /** All weights as {@code weight:count} pairs in ascending order. */
    public static String enumerator(Code code) {
        long[] counts = weights(code);
        StringBuilder text = new StringBuilder();
        for (int weight = 0; weight < counts.length; weight++) {
            if (counts[weight] != 0) {
                text.append(text.isEmpty() ? "" : " ")
                        .append(weight)
                        .append(':')
                        .append(counts[weight]);
            }
        }
        return text.toString();
    }
}
