package dev.nearlimit.algebra.weight;

import dev.nearlimit.codes.Code;
import dev.nearlimit.codes.gf2.BitMatrix;
import java.math.BigInteger;
import java.util.Arrays;

/** The obvious enumeration: every message, encoded bit by bit. */
final class NaiveEnumeration {
    private NaiveEnumeration() {}

    static InformationWeightEnumerator of(Code code) {
        BitMatrix G = code.generator();
        BigInteger[] counts = new BigInteger[code.n() + 1];
        BigInteger[] information = new BigInteger[code.n() + 1];
        Arrays.fill(counts, BigInteger.ZERO);
        Arrays.fill(information, BigInteger.ZERO);
        for (int message = 0; message < 1 << code.k(); message++) {
            int weight = 0;
            for (int c = 0; c < code.n(); c++) {
                boolean bit = false;
                for (int r = 0; r < code.k(); r++) {
                    bit ^= (message >>> r & 1) != 0 && G.get(r, c);
                }
                weight += bit ? 1 : 0;
            }
            counts[weight] = counts[weight].add(BigInteger.ONE);
            information[weight] = information[weight].add(BigInteger.valueOf(Integer.bitCount(message)));
        }
        return InformationWeightEnumerator.exact(WeightEnumerator.of(counts), information);
    }
}
