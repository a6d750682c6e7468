package dev.nearlimit.codes.family;

import dev.nearlimit.codes.field.BinaryPolynomial;
import dev.nearlimit.codes.gf2.BitMatrix;

/**
 * Systematic generator matrices of cyclic codes. Position j of n carries the coefficient of x^(n-1-j): information bits
 * are the coefficients of the highest powers and come first, the remainder modulo the generator polynomial is the parity
 * and comes last (Peterson and Weldon 1972, ch. 8).
 */
final class SystematicCyclic {
    private SystematicCyclic() {}

    /**
     * The k x n matrix {@code [I P]}, or k x (n+1) with an overall parity bit as last column.
     *
     * @param generator a divisor of x^n + 1 of degree n-k
     */
    static BitMatrix generatorMatrix(BinaryPolynomial generator, int n, boolean extended) {
        int k = n - generator.degree();
        BitMatrix matrix = new BitMatrix(k, extended ? n + 1 : n);
        for (int i = 0; i < k; i++) {
            BinaryPolynomial parity = BinaryPolynomial.ofExponents(n - 1 - i).remainder(generator);
            matrix.set(i, i, true);
            for (int exponent = 0; exponent < n - k; exponent++) {
                matrix.set(i, n - 1 - exponent, parity.coefficient(exponent));
            }
            if (extended) {
                matrix.set(i, n, (1 + parity.weight()) % 2 == 1);
            }
        }
        return matrix;
    }
}
