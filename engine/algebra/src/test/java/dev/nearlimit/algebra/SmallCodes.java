package dev.nearlimit.algebra;

import dev.nearlimit.codes.Code;
import dev.nearlimit.codes.gf2.BitMatrix;
import dev.nearlimit.codes.gf2.Elimination;
import dev.nearlimit.codes.gf2.SparseBitMatrix;
import java.util.Random;

/** Codes for tests, built here from first principles so that they do not depend on the catalogue that users see. */
public final class SmallCodes {
    private SmallCodes() {}

    /** A random (n, k) code; the generator is redrawn until its rows are independent. */
    public static Code random(long seed, int n, int k) {
        Random random = new Random(seed);
        while (true) {
            BitMatrix generator = new BitMatrix(k, n);
            for (int r = 0; r < k; r++) {
                for (int c = 0; c < n; c++) {
                    generator.set(r, c, random.nextBoolean());
                }
            }
            if (Elimination.rank(generator) == k) {
                return Code.ofGenerator("random:" + n + "," + k + ",seed=" + seed, "test", generator);
            }
        }
    }

    /** Hamming code of length 2^m - 1: the columns of its parity-check matrix are all non-zero m-bit numbers. */
    public static Code hamming(int m) {
        int n = (1 << m) - 1;
        BitMatrix H = new BitMatrix(m, n);
        for (int c = 0; c < n; c++) {
            for (int r = 0; r < m; r++) {
                H.set(r, c, (((c + 1) >>> r) & 1) != 0);
            }
        }
        return Code.ofParityCheck("hamming:" + n + "," + (n - m), "test", SparseBitMatrix.of(H));
    }

    /** First-order Reed-Muller code of length 2^m: constants and linear functions. */
    public static Code reedMuller1(int m) {
        int n = 1 << m;
        BitMatrix G = new BitMatrix(m + 1, n);
        for (int c = 0; c < n; c++) {
            G.set(0, c, true);
            for (int r = 0; r < m; r++) {
                G.set(r + 1, c, ((c >>> r) & 1) != 0);
            }
        }
        return Code.ofGenerator("reed-muller:1," + m, "test", G);
    }

    /** The cyclic code of a generator polynomial, bit i of which is the coefficient of x^i. */
    public static Code cyclic(int n, long polynomial) {
        int degree = 63 - Long.numberOfLeadingZeros(polynomial);
        BitMatrix G = new BitMatrix(n - degree, n);
        for (int r = 0; r < n - degree; r++) {
            for (int i = 0; i <= degree; i++) {
                G.set(r, r + i, (polynomial >>> i & 1) != 0);
            }
        }
        return Code.ofGenerator("cyclic:" + n + ",0x" + Long.toHexString(polynomial), "test", G);
    }

    /** The code with an overall parity bit appended. */
    public static Code extended(Code code) {
        BitMatrix plain = code.generator();
        BitMatrix G = new BitMatrix(code.k(), code.n() + 1);
        for (int r = 0; r < code.k(); r++) {
            for (int c = 0; c < code.n(); c++) {
                G.set(r, c, plain.get(r, c));
            }
            G.set(r, code.n(), (plain.rowWeight(r) & 1) != 0);
        }
        return Code.ofGenerator("extended " + code.designator(), "test", G);
    }

    public static Code repetition(int n) {
        BitMatrix G = new BitMatrix(1, n);
        for (int c = 0; c < n; c++) {
            G.set(0, c, true);
        }
        return Code.ofGenerator("repetition:" + n, "test", G);
    }

    /** The code that repetition is the dual of. */
    public static Code parityCheck(int n) {
        return Code.ofParityCheck(
                "parity-check:" + n, "test", SparseBitMatrix.of(repetition(n).generator()));
    }

    /** Golay code (23,12), g(x) = x^11 + x^9 + x^7 + x^6 + x^5 + x + 1 (MacWilliams and Sloane 1977, ch. 16). */
    public static Code golay() {
        return cyclic(23, 0b101011100011L);
    }

    /** BCH (15,7), g(x) = x^8 + x^7 + x^6 + x^4 + 1 (MacWilliams and Sloane 1977, ch. 7). */
    public static Code bch15() {
        return cyclic(15, 0b111010001L);
    }
}
